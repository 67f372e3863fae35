import type { PointKind } from "../systems/words";

/** How a kind of device is tried, and what that leaves open. */
export type Method = {
  /** What to do at the device. */
  how: string;
  /** What stays open after it. */
  leavesOpen: string;
};

/** How a test is put together. Editions differ, and so do places: the rule is data. */
export type ScriptRule = {
  name: string;
  edition: string;
  methods: Record<PointKind, Method>;
};

/**
 * Methods by kind as the trade has them; after the test methods of NFPA 72, chapter 14, table of test methods. Each
 * device's own instructions come first.
 */
export const scriptRule: ScriptRule = {
  name: "Yearly functional test",
  edition: "NFPA 72, 2022, in general terms",
  methods: {
    smoke: {
      how: "Smoke, or aerosol that its maker lists, into the detector",
      leavesOpen: "A magnet alone proves the electronics, not that smoke gets in",
    },
    duct: {
      how: "Smoke or listed aerosol, and the pressure differential across the sampling tubes",
      leavesOpen: "Smoke at the head proves the detector; sampling is proven by the differential alone",
    },
    heat: {
      how: "Heat, if it is restorable; the electrical function alone, if it is not",
      leavesOpen: "A fixed element that does not restore is spent by heat",
    },
    beam: {
      how: "The obscuration that its maker gives, by filter or by its own test",
      leavesOpen: "Blocking the beam wholly proves a trouble signal, not an alarm",
    },
    flame: {
      how: "The source that its maker gives, at its distance",
      leavesOpen: "Its own lamp proves the electronics, not its field of view",
    },
    gas: {
      how: "Test gas at the concentration that its maker gives",
      leavesOpen: "A test button proves the electronics",
    },
    pull: { how: "Operate it as a person would", leavesOpen: "A key switch proves the contact, not the mechanism" },
    waterflow: {
      how: "Flow of water through the inspector's test connection; time it to the signal",
      leavesOpen: "Tripping the switch by hand proves the contact, not the vane",
    },
    tamper: {
      how: "Turn the valve: a signal within two turns or a fifth of its travel; then fully open again",
      leavesOpen: "The switch alone proves the contact, not its place on the valve",
    },
    pressure: {
      how: "Raise or lower the pressure to the setting",
      leavesOpen: "Bridging the contact proves the circuit alone",
    },
    monitor: { how: "Operate what it watches", leavesOpen: "Bridging the input proves the circuit alone" },
    other: { how: "As its maker instructs", leavesOpen: "Write down the method beside the result" },
  },
};
