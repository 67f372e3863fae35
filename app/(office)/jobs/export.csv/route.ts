import { JOB_STATE_WORDS } from "@/lib/domain/jobs/job-state";
import { JOB_KIND_WORDS } from "@/lib/domain/jobs/words";
import { listJobs } from "@/lib/services/jobs/list-jobs";
import { listFile } from "@/lib/web/list-file";

export const GET = listFile(listJobs, "jobs", [
  ["Number", (job) => job.number],
  ["State", (job) => JOB_STATE_WORDS[job.state]],
  ["Urgent", (job) => (job.urgent ? "yes" : "no")],
  ["Kind", (job) => JOB_KIND_WORDS[job.kind]],
  ["What is to be done", (job) => job.title],
  ["Site", (job) => job.site.name],
  ["City", (job) => job.site.city],
  ["Due by", (job) => job.latestOn],
  ["Next visit", (job) => job.nextVisit],
]);
