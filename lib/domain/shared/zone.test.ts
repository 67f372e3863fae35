import { describe, expect, test } from "vitest";
import { addDays, calendarDate, daysBetween, isZone, startOfDate, toInstant, toLocalTime } from "./zone";

// Clock changes of 2026 in the United States: second Sunday of March and first Sunday of November, 2:00 local time
// (Energy Policy Act of 2005, section 110).
describe("nights of clock change", () => {
  test("a reading that occurs twice is the first of the two (RFC 5545, 3.3.5)", () => {
    expect(toInstant("2026-11-01T01:30", "America/Chicago").toISOString()).toBe("2026-11-01T06:30:00.000Z");
  });

  test("a reading that is skipped is read with the offset before the gap (RFC 5545, 3.3.5)", () => {
    expect(toInstant("2026-03-08T02:30", "America/Chicago").toISOString()).toBe("2026-03-08T08:30:00.000Z");
  });

  test("the night of the change back lasts 25 hours from midnight to midnight", () => {
    const hours =
      (startOfDate("2026-11-02", "America/Los_Angeles").getTime() -
        startOfDate("2026-11-01", "America/Los_Angeles").getTime()) /
      3_600_000;
    expect(hours).toBe(25);
  });
});

test("zone data is newer than the runtime's: British Columbia keeps -07 from March 2026 (tz 2026a ff., NEWS)", () => {
  expect(toLocalTime(new Date("2026-12-15T12:00:00Z"), "America/Vancouver")).toBe("2026-12-15T05:00");
});

test("a calendar date belongs to the site's zone", () => {
  const instant = new Date("2026-12-01T04:00:00Z");
  expect(calendarDate(instant, "America/Los_Angeles")).toBe("2026-11-30");
  expect(calendarDate(instant, "Europe/Berlin")).toBe("2026-12-01");
});

test("days are counted on the calendar, across clock changes and leap days", () => {
  expect(addDays("2028-02-28", 1)).toBe("2028-02-29");
  expect(daysBetween("2026-10-31", "2026-11-02")).toBe(2);
});

test("a zone is an IANA name with an area", () => {
  expect(isZone("America/Chicago")).toBe(true);
  expect(isZone("EST")).toBe(false);
  expect(isZone("America/Nowhere")).toBe(false);
});
