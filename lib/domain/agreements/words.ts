import type { SystemFunction } from "@/lib/domain/systems/words";

/** How often, from weekly to ten-yearly; what each word means in months or days is data with an edition. */
export const FREQUENCIES = [
  "weekly",
  "monthly",
  "quarterly",
  "semiannual",
  "annual",
  "two_yearly",
  "three_yearly",
  "four_yearly",
  "five_yearly",
  "six_yearly",
  "ten_yearly",
] as const;
export type Frequency = (typeof FREQUENCIES)[number];

export const FREQUENCY_WORDS: Record<Frequency, string> = {
  weekly: "Weekly",
  monthly: "Monthly",
  quarterly: "Quarterly",
  semiannual: "Semiannual",
  annual: "Annual",
  two_yearly: "Every 2 years",
  three_yearly: "Every 3 years",
  four_yearly: "Every 4 years",
  five_yearly: "Every 5 years",
  six_yearly: "Every 6 years",
  ten_yearly: "Every 10 years",
};

/** What the next occurrence counts from: the calendar as agreed, or the day on which the last one was done. */
export const ANCHORS = ["fixed", "last_done"] as const;
export type Anchor = (typeof ANCHORS)[number];

export const ANCHOR_WORDS: Record<Anchor, string> = {
  fixed: "From the agreed date",
  last_done: "From the last completion",
};

export const TEST_KINDS = [
  "whole_system",
  "fan_shutdown",
  "detectors",
  "notification",
  "waterflow",
  "doors",
  "elevators",
  "smoke_control",
  "sensitivity",
  "batteries",
  "visual",
] as const;
export type TestKind = (typeof TEST_KINDS)[number];

export const TEST_KIND_WORDS: Record<TestKind, string> = {
  whole_system: "Whole-system test",
  fan_shutdown: "Fan shutdown test",
  detectors: "Test of detectors and pull stations",
  notification: "Notification test",
  waterflow: "Waterflow and valve test",
  doors: "Door release test",
  elevators: "Elevator recall test",
  smoke_control: "Smoke-control test",
  sensitivity: "Detector sensitivity test",
  batteries: "Battery test",
  visual: "Visual inspection",
};

/** The functions that really operate during each kind of test, unless the agreement says otherwise. */
export const FUNCTIONS_OF_TEST: Record<TestKind, readonly SystemFunction[]> = {
  whole_system: ["notification", "fan_shutdown", "damper_close", "door_release", "elevator_recall"],
  fan_shutdown: ["fan_shutdown", "damper_close"],
  detectors: [],
  notification: ["notification"],
  waterflow: [],
  doors: ["door_release"],
  elevators: ["elevator_recall"],
  smoke_control: ["smoke_control_start", "damper_close"],
  sensitivity: [],
  batteries: [],
  visual: [],
};
