import { describe, expect, test } from "vitest";
import { type NoTestDate, noTestOn, type TestWindow, windowSpans } from "./spans";

const window = (change: Partial<TestWindow>): TestWindow => ({
  functions: ["fan_shutdown"],
  weekdays: [1, 2, 3, 4, 5, 6, 7],
  onDate: null,
  startsLocal: "22:00",
  endsLocal: "06:00",
  fromDate: null,
  toDate: null,
  noticeHours: 0,
  ...change,
});

const NEW_YORK = "America/New_York";
const spans = (change: Partial<TestWindow>, from: string, to = from, zone = NEW_YORK) =>
  windowSpans(window(change), from, to, zone).map(({ startsAt, endsAt }) => [
    startsAt.toISOString(),
    endsAt.toISOString(),
  ]);

const hours = (date: string, zone = NEW_YORK) => {
  const [span] = windowSpans(window({}), date, date, zone);
  return span && (span.endsAt.getTime() - span.startsAt.getTime()) / 3_600_000;
};

// `zdump -v -c 2026,2027 America/New_York`: on at 2026-03-08T07:00:00Z, back at 2026-11-01T06:00:00Z.
describe("nights of clock change", () => {
  test("a window from 22:00 to 06:00 lasts 7, 8 or 9 hours", () => {
    expect(spans({}, "2026-03-07")).toEqual([["2026-03-08T03:00:00.000Z", "2026-03-08T10:00:00.000Z"]]);
    expect(spans({}, "2026-10-31")).toEqual([["2026-11-01T02:00:00.000Z", "2026-11-01T11:00:00.000Z"]]);
    expect([hours("2026-03-07"), hours("2026-03-08"), hours("2026-10-31"), hours("2026-11-01")]).toEqual([7, 8, 9, 8]);
  });

  test("where the clocks never change it lasts 8", () => {
    expect([hours("2026-03-07", "America/Phoenix"), hours("2026-10-31", "America/Phoenix")]).toEqual([8, 8]);
  });

  test("an end that is skipped is the moment at which the clock has passed it", () => {
    expect(spans({ startsLocal: "01:30", endsLocal: "02:30" }, "2026-03-08")).toEqual([
      ["2026-03-08T06:30:00.000Z", "2026-03-08T07:00:00.000Z"],
    ]);
  });

  test("a start that is skipped is the moment at which the clock jumps over it", () => {
    expect(spans({ startsLocal: "02:30", endsLocal: "03:15" }, "2026-03-08")).toEqual([
      ["2026-03-08T07:00:00.000Z", "2026-03-08T07:15:00.000Z"],
    ]);
  });

  test("what lies wholly in the skipped hour does not open", () => {
    expect(spans({ startsLocal: "02:10", endsLocal: "02:50" }, "2026-03-08")).toEqual([]);
  });
});

test("the weekday is that of the start", () => {
  // 2026-12-07 is a Monday.
  const mondays = spans({ weekdays: [1] }, "2026-12-01", "2026-12-31");
  expect(mondays.map(([startsAt]) => startsAt?.slice(0, 10))).toEqual([
    "2026-12-08",
    "2026-12-15",
    "2026-12-22",
    "2026-12-29",
  ]);
});

test("a window on a single date opens once, and a season is kept", () => {
  expect(spans({ weekdays: [], onDate: "2026-12-05" }, "2026-12-01", "2026-12-31")).toHaveLength(1);
  expect(spans({ fromDate: "2026-12-30", toDate: "2027-01-02" }, "2026-12-01", "2027-01-31")).toHaveLength(4);
});

test("no-test dates count from the first to the last, for the functions they name", () => {
  const exams: NoTestDate = {
    functions: ["notification"],
    fromDate: "2026-12-07",
    toDate: "2026-12-11",
    reason: "Exams",
  };
  const on = (date: string) => noTestOn([exams], ["fan_shutdown", "notification"], date);
  expect([on("2026-12-06"), on("2026-12-07"), on("2026-12-11"), on("2026-12-12")]).toEqual([[], [exams], [exams], []]);
  expect(noTestOn([exams], ["fan_shutdown"], "2026-12-08")).toEqual([]);
});
