export const JOB_KINDS = ["test", "repair", "service_call", "acceptance"] as const;
export type JobKind = (typeof JOB_KINDS)[number];

export const JOB_KIND_WORDS: Record<JobKind, string> = {
  test: "Test",
  repair: "Repair",
  service_call: "Service call",
  acceptance: "Acceptance",
};

/** What a job may wait for. */
export const WAITS_FOR = ["parts", "access", "approval"] as const;
export type WaitsFor = (typeof WAITS_FOR)[number];

export const WAITS_FOR_WORDS: Record<WaitsFor, string> = { parts: "parts", access: "access", approval: "approval" };
