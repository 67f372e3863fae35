import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { toInstant } from "../shared/zone";
import { LEAD_IS_LICENSED, type Place, type SlotFacts, spanFrom, type WantedVisit } from "./slot";
import { slotReasons } from "./slot-reasons";

const ZONE = "America/Chicago";
const DARA = "dara";
const KOFI = "kofi";

/** Fans on Tuesdays (2026-12-08 is one) from 04:00 to 08:00 with a day's notice; horns on any day from 15:00 to 18:00. */
const facts: SlotFacts = {
  now: new Date("2026-12-01T18:00:00Z"),
  names: { [DARA]: "Dara Whitcomb", [KOFI]: "Kofi Sandoval" },
  busy: [],
  licenses: [{ memberId: DARA, kind: "Technician", jurisdiction: "IL", expiresOn: "2027-06-30" }],
  siteState: "IL",
  windows: [
    {
      functions: ["fan_shutdown"],
      weekdays: [2],
      onDate: null,
      startsLocal: "04:00",
      endsLocal: "08:00",
      fromDate: null,
      toDate: null,
      noticeHours: 24,
    },
    {
      functions: ["notification"],
      weekdays: [1, 2, 3, 4, 5, 6, 7],
      onDate: null,
      startsLocal: "15:00",
      endsLocal: "18:00",
      fromDate: null,
      toDate: null,
      noticeHours: 0,
    },
  ],
  noTestDates: [],
};

const visit: WantedVisit = {
  minutes: 240,
  functions: ["fan_shutdown"],
  liveBlocks: [{ offsetMinutes: 60, minutes: 60, functions: ["fan_shutdown"] }],
  crewSize: 1,
  licenses: LEAD_IS_LICENSED,
  due: { earliest: "2026-12-01", latest: "2026-12-31" },
};
const place: Place = { crew: [{ memberId: DARA, lead: true }], startsLocal: "2026-12-08T06:00", zone: ZONE };

const codes = (wanted: WantedVisit, at: Place, known: SlotFacts) =>
  slotReasons(wanted, at, known).map(({ code }) => code);
const busyAt = (from: string, to: string, memberId = DARA) => ({
  memberId,
  startsAt: toInstant(from, ZONE),
  endsAt: toInstant(to, ZONE),
  where: "Cold Store",
});

test("a licensed crew, a live block in its window, in the due window: nothing stands against it", () => {
  expect(slotReasons(visit, place, facts)).toEqual([]);
});

test("the rest of the visit may lie outside the window", () => {
  expect(codes(visit, { ...place, startsLocal: "2026-12-08T05:30" }, facts)).toEqual([]);
});

describe("the crew", () => {
  test("is nowhere else at that time, and that cannot be gone past", () => {
    const reasons = slotReasons(visit, place, { ...facts, busy: [busyAt("2026-12-08T09:30", "2026-12-08T11:00")] });
    expect(reasons).toEqual([
      { code: "crew_busy", words: "Dara Whitcomb is at Cold Store from 09:30 to 11:00", overridable: false },
    ]);
  });

  test("may come straight from one visit and go straight to the next", () => {
    const busy = [busyAt("2026-12-08T04:00", "2026-12-08T06:00"), busyAt("2026-12-08T10:00", "2026-12-08T12:00")];
    expect(codes(visit, place, { ...facts, busy })).toEqual([]);
  });

  test("is large enough", () => {
    expect(slotReasons({ ...visit, crewSize: 2 }, place, facts)).toEqual([
      { code: "crew_missing", words: "2 people are needed, 1 chosen", overridable: true },
    ]);
    expect(slotReasons(visit, { ...place, crew: [] }, facts)[0]).toMatchObject({ overridable: false });
  });

  test("has a lead with a license in the site's state; the helper needs none", () => {
    const withKofi = { ...place, crew: [...place.crew, { memberId: KOFI, lead: false }] };
    expect(codes(visit, withKofi, facts)).toEqual([]);
    expect(codes(visit, { ...place, crew: [{ memberId: KOFI, lead: true }] }, facts)).toEqual(["license_missing"]);
    expect(codes(visit, place, { ...facts, siteState: "WI" })).toEqual(["license_missing"]);
    expect(codes({ ...visit, licenses: [{ of: "each", kind: null }] }, withKofi, facts)).toEqual(["license_missing"]);
    expect(codes({ ...visit, licenses: [{ of: "lead", kind: "Master" }] }, place, facts)).toEqual(["license_missing"]);
  });

  test("has a license on the visit's last date, which midnight does not begin", () => {
    const until = (expiresOn: string): SlotFacts => ({
      ...facts,
      licenses: [{ memberId: DARA, kind: "Technician", jurisdiction: "IL", expiresOn }],
    });
    const night: WantedVisit = { ...visit, functions: [], liveBlocks: [] };
    const evening = { ...place, startsLocal: "2026-12-08T20:00" };
    expect(codes(night, evening, until("2026-12-08"))).toEqual([]);
    expect(codes({ ...night, minutes: 241 }, evening, until("2026-12-08"))).toEqual(["license_expired"]);
    expect(codes(night, evening, until("2026-12-07"))).toEqual(["license_expired"]);
  });
});

