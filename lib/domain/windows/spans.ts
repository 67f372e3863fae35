import type { SystemFunction } from "@/lib/domain/systems/words";
import { addDays, type CalendarDate, readingReached, type Zone } from "../shared/zone";

/** When a site lets given functions operate, by the wall clock there. */
export type TestWindow = {
  functions: SystemFunction[];
  weekdays: number[];
  onDate: CalendarDate | null;
  startsLocal: string;
  endsLocal: string;
  fromDate: CalendarDate | null;
  toDate: CalendarDate | null;
  noticeHours: number;
};

export type NoTestDate = { functions: SystemFunction[]; fromDate: CalendarDate; toDate: CalendarDate; reason: string };

const isoWeekday = (date: CalendarDate) => new Date(`${date}T00:00Z`).getUTCDay() || 7;

/**
 * Every opening of a window that starts on a date from `from` to `to`, both included. It lasts as long as the clock on
 * the wall takes from start to end: over a night of clock change an hour less, or more.
 */
export function windowSpans(window: TestWindow, from: CalendarDate, to: CalendarDate, zone: Zone) {
  const spans: { startsAt: Date; endsAt: Date }[] = [];
  for (let date = from; date <= to; date = addDays(date, 1)) {
    const opens = window.onDate ? window.onDate === date : window.weekdays.includes(isoWeekday(date));
    if (!opens || (window.fromDate && date < window.fromDate) || (window.toDate && date > window.toDate)) continue;
    const last = window.endsLocal <= window.startsLocal ? addDays(date, 1) : date;
    const startsAt = readingReached(`${date}T${window.startsLocal}`, zone);
    const endsAt = readingReached(`${last}T${window.endsLocal}`, zone);
    // A window that lies wholly in the hour that is skipped does not open that night.
    if (startsAt < endsAt) spans.push({ startsAt, endsAt });
  }
  return spans;
}

/** What forbids any of the functions to operate on a date. */
export const noTestOn = (dates: readonly NoTestDate[], functions: readonly SystemFunction[], date: CalendarDate) =>
  dates.filter(
    (one) => one.fromDate <= date && date <= one.toDate && one.functions.some((each) => functions.includes(each)),
  );
