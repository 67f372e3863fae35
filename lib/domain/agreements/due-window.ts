import { addDays, addMonths, type CalendarDate, daysBetween, earlierOf, laterOf } from "@/lib/domain/shared/zone";
import { type IntervalRule, STEPS, type Tolerance } from "./interval-rules";
import type { Anchor, Frequency } from "./words";

/** Calendar dates at the site, all included: `earliest` ≤ `target` ≤ `latest`. */
export type DueWindow = { earliest: CalendarDate; target: CalendarDate; latest: CalendarDate };

export type DueSchedule = {
  frequency: Frequency;
  rule: IntervalRule;
  /** Whether targets keep the calendar as agreed or follow the last completion. */
  anchor: Anchor;
  /** The first target; a fixed anchor counts every later one from it. */
  anchorOn: CalendarDate;
};

/** An occurrence that was done: which one (its target), and on which day. */
export type Completion = { targetOn: CalendarDate; doneOn: CalendarDate };

/**
 * When the next occurrence is due, in calendar dates of the site's zone.
 *
 * A fixed anchor counts the nth step from `anchorOn` itself, never from the step before, so that an end of month or a
 * leap day never wears down. A completion uses up its own step and every step that had come by the day it was done.
 * Gaps count from the last completion; a target that would lie outside them is moved to their nearer end, and the next
 * one is on the calendar again. With nothing done before, the window lies around `anchorOn` as if the occurrence
 * before it had been done on time.
 *
 * Sources: see `interval-rules.ts`; which anchor counts is the parties' choice, the definitions do not say.
 * @throws RangeError if the rule does not speak of the frequency, or a date is none.
 */
export function dueWindow(schedule: DueSchedule, last: Completion | null): DueWindow {
  const tolerance = schedule.rule.tolerances[schedule.frequency];
  if (!tolerance) throw new RangeError(`${schedule.rule.key} does not speak of ${schedule.frequency}`);
  const target = nextTarget(schedule, last);
  const [earliest, latest] = limits(tolerance, schedule.frequency, target, last);
  return { earliest, target: earlierOf(laterOf(target, earliest), latest), latest };
}

/**
 * The windows whose target lies on or before `until`, as they follow from each other if every occurrence is done on
 * its target. Ordered. Throws as `dueWindow` does.
 */
export function occurrences(schedule: DueSchedule, last: Completion | null, until: CalendarDate): DueWindow[] {
  const found: DueWindow[] = [];
  let next = dueWindow(schedule, last);
  while (next.target <= until) {
    found.push(next);
    next = dueWindow(schedule, { targetOn: next.target, doneOn: next.target });
  }
  return found;
}

/** The date `count` steps after (or, negative, before) a date. */
export function stepsFrom(date: CalendarDate, frequency: Frequency, count: number): CalendarDate {
  const step = STEPS[frequency];
  return "days" in step ? addDays(date, step.days * count) : addMonths(date, step.months * count);
}

function nextTarget({ frequency, anchor, anchorOn }: DueSchedule, last: Completion | null): CalendarDate {
  if (!last) return anchorOn;
  if (anchor === "last_done") return stepsFrom(last.doneOn, frequency, 1);
  const its = nearestStep(anchorOn, frequency, last.targetOn);
  const come = stepBefore(anchorOn, frequency, last.doneOn);
  return stepsFrom(anchorOn, frequency, Math.max(its, come) + 1);
}

/** The last step on or before a date. */
function stepBefore(anchorOn: CalendarDate, frequency: Frequency, date: CalendarDate): number {
  let n = Math.round(daysBetween(anchorOn, date) / daysOf(frequency)) + 1;
  while (stepsFrom(anchorOn, frequency, n) > date) n--;
  return n;
}

function nearestStep(anchorOn: CalendarDate, frequency: Frequency, date: CalendarDate): number {
  const n = stepBefore(anchorOn, frequency, date);
  const since = daysBetween(stepsFrom(anchorOn, frequency, n), date);
  const left = daysBetween(date, stepsFrom(anchorOn, frequency, n + 1));
  return since <= left ? n : n + 1;
}

/** About: only to know where to start looking. */
const daysOf = (frequency: Frequency): number => {
  const step = STEPS[frequency];
  return "days" in step ? step.days : step.months * 30.44;
};

const firstOfMonth = (date: CalendarDate): CalendarDate => `${date.slice(0, 7)}-01`;
const lastOfMonth = (date: CalendarDate): CalendarDate => addDays(addMonths(firstOfMonth(date), 1), -1);
/** 0 Sunday to 6 Saturday; the calendar week of the United States starts on Sunday. 1970-01-04 was a Sunday. */
const weekday = (date: CalendarDate): number => ((daysBetween("1970-01-04", date) % 7) + 7) % 7;

function limits(
  tolerance: Tolerance,
  frequency: Frequency,
  target: CalendarDate,
  last: Completion | null,
): [earliest: CalendarDate, latest: CalendarDate] {
  const step = STEPS[frequency];
  switch (tolerance.kind) {
    case "calendar_week": {
      const sunday = addDays(target, -weekday(target));
      return [sunday, addDays(sunday, 6)];
    }
    case "calendar_month":
      return [firstOfMonth(target), lastOfMonth(target)];
    case "gap": {
      const months = "months" in step ? step.months : 0;
      const [from, before] = last ? [last.doneOn, 0] : [target, months];
      return [addMonths(from, tolerance.minMonths - before), addMonths(from, tolerance.maxMonths - before)];
    }
    case "after_day": {
      const middle = last ? stepsFrom(last.doneOn, frequency, 1) : target;
      return [addDays(middle, -tolerance.days), addDays(middle, tolerance.days)];
    }
    case "after_month": {
      const middle = last ? stepsFrom(firstOfMonth(last.doneOn), frequency, 1) : target;
      // The published example counts both ends from the last day of a month.
      return [addDays(firstOfMonth(middle), -1 - tolerance.days), addDays(lastOfMonth(middle), tolerance.days)];
    }
    case "around_target":
      return [addDays(target, -tolerance.days), addDays(target, tolerance.days)];
  }
}

export const DUE_STATES = ["overdue", "due", "soon", "early"] as const;
export type DueState = (typeof DUE_STATES)[number];

/** A window that opens within so many days is worth planning now; common practice, no source. */
export const SOON_DAYS = 45;

/** Where a day stands in a window. `daysLeft` counts to the latest date: 0 on that day, negative after it. */
export function dueState(window: DueWindow, today: CalendarDate): { state: DueState; daysLeft: number } {
  const daysLeft = daysBetween(today, window.latest);
  if (daysLeft < 0) return { state: "overdue", daysLeft };
  if (today >= window.earliest) return { state: "due", daysLeft };
  return { state: daysBetween(today, window.earliest) <= SOON_DAYS ? "soon" : "early", daysLeft };
}