describe("the site", () => {
  test("lets each function operate in its own window", () => {
    expect(codes(visit, { ...place, startsLocal: "2026-12-08T06:30" }, facts)).toEqual(["outside_window"]);
    expect(codes(visit, { ...place, startsLocal: "2026-12-09T06:00" }, facts)).toEqual(["outside_window"]);
    const both = {
      ...visit,
      liveBlocks: [{ offsetMinutes: 0, minutes: 60, functions: ["fan_shutdown", "notification"] }],
    };
    const reasons = slotReasons(both as WantedVisit, place, facts);
    expect(reasons.map(({ words }) => words)).toEqual([
      "Notification: the live block lies outside every window of the site",
    ]);
  });

  test("that has recorded no window for a function has to be asked first", () => {
    const other: WantedVisit = {
      ...visit,
      functions: ["door_release"],
      liveBlocks: [{ offsetMinutes: 0, minutes: 30, functions: ["door_release"] }],
    };
    expect(slotReasons(other, place, facts)).toEqual([
      { code: "no_window", words: "Door release: the site has no window recorded", overridable: true },
    ]);
  });

  test("counts a function that no live block names as operating through the whole visit", () => {
    expect(codes({ ...visit, liveBlocks: [] }, place, facts)).toEqual(["outside_window"]);
    expect(codes({ ...visit, liveBlocks: [], minutes: 120 }, place, facts)).toEqual([]);
  });

  test("has dates on which nothing is tested, both included", () => {
    const dates = (fromDate: string, toDate: string): SlotFacts => ({
      ...facts,
      noTestDates: [{ functions: ["fan_shutdown"], fromDate, toDate, reason: "exams" }],
    });
    expect(codes(visit, place, dates("2026-12-05", "2026-12-08"))).toEqual(["no_test_date"]);
    expect(codes(visit, place, dates("2026-12-08", "2026-12-10"))).toEqual(["no_test_date"]);
    expect(codes(visit, place, dates("2026-12-09", "2026-12-10"))).toEqual([]);
  });

  test("hears of it in time", () => {
    const now = (at: string): SlotFacts => ({ ...facts, now: toInstant(at, ZONE) });
    // The live block begins at 07:00.
    expect(codes(visit, place, now("2026-12-07T07:00"))).toEqual([]);
    expect(codes(visit, place, now("2026-12-07T07:01"))).toEqual(["notice_too_short"]);
  });

  test("has the live block inside the visit, and that cannot be gone past", () => {
    const long: WantedVisit = { ...visit, minutes: 110 };
    expect(slotReasons(long, place, facts)).toMatchObject([{ code: "live_block_outside_visit", overridable: false }]);
  });
});

test("the due window counts by the visit's own dates", () => {
  const due = (earliest: string, latest: string): WantedVisit => ({ ...visit, due: { earliest, latest } });
  expect(codes(due("2026-12-08", "2026-12-08"), place, facts)).toEqual([]);
  expect(codes(due("2026-12-09", "2026-12-20"), place, facts)).toEqual(["too_early"]);
  expect(codes(due("2026-11-01", "2026-12-07"), place, facts)).toEqual(["too_late"]);
});

// Energy Policy Act of 2005, section 110: in 2026 clocks go forward on March 8 and back on November 1, at 2:00.
describe("nights of clock change", () => {
  const nightly: SlotFacts = {
    ...facts,
    now: new Date("2026-01-01T00:00:00Z"),
    windows: facts.windows.map((window) => ({ ...window, weekdays: [7], startsLocal: "01:00", endsLocal: "04:00" })),
  };
  const live = (minutes: number): WantedVisit => ({
    ...visit,
    minutes,
    liveBlocks: [{ offsetMinutes: 0, minutes, functions: ["fan_shutdown"] }],
    due: { earliest: null, latest: null },
  });

  test("a window from 1:00 to 4:00 lasts two hours in March and four in November", () => {
    const march = { ...place, startsLocal: "2026-03-08T01:00" };
    expect(codes(live(120), march, nightly)).toEqual([]);
    expect(codes(live(121), march, nightly)).toEqual(["outside_window"]);
    const november = { ...place, startsLocal: "2026-11-01T01:00" };
    expect(codes(live(240), november, nightly)).toEqual([]);
    expect(codes(live(241), november, nightly)).toEqual(["outside_window"]);
  });
});

describe("whatever else is booked", () => {
  const minute = fc.integer({ min: -3 * 1440, max: 3 * 1440 });
  const other = fc.record({
    from: minute,
    minutes: fc.integer({ min: 5, max: 600 }),
    memberId: fc.constantFrom(DARA, KOFI),
  });
  const span = spanFrom(toInstant(place.startsLocal, ZONE), visit.minutes);
  const errand = ({ from, minutes, memberId }: { from: number; minutes: number; memberId: string }) => ({
    memberId,
    where: "elsewhere",
    ...spanFrom(new Date(span.startsAt.getTime() + from * 60_000), minutes),
  });

  test("a place without reasons stays without when a visit is added that has nothing to do with it", () => {
    fc.assert(
      fc.property(fc.array(other), (others) => {
        const busy = others
          .map(errand)
          .filter((one) => one.memberId !== DARA || one.endsAt <= span.startsAt || one.startsAt >= span.endsAt);
        expect(slotReasons(visit, place, { ...facts, busy })).toEqual([]);
      }),
    );
  });

  test("a visit of the same person that shares a minute always stands in the way", () => {
    fc.assert(
      fc.property(fc.integer({ min: -599, max: 239 }), fc.integer({ min: 0, max: 600 }), (from, more) => {
        const minutes = Math.max(5, 1 - from) + more;
        const reasons = slotReasons(visit, place, { ...facts, busy: [errand({ from, minutes, memberId: DARA })] });
        expect(reasons.map(({ code, overridable }) => [code, overridable])).toEqual([["crew_busy", false]]);
      }),
    );
  });
});
