export const JOB_STATES = [
  "to_book",
  "booked",
  "under_way",
  "waiting",
  "to_review",
  "to_bill",
  "billed",
  "canceled",
] as const;
export type JobState = (typeof JOB_STATES)[number];

export const JOB_STATE_WORDS: Record<JobState, string> = {
  to_book: "To book",
  booked: "Booked",
  under_way: "Under way",
  waiting: "Waiting",
  to_review: "To review",
  to_bill: "To bill",
  billed: "Billed",
  canceled: "Canceled",
};

/** All that a job's state is derived from; nothing stores the state itself. */
export type JobFacts = {
  canceled: boolean;
  billed: boolean;
  reviewed: boolean;
  /** Said to be done by somebody in the office. */
  done: boolean;
  waiting: boolean;
  /** Of the visits that are not canceled: how many have ended, are going on, and lie ahead. */
  ended: number;
  current: number;
  ahead: number;
};

/** What comes next. Work that is going on counts before a wait, a wait before what is booked. */
export function jobState(facts: JobFacts): JobState {
  if (facts.canceled) return "canceled";
  if (facts.billed) return "billed";
  if (facts.reviewed) return "to_bill";
  if (facts.done) return "to_review";
  if (facts.current > 0) return "under_way";
  if (facts.waiting) return "waiting";
  if (facts.ahead > 0) return facts.ended > 0 ? "under_way" : "booked";
  return facts.ended > 0 ? "to_review" : "to_book";
}

/** The one table of what may follow what; verbs ask it before they write. */
export const JOB_TRANSITIONS: Record<JobState, readonly JobState[]> = {
  to_book: ["booked", "waiting", "to_review", "canceled"],
  booked: ["to_book", "under_way", "waiting", "to_review"],
  under_way: ["booked", "waiting", "to_review"],
  waiting: ["to_book", "booked", "under_way", "to_review", "canceled"],
  to_review: ["booked", "under_way", "waiting", "to_bill"],
  to_bill: ["to_review", "billed"],
  billed: [],
  canceled: [],
};

export const mayBecome = (from: JobState, to: JobState): boolean => JOB_TRANSITIONS[from].includes(to);
