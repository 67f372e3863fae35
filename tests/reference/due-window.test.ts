import fc from "fast-check";
import { DateTime } from "luxon";
import { describe, expect, test } from "vitest";
import { type DueSchedule, dueState, dueWindow, occurrences, stepsFrom } from "@/lib/domain/agreements/due-window";
import { intervalRule, RULE_KEYS, STEPS } from "@/lib/domain/agreements/interval-rules";
import { type Anchor, FREQUENCIES, type Frequency } from "@/lib/domain/agreements/words";
import { addDays, addMonths, daysBetween } from "@/lib/domain/shared/zone";

const schedule = (
  key: string,
  frequency: Frequency,
  anchor: Anchor,
  anchorOn: string,
  days: number | null = null,
): DueSchedule => ({ frequency, rule: intervalRule(key, days), anchor, anchorOn });

const done = (date: string) => ({ targetOn: date, doneOn: date });
const words = ({ earliest, target, latest }: ReturnType<typeof dueWindow>) => `${earliest} / ${target} / ${latest}`;

/**
 * Definitions of NFPA 72 (2010), 3.3.106: quarterly 2 to 4 months, semiannual 4 to 8, annual 9 to 15, published at
 * https://keyeslifesafety.com/category/fire-detection-systems/testing-fire-detection-systems/
 * The dates are computed from them (months added, the end of a short month in place of a missing day) and checked
 * against luxon below; nobody publishes them.
 */
describe("NFPA 72: minimum and maximum gap from the last completion", () => {
  test.each([
    ["2026-03-15", "quarterly", "2026-05-15 / 2026-06-15 / 2026-07-15"],
    ["2026-03-15", "semiannual", "2026-07-15 / 2026-09-15 / 2026-11-15"],
    ["2026-03-15", "annual", "2026-12-15 / 2027-03-15 / 2027-06-15"],
    ["2026-08-31", "quarterly", "2026-10-31 / 2026-11-30 / 2026-12-31"],
    ["2026-08-31", "semiannual", "2026-12-31 / 2027-02-28 / 2027-04-30"],
    ["2026-08-31", "annual", "2027-05-31 / 2027-08-31 / 2027-11-30"],
    ["2024-02-29", "quarterly", "2024-04-29 / 2024-05-29 / 2024-06-29"],
    ["2024-02-29", "semiannual", "2024-06-29 / 2024-08-29 / 2024-10-29"],
    ["2024-02-29", "annual", "2024-11-29 / 2025-02-28 / 2025-05-29"],
  ] as const)("last done %s, %s: %s", (last, frequency, window) => {
    expect(words(dueWindow(schedule("nfpa_72", frequency, "last_done", last), done(last)))).toBe(window);
    expect(words(dueWindow(schedule("nfpa_72", frequency, "fixed", last), done(last)))).toBe(window);
  });

  // Same page: weekly is once per calendar week, monthly once per calendar month. That the week starts on Sunday is
  // common practice in the United States, no source. 2026-12-01 is a Tuesday.
  test("weekly and monthly lie inside the calendar week and month", () => {
    const weekly = schedule("nfpa_72", "weekly", "fixed", "2026-12-01");
    expect(words(dueWindow(weekly, null))).toBe("2026-11-29 / 2026-12-01 / 2026-12-05");
    const monthly = schedule("nfpa_72", "monthly", "fixed", "2026-01-31");
    expect(words(dueWindow(monthly, done("2026-01-31")))).toBe("2026-02-01 / 2026-02-28 / 2026-02-28");
  });

  test("the rule is silent about what it does not define", () => {
    expect(() => dueWindow(schedule("nfpa_72", "four_yearly", "fixed", "2026-01-01"), null)).toThrow(RangeError);
  });
});

/**
 * NFPA 25: that longer intervals have a minimum and a maximum gap is published at
 * https://www.nfpa.org/News-and-Research/Publications-and-media/Blogs-Landing-Page/NFPA-Today/Blog-Posts/2022/02/04/Sprinkler-System-Inspections-Testing-and-Maintenance-Frequencies-Explained
 * The figures, 30 to 40 and 54 to 66 months, are from memory; the dates are computed.
 */
test.each([
  ["three_yearly", "2028-09-15 / 2029-03-15 / 2029-07-15"],
  ["five_yearly", "2030-09-15 / 2031-03-15 / 2031-09-15"],
] as const)("NFPA 25, %s (from memory): %s", (frequency, window) => {
  expect(words(dueWindow(schedule("nfpa_25", frequency, "last_done", "2026-03-15"), done("2026-03-15")))).toBe(window);
  expect(intervalRule("nfpa_25", null).tolerances[frequency]?.fromMemory).toBe(true);
});

