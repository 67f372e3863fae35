"use server";

import { paths } from "@/lib/domain/shared/paths";
import { cancelJob } from "@/lib/services/jobs/cancel-job";
import { createJob } from "@/lib/services/jobs/create-job";
import { endWait } from "@/lib/services/jobs/end-wait";
import { recordDone } from "@/lib/services/jobs/record-done";
import { setTerms } from "@/lib/services/jobs/set-terms";
import { updateJob } from "@/lib/services/jobs/update-job";
import { waitFor } from "@/lib/services/jobs/wait-for";
import { action } from "@/lib/web/action";

export const createJobAction = action(createJob, { to: ({ jobId }) => paths.job(jobId) });
export const updateJobAction = action(updateJob, { done: "Job saved" });
export const cancelJobAction = action(cancelJob, { done: "Job canceled" });
export const recordDoneAction = action(recordDone, { done: "Done" });
export const waitForAction = action(waitFor, { done: "Written down" });
export const endWaitAction = action(endWait, { done: "The wait is over" });
export const setTermsAction = action(setTerms, { done: "Saved" });
