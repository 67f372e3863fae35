import { describe, expect, test } from "vitest";
import { JOB_STATES, type JobFacts, jobState, mayBecome } from "./job-state";

const fresh: JobFacts = {
  canceled: false,
  billed: false,
  reviewed: false,
  done: false,
  waiting: false,
  ended: 0,
  current: 0,
  ahead: 0,
};

describe("what comes next for a job", () => {
  test.each([
    ["nothing planned", {}, "to_book"],
    ["one visit ahead", { ahead: 1 }, "booked"],
    ["a crew is there", { current: 1, ahead: 2 }, "under_way"],
    ["the first of three nights is over", { ended: 1, ahead: 2 }, "under_way"],
    ["every visit is over", { ended: 2 }, "to_review"],
    ["waits for parts", { waiting: true }, "waiting"],
    ["waits for parts, though booked", { waiting: true, ahead: 1 }, "waiting"],
    ["a crew is there while another part is awaited", { waiting: true, current: 1 }, "under_way"],
    ["said to be done", { done: true, ahead: 1 }, "to_review"],
    ["reviewed", { done: true, reviewed: true }, "to_bill"],
    ["billed", { done: true, reviewed: true, billed: true }, "billed"],
    ["canceled while it waited", { canceled: true, waiting: true }, "canceled"],
  ] as const)("%s: %s", (_, facts, state) => expect(jobState({ ...fresh, ...facts })).toBe(state));
});

describe("what may follow what", () => {
  test("a job with standing visits is not canceled under its crew", () => {
    expect(JOB_STATES.filter((from) => mayBecome(from, "canceled"))).toEqual(["to_book", "waiting"]);
  });
  test("nothing follows a canceled or a billed job", () => {
    for (const from of ["canceled", "billed"] as const)
      expect(JOB_STATES.filter((to) => mayBecome(from, to))).toEqual([]);
  });
  test("every state but the first can be reached from another", () => {
    for (const to of JOB_STATES) expect(JOB_STATES.some((from) => mayBecome(from, to))).toBe(true);
  });
});
