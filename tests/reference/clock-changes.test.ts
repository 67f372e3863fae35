import { execFileSync } from "node:child_process";
import { existsSync, readFileSync } from "node:fs";
import { expect, test } from "vitest";
import { isZone, toInstant, toLocalTime, zoneDataVersion, zonesOfCountry } from "@/lib/domain/shared/zone";

/**
 * Every clock change of every United States zone, 2007 (Energy Policy Act of 2005 in force) to 2037, as `zdump` reads
 * it from the system's zone data (IANA tz, package tzdata). United States rules do not differ between releases 2025b
 * and 2026f, so the two versions, printed, need not be equal.
 */
const ZDUMP = "/usr/bin/zdump";
const ZONE_DATA = "/usr/share/zoneinfo/tzdata.zi";
const missing = [ZDUMP, ZONE_DATA].filter((path) => !existsSync(path));
if (missing.length > 0) console.log(`skipped: ${missing.join(" and ")} not on this machine`);

const MONTHS = "Jan Feb Mar Apr May Jun Jul Aug Sep Oct Nov Dec".split(" ");
const SIDE = /^(\S+)\s+\w{3} (\w{3})\s+(\d+) ([\d:]+) (\d+) UT = .* gmtoff=(-?\d+)$/;

type Side = { zone: string; instant: Date; offsetSeconds: number };

function sidesOfChanges(zones: readonly string[]): Side[] {
  const printed = execFileSync(ZDUMP, ["-v", "-c", "2007,2037", ...zones], { encoding: "utf8", maxBuffer: 1 << 26 });
  return printed.split("\n").flatMap((line) => {
    const found = SIDE.exec(line);
    if (!found) return [];
    const [, zone = "", month = "", day = "", clock = "", year = "", offset = ""] = found;
    const date = `${year}-${String(MONTHS.indexOf(month) + 1).padStart(2, "0")}-${day.padStart(2, "0")}`;
    return [{ zone, instant: new Date(`${date}T${clock}Z`), offsetSeconds: Number(offset) }];
  });
}

const reading = ({ instant, offsetSeconds }: Side) =>
  new Date(instant.getTime() + offsetSeconds * 1000).toISOString().slice(0, 16);

test.skipIf(missing.length > 0)("wall clocks on the nights of clock change agree with zdump", () => {
  const zones = zonesOfCountry("US").filter(isZone);
  const sides = sidesOfChanges(zones).filter(({ instant }) => instant.getUTCFullYear() >= 2007);
  const system = /version (\S+)/.exec(readFileSync(ZONE_DATA, "utf8"))?.[1];
  console.log(
    `${zones.length} zones, ${sides.length} sides of clock changes; system ${system}, ours ${zoneDataVersion}`,
  );
  expect(sides.length).toBeGreaterThan(zones.length * 50);
  const wrong = sides.filter((side) => toLocalTime(side.instant, side.zone) !== reading(side));
  expect(wrong).toEqual([]);
});

test.skipIf(missing.length > 0)("and so do the instants of readings around them", () => {
  const sides = sidesOfChanges(["America/Los_Angeles", "America/Denver", "America/Chicago", "America/New_York"]);
  const hour = 3_600_000;
  const before = sides.filter((side) => side.instant.getUTCSeconds() === 59);
  expect(before.length).toBeGreaterThan(200);
  // An hour and a minute before the change every reading is unique.
  const wrong = before.filter((side) => {
    const instant = new Date(side.instant.getTime() - 59_000 - 2 * hour);
    return toInstant(reading({ ...side, instant }), side.zone).getTime() !== instant.getTime();
  });
  expect(wrong).toEqual([]);
});
