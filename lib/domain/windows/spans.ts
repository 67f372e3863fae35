import type { SystemFunction } from "@/lib/domain/systems/words";
import { addDays, type CalendarDate, toInstant, type Zone } from "../shared/zone";

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

/** Every opening of a window that starts on a date from `from` to `to`, both included. */
export function windowSpans(window: TestWindow, from: CalendarDate, to: CalendarDate, zone: Zone) {
  const spans: { startsAt: Date; endsAt: Date }[] = [];
  for (let date = from; date <= to; date = addDays(date, 1)) {
    const opens = window.onDate ? window.onDate === date : window.weekdays.includes(isoWeekday(date));
    if (!opens || (window.fromDate && date < window.fromDate) || (window.toDate && date > window.toDate)) continue;
    const last = window.endsLocal <= window.startsLocal ? addDays(date, 1) : date;
    const [startsAt, endsAt] = [`${date}T${window.startsLocal}`, `${last}T${window.endsLocal}`];
    spans.push({ startsAt: toInstant(startsAt, zone), endsAt: toInstant(endsAt, zone) });
  }
  return spans;
}
