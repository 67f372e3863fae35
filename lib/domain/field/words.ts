import type { JobKind } from "@/lib/domain/jobs/words";

/** Every word of the technician's part stands in a message file, so that another language is another file. */
export const FIELD_WORDS_EN = {
  /** How dates are written, as a BCP 47 tag. */
  language: "en-US",
  today: "Today",
  later: "The days after",
  nothingToday: "No visit today",
  nothingTodayNext: "What is planned later stands below.",
  nothingLater: "Nothing planned in the next days",
  loading: "Looking for your visits…",
  failed: "Your visits could not be fetched",
  trouble: "Something went wrong",
  troubleNext: "What you saved before is safe. Try again; if it stays like this, call the office.",
  tryAgain: "Try again",
  access: "Getting in",
  with: "With",
  call: "Call",
  account: "Account",
  looksAreLogged: "Each look at a code is written down. It hides after a minute.",
  skip: "To the content",
  main: "Main",
  jobKinds: {
    test: "Test",
    repair: "Repair",
    service_call: "Service call",
    acceptance: "Acceptance",
  } satisfies Record<JobKind, string>,
} as const;
