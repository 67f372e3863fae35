/** Every word of the technician's part stands in a message file, so that another language is another file. */
export const FIELD_WORDS_EN = {
  today: "Today",
  later: "The days after",
  nothingToday: "No visit today",
  nothingTodayNext: "What is planned later stands below.",
  nothingLater: "Nothing planned in the next days",
  loading: "Looking for your visits…",
  failed: "Your visits could not be fetched",
  tryAgain: "Try again",
  access: "Getting in",
  with: "With",
  call: "Call",
  account: "Account",
  skip: "To the content",
  main: "Main",
} as const;
