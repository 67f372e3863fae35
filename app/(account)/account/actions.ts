"use server";

import { paths } from "@/lib/domain/shared/paths";
import { signOutEverywhere } from "@/lib/services/people/sign-out-everywhere";
import { action } from "@/lib/web/action";

export const signOutEverywhereAction = action(signOutEverywhere, { to: () => paths.signIn });
