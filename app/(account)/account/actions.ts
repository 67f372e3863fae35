"use server";

import { paths } from "@/lib/domain/shared/paths";
import { changePassword } from "@/lib/services/people/change-password";
import { endSession } from "@/lib/services/people/end-session";
import { enterCompany } from "@/lib/services/people/enter-company";
import { signOutEverywhere } from "@/lib/services/people/sign-out-everywhere";
import { action } from "@/lib/web/action";

export const changePasswordAction = action(changePassword, { to: () => paths.signIn });
export const endSessionAction = action(endSession, { done: "Signed out there." });
export const enterCompanyAction = action(enterCompany, { to: () => paths.home });
export const signOutEverywhereAction = action(signOutEverywhere, { to: () => paths.signIn });
