import moment from "moment-timezone";

/**
 * The only converter between wall clocks and instants. Its zone data comes from a package and is newer than the
 * runtime's own, so `Intl` is never asked about a site's zone.
 */
export const zoneDataVersion: string = moment.tz.dataVersion;

/** An IANA zone name, for example `America/Chicago`. */
export type Zone = string;
/** A calendar date, `YYYY-MM-DD`. */
export type CalendarDate = string;
/** A wall clock reading without a zone, `YYYY-MM-DDTHH:mm`. */
export type LocalTime = string;

const LOCAL_FORMAT = "YYYY-MM-DDTHH:mm";

export const isZone = (name: string): boolean => moment.tz.zone(name) !== null && name.includes("/");

/** Names of all zones of one country (ISO 3166-1 alpha-2), sorted. */
export const zonesOfCountry = (country: string): Zone[] => moment.tz.zonesForCountry(country).slice().sort();

/**
 * The instant of a wall clock reading. Of a reading that occurs twice (clocks go back) the first; a reading that is
 * skipped (clocks go forward) is moved on by the gap, as RFC 5545 section 3.3.5 asks.
 */
export const toInstant = (local: LocalTime, zone: Zone): Date => moment.tz(local, LOCAL_FORMAT, true, zone).toDate();

/** The first instant at which the clock there shows the reading, or, where it is skipped, has passed it. */
export function readingReached(local: LocalTime, zone: Zone): Date {
  const at = toInstant(local, zone);
  if (toLocalTime(at, zone) === local) return at;
  const changes = moment.tz.zone(zone)?.untils ?? [];
  const change = changes.filter((ms): ms is number => ms !== null && ms <= at.getTime()).at(-1);
  return change === undefined ? at : new Date(change);
}

export const toLocalTime = (instant: Date, zone: Zone): LocalTime => moment.tz(instant, zone).format(LOCAL_FORMAT);

export const calendarDate = (instant: Date, zone: Zone): CalendarDate => toLocalTime(instant, zone).slice(0, 10);

export const startOfDate = (date: CalendarDate, zone: Zone): Date => toInstant(`${date}T00:00`, zone);

const DAY_MS = 86_400_000;
const midnightUtc = (date: CalendarDate): number => Date.parse(`${date}T00:00:00Z`);
const dateOf = (ms: number): CalendarDate => new Date(ms).toISOString().slice(0, 10);

/** Calendar dates count in days, whatever the clocks do. */
export const addDays = (date: CalendarDate, days: number): CalendarDate => dateOf(midnightUtc(date) + days * DAY_MS);

export const daysBetween = (from: CalendarDate, to: CalendarDate): number =>
  (midnightUtc(to) - midnightUtc(from)) / DAY_MS;

export const earlierOf = (a: CalendarDate, b: CalendarDate): CalendarDate => (daysBetween(a, b) < 0 ? b : a);
export const laterOf = (a: CalendarDate, b: CalendarDate): CalendarDate => (daysBetween(a, b) > 0 ? b : a);

/** The same day of the month so many months on (or back); where that month is too short, its last day. */
export function addMonths(date: CalendarDate, months: number): CalendarDate {
  const at = new Date(midnightUtc(date));
  const [year, month] = [at.getUTCFullYear(), at.getUTCMonth() + months];
  const lastDay = new Date(Date.UTC(year, month + 1, 0)).getUTCDate();
  return dateOf(Date.UTC(year, month, Math.min(at.getUTCDate(), lastDay)));
}

/** For people: `Tue, Dec 1, 2026`. */
export const dateWords = (date: CalendarDate): string =>
  moment.utc(date, "YYYY-MM-DD", true).format("ddd, MMM D, YYYY");
