import type { SheetVisit, TrayJob, Wanted } from "@/lib/queries/visits";

/** What is in the hand: a job from the tray, or a visit that moves; who goes along, and for how long. */
export type TakenUp = { helpers: string[]; minutes: number } & (
  | { job: TrayJob; visit?: undefined }
  | { visit: SheetVisit; job?: undefined }
);

export const wantedOf = ({ job, visit }: TakenUp): Wanted => (job ? { jobId: job.id } : { visitId: visit?.id ?? "" });

export const titleOf = ({ job, visit }: TakenUp): string => {
  const what = job ?? visit;
  return `${job?.title ?? visit?.job.title}, ${what?.site.name}`;
};
