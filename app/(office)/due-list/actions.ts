"use server";

import { paths } from "@/lib/domain/shared/paths";
import { makeDue } from "@/lib/services/jobs/make-due";
import { action } from "@/lib/web/action";

export const makeDueAction = action(makeDue, { to: ({ jobId }) => paths.job(jobId) });