/**
 * The hospital accreditor's definition of 2014 in its two readings. Published worked example, last done March 15:
 * http://keyeslifesafety.com/joint-commission-quarterly-testing-requirements/ (June 5 to 25, or May 21 to July 10).
 * Annual 12 months ± 30 days, semiannual 6 months ± 20 days:
 * https://editthis.info/gvrahe/Acceptable_PM_Completion_Timelines and
 * https://ssr-inc.com/pressroom/compliance-news-tjc-redefines-quarterly-every-3-years-2014 ; those dates are computed.
 */
describe("hospital accreditor", () => {
  test.each<[rule: string, frequency: Frequency, earliest: string, latest: string, mark: string]>([
    ["hospital_by_day", "quarterly", "2026-06-05", "2026-06-25", "published"],
    ["hospital_by_month", "quarterly", "2026-05-21", "2026-07-10", "published"],
    ["hospital_by_day", "semiannual", "2026-08-26", "2026-10-05", "computed"],
    ["hospital_by_day", "annual", "2027-02-13", "2027-04-14", "computed"],
    ["hospital_by_day", "three_yearly", "2029-01-29", "2029-04-29", "from memory: 3 years ± 45 days"],
  ])("%s, %s, last done 2026-03-15: %s to %s (%s)", (key, frequency, earliest, latest) => {
    const window = dueWindow(schedule(key, frequency, "last_done", "2026-03-15"), done("2026-03-15"));
    expect(window).toMatchObject({ earliest, latest });
  });
});

/**
 * Dampers, NFPA 80 19.4.1 and NFPA 105 6.5.2: one year after installation, then every 4 years, in hospitals every 6:
 * https://gtcmechanicalservices.com/fire-damper-inspection-repair . Accepted 2022-06-01; the dates are computed.
 */
test.each([
  ["four_yearly", "2027-06-01"],
  ["six_yearly", "2029-06-01"],
] as const)("dampers accepted 2022-06-01: first 2023-06-01, then %s on %s", (frequency, second) => {
  const first = stepsFrom("2022-06-01", "annual", 1);
  expect(first).toBe("2023-06-01");
  const targets = occurrences(schedule("by_agreement", frequency, "fixed", first, 30), null, "2029-12-31");
  expect(targets.map((window) => window.target).slice(0, 2)).toEqual([first, second]);
});

// No source: what "as agreed" means here, in the words of `dueWindow`.
describe("which date counts", () => {
  test("a fixed anchor on the 31st has each month's last day, and the 31st again where there is one", () => {
    const monthly = schedule("nfpa_72", "monthly", "fixed", "2027-10-31");
    const targets = occurrences(monthly, null, "2028-03-31").map((window) => window.target);
    expect(targets).toEqual(["2027-10-31", "2027-11-30", "2027-12-31", "2028-01-31", "2028-02-29", "2028-03-31"]);
  });

  test("a fixed anchor on a leap day comes back to it", () => {
    const yearly = schedule("nfpa_72", "annual", "fixed", "2024-02-29");
    const targets = occurrences(yearly, null, "2028-12-31").map((window) => window.target);
    expect(targets).toEqual(["2024-02-29", "2025-02-28", "2026-02-28", "2027-02-28", "2028-02-29"]);
  });

  test("a late completion does not move the calendar, but the gap counts from it", () => {
    const window = dueWindow(schedule("nfpa_72", "annual", "fixed", "2026-03-15"), {
      targetOn: "2026-03-15",
      doneOn: "2026-06-01",
    });
    expect(words(window)).toBe("2027-03-01 / 2027-03-15 / 2027-09-01");
  });

  test("a very late one pushes the next target to the least gap, and the one after is on the calendar again", () => {
    const yearly = schedule("nfpa_72", "annual", "fixed", "2026-03-15");
    const next = dueWindow(yearly, { targetOn: "2026-03-15", doneOn: "2026-09-01" });
    expect(words(next)).toBe("2027-06-01 / 2027-06-01 / 2027-12-01");
    expect(dueWindow(yearly, { targetOn: next.target, doneOn: next.target }).target).toBe("2028-03-15");
  });

  test("what was done after the next date had come counts for that one too", () => {
    const monthly = schedule("nfpa_72", "monthly", "fixed", "2026-01-15");
    expect(dueWindow(monthly, { targetOn: "2026-05-15", doneOn: "2026-06-20" }).target).toBe("2026-07-15");
  });

  test("from the last completion, yearly tests done at 15 months give 4 in 5 years", () => {
    const yearly = schedule("nfpa_72", "annual", "last_done", "2026-01-01");
    let last = "2026-01-01";
    for (let i = 0; i < 4; i++) last = dueWindow(yearly, done(last)).latest;
    expect(last).toBe("2031-01-01");
  });
});

