/** A kind of thing that must happen: windows, notices and intervals speak of these. */
export const FUNCTIONS = [
  "notification",
  "fan_shutdown",
  "smoke_control_start",
  "damper_close",
  "door_release",
  "elevator_recall",
  "gas_shutoff",
  "suppression_release",
  "off_site_signal",
  "other",
] as const;
export type SystemFunction = (typeof FUNCTIONS)[number];

export const FUNCTION_WORDS: Record<SystemFunction, string> = {
  notification: "Notification",
  fan_shutdown: "Fan shutdown",
  smoke_control_start: "Smoke-control start",
  damper_close: "Dampers close",
  door_release: "Door release",
  elevator_recall: "Elevator recall",
  gas_shutoff: "Gas shut-off",
  suppression_release: "Releasing",
  off_site_signal: "Off-site signal",
  other: "Other",
};

/** Initiating devices. */
export const POINT_KINDS = [
  "smoke",
  "duct",
  "heat",
  "beam",
  "flame",
  "gas",
  "pull",
  "waterflow",
  "tamper",
  "pressure",
  "monitor",
  "other",
] as const;
export type PointKind = (typeof POINT_KINDS)[number];

export const POINT_KIND_WORDS: Record<PointKind, string> = {
  smoke: "Smoke detector",
  duct: "Duct detector",
  heat: "Heat detector",
  beam: "Beam detector",
  flame: "Flame detector",
  gas: "Gas detector",
  pull: "Pull station",
  waterflow: "Waterflow switch",
  tamper: "Valve tamper switch",
  pressure: "Pressure switch",
  monitor: "Monitor module",
  other: "Other device",
};

export const OUTPUT_KINDS = ["relay", "notification_circuit", "control_circuit", "off_site", "other"] as const;
export type OutputKind = (typeof OUTPUT_KINDS)[number];

export const OUTPUT_KIND_WORDS: Record<OutputKind, string> = {
  relay: "Relay",
  notification_circuit: "Notification circuit",
  control_circuit: "Control circuit",
  off_site: "Off-site transmission",
  other: "Other output",
};

export const EQUIPMENT_KINDS = [
  "fan",
  "air_handler",
  "damper",
  "door",
  "elevator",
  "gas_valve",
  "drive",
  "release",
  "other",
] as const;
export type EquipmentKind = (typeof EQUIPMENT_KINDS)[number];

export const EQUIPMENT_KIND_WORDS: Record<EquipmentKind, string> = {
  fan: "Fan",
  air_handler: "Air handler",
  damper: "Damper",
  door: "Door holder",
  elevator: "Elevator",
  gas_valve: "Gas valve",
  drive: "Drive",
  release: "Releasing device",
  other: "Other equipment",
};

/** What equipment must do when its output operates. */
export const ACTIONS = ["stop", "start", "open", "close", "release", "recall"] as const;
export type Action = (typeof ACTIONS)[number];

export const ACTION_WORDS: Record<Action, string> = {
  stop: "stops",
  start: "starts",
  open: "opens",
  close: "closes",
  release: "releases",
  recall: "is recalled",
};

/** How equipment comes back after the panel is reset. */
export const RESTART_MODES = ["with_reset", "separate_restart", "at_unit", "building_controls", "unknown"] as const;
export type RestartMode = (typeof RESTART_MODES)[number];

export const RESTART_MODE_WORDS: Record<RestartMode, string> = {
  with_reset: "with the panel's reset",
  separate_restart: "by a separate restart input",
  at_unit: "by hand at the unit",
  building_controls: "staggered by the building's controls",
  unknown: "not known",
};

export const SIGNALS = ["alarm", "supervisory", "trouble"] as const;
export type Signal = (typeof SIGNALS)[number];

export const SIGNAL_WORDS: Record<Signal, string> = {
  alarm: "Alarm",
  supervisory: "Supervisory",
  trouble: "Trouble",
};

/** Where an expectation comes from. */
export const EXPECTATION_SOURCES = ["approved_sequence", "panel_program", "as_found"] as const;
export type ExpectationSource = (typeof EXPECTATION_SOURCES)[number];

export const EXPECTATION_SOURCE_WORDS: Record<ExpectationSource, string> = {
  approved_sequence: "Approved sequence",
  panel_program: "Panel program",
  as_found: "As found",
};

export const PROOF_OUTCOMES = ["proven", "failed"] as const;
export type ProofOutcome = (typeof PROOF_OUTCOMES)[number];
