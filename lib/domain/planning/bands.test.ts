import { expect, test } from "vitest";
import { addDays, startOfDate, toInstant } from "../shared/zone";
import type { SlotReason } from "../visits/slot";
import { bandsOf, startsOf } from "./bands";
import { costOf, type Errand } from "./cost";
import { costWords } from "./cost-words";

const ZONE = "America/Chicago";
const dayOf = (date: string) => ({ startsAt: startOfDate(date, ZONE), endsAt: startOfDate(addDays(date, 1), ZONE) });

// Energy Policy Act of 2005, section 110: days of 23 and 25 hours.
test.each([
  ["2026-12-01", 48],
  ["2026-03-08", 46],
  ["2026-11-01", 48],
])("every half hour of %s whose clock reading means just that instant", (date, count) => {
  const starts = startsOf(dayOf(date), 30, ZONE);
  expect(starts).toHaveLength(count);
  expect(new Set(starts.map(({ local }) => local)).size).toBe(count);
  for (const { at, local } of starts) expect(toInstant(local, ZONE)).toEqual(at);
});

const cost = { travel: null, tight: false, overtimeMinutes: 0, daysLate: 0 };

test("starts of which the same is to be said make one band", () => {
  const busy: SlotReason = { code: "crew_busy", words: "busy", overridable: false };
  const judged = startsOf(dayOf("2026-12-01"), 360, ZONE).map((start, i) => ({
    ...start,
    reasons: i === 2 ? [busy] : [],
    cost,
  }));
  const bands = bandsOf(judged);
  const at = (hour: string) => toInstant(`2026-12-01T${hour}:00`, ZONE);
  expect(bands.map(({ from, to, reasons }) => [from, to, reasons.length])).toEqual([
    [at("00"), at("06"), 0],
    [at("12"), at("12"), 1],
    [at("18"), at("18"), 0],
  ]);
});

test("a place costs the way from the visit before, overtime beyond eight hours, and days past due", () => {
  const at = (clock: string) => toInstant(`2026-12-01T${clock}`, ZONE);
  const here = { latitude: 41.88, longitude: -87.63 };
  const errand: Errand = { memberId: "dara", where: "Cold Store", startsAt: at("07:00"), endsAt: at("13:00"), ...here };
  const place = { site: { latitude: 41.97, longitude: -87.63 }, home: here, zone: ZONE, latest: "2026-11-28" };
  const span = { startsAt: at("13:10"), endsAt: at("16:10") };
  const found = costOf({ ...place, span, errands: [errand] });
  // By hand: 0.09 degrees of latitude are 10.0 km; the travel estimate of ten kilometers is 22 minutes.
  expect(found).toEqual({ travel: { minutes: 22, from: "Cold Store" }, tight: true, overtimeMinutes: 60, daysLate: 3 });
  expect(costWords(found)).toBe(
    "about 22 min from Cold Store, the way takes longer than the gap, 1 h over 8 h, 3 days past due",
  );
  const early = { startsAt: at("03:00"), endsAt: at("05:00") };
  expect(costOf({ ...place, span: early, errands: [errand] }).travel?.from).toBe("home");
});
