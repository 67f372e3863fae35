export const ANSWERS = ["acknowledged", "declined"] as const;
export type Answer = (typeof ANSWERS)[number];

export const ANSWER_WORDS: Record<Answer, string> = { acknowledged: "Acknowledged", declined: "Declined" };

/** How an answer came. */
export const CHANNELS = ["link", "portal", "telephone", "e_mail", "in_person", "letter"] as const;
export type Channel = (typeof CHANNELS)[number];

export const CHANNEL_WORDS: Record<Channel, string> = {
  link: "by the link",
  portal: "after signing in",
  telephone: "by telephone",
  e_mail: "by e-mail",
  in_person: "in person",
  letter: "by letter",
};

/** Everything that stands against a visit at a place and time. */
export const SLOT_REASONS = [
  "crew_busy",
  "crew_missing",
  "license_missing",
  "license_expired",
  "live_block_outside_visit",
  "no_window",
  "outside_window",
  "no_test_date",
  "notice_too_short",
  "too_early",
  "too_late",
] as const;
export type SlotReasonCode = (typeof SLOT_REASONS)[number];

/** A name in the browser's form for each reason, so that it stands at the field that can mend it. */
export const REASON_FIELD: Record<SlotReasonCode, "crew" | "liveBlocks" | "startsLocal"> = {
  crew_busy: "crew",
  crew_missing: "crew",
  license_missing: "crew",
  license_expired: "crew",
  live_block_outside_visit: "liveBlocks",
  no_window: "liveBlocks",
  outside_window: "liveBlocks",
  no_test_date: "liveBlocks",
  notice_too_short: "liveBlocks",
  too_early: "startsLocal",
  too_late: "startsLocal",
};
