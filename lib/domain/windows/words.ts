import { FUNCTION_WORDS, type SystemFunction } from "@/lib/domain/systems/words";
import { addDays, type CalendarDate, calendarDate, dateWords, type Zone } from "../shared/zone";
import { type NoTestDate, noTestOn, type TestWindow, windowSpans } from "./spans";

/** ISO 8601: Monday is 1. */
export const WEEKDAYS = ["Mon", "Tue", "Wed", "Thu", "Fri", "Sat", "Sun"] as const;

export const functionsWords = (functions: readonly SystemFunction[]): string =>
  functions.map((one) => FUNCTION_WORDS[one]).join(", ");

/** `Mon, Tue, 22:00 to 06:00 the next day`. */
export function windowWords(window: Omit<TestWindow, "functions" | "noticeHours">): string {
  const days = window.onDate
    ? dateWords(window.onDate)
    : window.weekdays.length === WEEKDAYS.length
      ? "Every day"
      : [...window.weekdays]
          .sort()
          .map((day) => WEEKDAYS[day - 1])
          .join(", ");
  const overnight = window.endsLocal <= window.startsLocal ? " the next day" : "";
  return `${days}, ${window.startsLocal} to ${window.endsLocal}${overnight}`;
}

/** `from Jan 5, 2027 to Mar 1, 2027`, or nothing where it holds all year. */
export const seasonWords = ({ fromDate, toDate }: Pick<TestWindow, "fromDate" | "toDate">): string =>
  [fromDate && `from ${dateWords(fromDate)}`, toDate && `until ${dateWords(toDate)}`].filter(Boolean).join(" ");

const DAYS_AHEAD = 62;

/** The next time that the window is open for all its functions, no-test dates left out, within two months. */
export function nextOpening(window: TestWindow, noTestDates: readonly NoTestDate[], now: Date, zone: Zone) {
  const today = calendarDate(now, zone);
  const spans = windowSpans(window, addDays(today, -1), addDays(today, DAYS_AHEAD), zone);
  const last = (endsAt: Date): CalendarDate => calendarDate(new Date(endsAt.getTime() - 1), zone);
  return spans.find(
    ({ startsAt, endsAt }) =>
      endsAt > now &&
      [calendarDate(startsAt, zone), last(endsAt)].every(
        (date) => noTestOn(noTestDates, window.functions, date).length === 0,
      ),
  );
}
