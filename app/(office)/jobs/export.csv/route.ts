import { JOB_KIND_WORDS } from "@/lib/domain/jobs/words";
import { listJobs } from "@/lib/services/jobs/list-jobs";
import { listFile } from "@/lib/web/list-file";

export const GET = listFile(listJobs, "jobs", [
  ["Number", (job) => job.number],
  ["What is to be done", (job) => job.title],
  ["Kind", (job) => JOB_KIND_WORDS[job.kind]],
  ["Site", (job) => job.site.name],
  ["City", (job) => job.site.city],
]);