test("where a day stands in a window", () => {
  const window = { earliest: "2026-12-15", target: "2027-03-15", latest: "2027-06-15" };
  expect(dueState(window, "2026-10-01")).toEqual({ state: "early", daysLeft: 257 });
  expect(dueState(window, "2026-12-01")).toEqual({ state: "soon", daysLeft: 196 });
  expect(dueState(window, "2026-12-15")).toEqual({ state: "due", daysLeft: 182 });
  expect(dueState(window, "2027-06-15")).toEqual({ state: "due", daysLeft: 0 });
  expect(dueState(window, "2027-06-16")).toEqual({ state: "overdue", daysLeft: -1 });
});

const date = fc
  .integer({ min: 0, max: daysBetween("2000-01-01", "2060-12-31") })
  .map((days) => addDays("2000-01-01", days));
const anySchedule = fc
  .record({
    key: fc.constantFrom(...RULE_KEYS),
    frequency: fc.constantFrom(...FREQUENCIES),
    anchor: fc.constantFrom("fixed" as const, "last_done" as const),
    anchorOn: date,
    days: fc.integer({ min: 0, max: 60 }),
  })
  .map(({ key, frequency, anchor, anchorOn, days }) => schedule(key, frequency, anchor, anchorOn, days))
  .filter(({ rule, frequency }) => rule.tolerances[frequency] !== undefined);

describe("month arithmetic against luxon", () => {
  const luxon = (from: string, months: number) => DateTime.fromISO(from, { zone: "utc" }).plus({ months }).toISODate();

  test("any date, 150 years either way", () => {
    fc.assert(
      fc.property(date, fc.integer({ min: -1800, max: 1800 }), (from, months) => {
        expect(addMonths(from, months)).toBe(luxon(from, months));
      }),
      { numRuns: 5000 },
    );
  });

  test("days, and the distance between dates", () => {
    fc.assert(
      fc.property(date, fc.integer({ min: -40_000, max: 40_000 }), (from, days) => {
        const to = DateTime.fromISO(from, { zone: "utc" }).plus({ days }).toISODate() ?? "";
        expect(addDays(from, days)).toBe(to);
        expect(daysBetween(from, to)).toBe(days);
      }),
    );
  });

  test("the nth target of a fixed anchor is n steps from the anchor itself", () => {
    const yearly = FREQUENCIES.filter((frequency) => "months" in STEPS[frequency]);
    fc.assert(
      fc.property(fc.constantFrom(...yearly), date, fc.integer({ min: 1, max: 12 }), (frequency, anchorOn, n) => {
        const step = STEPS[frequency];
        const fixed = schedule("by_agreement", frequency, "fixed", anchorOn, 10);
        const expected = luxon(anchorOn, ("months" in step ? step.months : 0) * n);
        expect(
          dueWindow(fixed, done(luxon(anchorOn, ("months" in step ? step.months : 0) * (n - 1)) ?? "")).target,
        ).toBe(expected);
      }),
    );
  });
});

describe("of any schedule and any completion", () => {
  const anyLast = fc.option(fc.record({ targetOn: date, late: fc.integer({ min: -400, max: 800 }) }), { nil: null });

  test("earliest, target and latest are in order", () => {
    fc.assert(
      fc.property(anySchedule, anyLast, (any, last) => {
        const window = dueWindow(any, last && { targetOn: last.targetOn, doneOn: addDays(last.targetOn, last.late) });
        expect(window.earliest <= window.target && window.target <= window.latest).toBe(true);
      }),
      { numRuns: 3000 },
    );
  });

  test("windows of successive occurrences are in order, each date of them", () => {
    fc.assert(
      fc.property(anySchedule, (any) => {
        const found = occurrences(any, null, addDays(any.anchorOn, 4000)).slice(0, 60);
        expect(found.length).toBeGreaterThan(0);
        for (const [i, next] of found.slice(1).entries()) {
          const before = found[i];
          expect(before && next.target > before.target).toBe(true);
          expect(before && next.earliest >= before.earliest && next.latest >= before.latest).toBe(true);
        }
      }),
    );
  });

  test("a fixed anchor never drifts: done anywhere in its window, the next target is on the calendar or held by the gap", () => {
    fc.assert(
      fc.property(
        anySchedule.map((any) => ({ ...any, anchor: "fixed" as const })),
        fc.array(fc.double({ min: 0, max: 1, noNaN: true }), { minLength: 1, maxLength: 12 }),
        (fixed, places) => {
          const calendar = new Set(
            Array.from({ length: 400 }, (_, n) => stepsFrom(fixed.anchorOn, fixed.frequency, n)),
          );
          let last: { targetOn: string; doneOn: string } | null = null;
          for (const place of places) {
            const window: ReturnType<typeof dueWindow> = dueWindow(fixed, last);
            const { earliest, target, latest } = window;
            expect(calendar.has(target) || target === earliest || target === latest).toBe(true);
            const doneOn = addDays(earliest, Math.round(place * daysBetween(earliest, latest)));
            last = { targetOn: target, doneOn };
          }
        },
      ),
    );
  });
});
