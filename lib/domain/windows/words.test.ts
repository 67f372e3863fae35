import { expect, test } from "vitest";
import type { TestWindow } from "./spans";
import { nextOpening, seasonWords, windowWords } from "./words";

const nights: TestWindow = {
  functions: ["fan_shutdown"],
  weekdays: [2, 1],
  onDate: null,
  startsLocal: "22:00",
  endsLocal: "06:00",
  fromDate: null,
  toDate: "2027-03-01",
  noticeHours: 72,
};

test("a window says its days, its hours and that it ends the next day", () => {
  expect(windowWords(nights)).toBe("Mon, Tue, 22:00 to 06:00 the next day");
  expect(windowWords({ ...nights, weekdays: [1, 2, 3, 4, 5, 6, 7], endsLocal: "23:30" })).toBe(
    "Every day, 22:00 to 23:30",
  );
  expect(windowWords({ ...nights, weekdays: [], onDate: "2026-12-05" })).toBe(
    "Sat, Dec 5, 2026, 22:00 to 06:00 the next day",
  );
  expect(seasonWords(nights)).toBe("until Mon, Mar 1, 2027");
});

test("the next opening passes over nights that a no-test date touches at either end", () => {
  const now = new Date("2026-12-07T18:00:00Z"); // Monday noon in Chicago
  const opening = (reason: { fromDate: string; toDate: string }[]) =>
    nextOpening(
      nights,
      reason.map((dates) => ({ ...dates, functions: ["fan_shutdown"], reason: "Exams" })),
      now,
      "America/Chicago",
    )?.startsAt.toISOString();
  expect(opening([])).toBe("2026-12-08T04:00:00.000Z");
  // Tuesday's date ends Monday's night; Tuesday's own night begins on it.
  expect(opening([{ fromDate: "2026-12-08", toDate: "2026-12-08" }])).toBe("2026-12-15T04:00:00.000Z");
  expect(opening([{ fromDate: "2026-12-01", toDate: "2027-12-31" }])).toBeUndefined();
});

test("a window that is open now is the next one", () => {
  const midnight = new Date("2026-12-08T06:00:00Z");
  expect(nextOpening(nights, [], midnight, "America/Chicago")?.startsAt.toISOString()).toBe("2026-12-08T04:00:00.000Z");
});
