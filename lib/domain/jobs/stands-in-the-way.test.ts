import { describe, expect, test } from "vitest";
import { type DueFacts, standsInTheWay } from "./stands-in-the-way";

const site = "0193c000-0000-7000-8000-000000000001";
const clear: DueFacts = {
  siteId: site,
  agreementId: "0193c000-0000-7000-8000-000000000002",
  jobId: null,
  state: "WA",
  functions: ["fan_shutdown", "notification"],
  window: { earliest: "2026-12-07", target: "2026-12-10", latest: "2026-12-13" },
  today: "2026-12-01",
  hasContactWithEmail: true,
  testWindows: [
    // Sundays alone: 2026-12-13 is one.
    { functions: ["fan_shutdown", "notification"], weekdays: [7], onDate: null, fromDate: null, toDate: null },
  ],
  noTestDates: [],
  licensedUntil: "2027-01-01",
  hasDeviceList: true,
  agreementEndsOn: null,
  purchaseOrderMissing: false,
};
const codes = (facts: Partial<DueFacts>) => standsInTheWay({ ...clear, ...facts }).map((obstacle) => obstacle.code);

test("nothing, when everything is there", () => expect(codes({})).toEqual([]));

describe("each thing that is missing, alone", () => {
  test.each([
    [{ hasContactWithEmail: false }, "no_contact"],
    [{ licensedUntil: null }, "no_license"],
    [{ licensedUntil: "2026-12-09" }, "no_license"],
    [{ hasDeviceList: false }, "no_device_list"],
    [{ agreementEndsOn: "2026-12-06" }, "agreement_ends"],
    [{ purchaseOrderMissing: true }, "no_purchase_order"],
    [{ testWindows: [] }, "no_window"],
  ] as const)("%j", (facts, code) => expect(codes(facts)).toEqual([code]));
});

describe("test windows", () => {
  const [sundays] = clear.testWindows;
  if (!sundays) throw new Error("no window");
  test("of another function do not help, and the words say which is missing", () => {
    const [obstacle] = standsInTheWay({ ...clear, testWindows: [{ ...sundays, functions: ["notification"] }] });
    expect(obstacle?.words).toBe("No test window for fan shutdown");
    expect(obstacle?.href).toBe(`/sites/${site}#windows`);
  });
  test("whose weekday does not come in the due window do not help", () => {
    const window = { earliest: "2026-12-07", target: "2026-12-10", latest: "2026-12-12" };
    expect(codes({ window })).toEqual(["no_window"]);
  });
  test("of a single date help on that date alone", () => {
    const single = { ...sundays, weekdays: [] };
    expect(codes({ testWindows: [{ ...single, onDate: "2026-12-13" }] })).toEqual([]);
    expect(codes({ testWindows: [{ ...single, onDate: "2026-12-14" }] })).toEqual(["no_window"]);
  });
  test("that have ended, or start later, do not help", () => {
    expect(codes({ testWindows: [{ ...sundays, toDate: "2026-12-12" }] })).toEqual(["no_window"]);
    expect(codes({ testWindows: [{ ...sundays, fromDate: "2026-12-14" }] })).toEqual(["no_window"]);
  });
  test("are not asked for where nothing operates", () => expect(codes({ functions: [], testWindows: [] })).toEqual([]));
  test("of an overdue test are looked for from today on", () => {
    const window = { earliest: "2026-01-01", target: "2026-03-01", latest: "2026-06-01" };
    expect(codes({ window, today: "2026-12-13" })).toEqual([]);
    expect(codes({ window, today: "2026-12-14" })).toEqual(["no_window"]);
  });
});

describe("no-test dates", () => {
  const dates = (fromDate: string, toDate: string) => ({
    functions: ["fan_shutdown" as const],
    fromDate,
    toDate,
    reason: "",
  });
  test("stand in the way when together they leave no day", () => {
    const noTestDates = [dates("2026-12-10", "2026-12-20"), dates("2026-12-01", "2026-12-09")];
    expect(codes({ noTestDates })).toEqual(["no_test_dates"]);
  });
  test("do not when one day is left", () => {
    expect(codes({ noTestDates: [dates("2026-12-01", "2026-12-09"), dates("2026-12-11", "2026-12-20")] })).toEqual([]);
  });
});
