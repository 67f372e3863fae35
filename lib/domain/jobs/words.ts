export const JOB_KINDS = ["test", "repair", "service_call", "acceptance"] as const;
export type JobKind = (typeof JOB_KINDS)[number];

export const JOB_KIND_WORDS: Record<JobKind, string> = {
  test: "Test",
  repair: "Repair",
  service_call: "Service call",
  acceptance: "Acceptance",
};
