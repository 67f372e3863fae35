import { type CalendarDate, dateWords } from "@/lib/domain/shared/zone";
import type { Completion, DueSchedule, DueState } from "./due-window";
import type { IntervalRule, Tolerance } from "./interval-rules";
import type { Frequency } from "./words";

/** What a tolerance asks, for people. */
export function toleranceWords(tolerance: Tolerance): string {
  switch (tolerance.kind) {
    case "calendar_week":
      return "once in each calendar week";
    case "calendar_month":
      return "once in each calendar month";
    case "gap":
      return `${tolerance.minMonths} to ${tolerance.maxMonths} months after the last one`;
    case "after_day":
      return `counted from the day of the last one, give or take ${days(tolerance.days)}`;
    case "after_month":
      return `counted from the month of the last one, give or take ${days(tolerance.days)} at its two ends`;
    case "around_target":
      return tolerance.days === 0 ? "on the agreed date" : `${days(tolerance.days)} either way of the agreed date`;
  }
}

const days = (count: number): string => `${count} ${count === 1 ? "day" : "days"}`;

/** Which edition of which rule, where from, and whether anybody has read the figure. */
export function ruleWords(rule: IntervalRule, frequency: Frequency): string {
  const tolerance = rule.tolerances[frequency];
  if (!tolerance) return `${rule.title} (${rule.edition}): says nothing of this frequency`;
  const memory = tolerance.fromMemory ? " (figure from memory: check it)" : "";
  return `${rule.title} (${rule.edition}): ${toleranceWords(tolerance)}${memory}`;
}

/** How a window was reckoned, so that anybody can check it by hand. */
export function reckoningWords(schedule: DueSchedule, last: Completion | null): string {
  const from = last ? `Last done ${dateWords(last.doneOn)}.` : "Nothing recorded as done before.";
  const target =
    schedule.anchor === "fixed"
      ? `The target keeps the calendar from ${dateWords(schedule.anchorOn)}.`
      : last
        ? "The target counts from the last completion."
        : `The first target is ${dateWords(schedule.anchorOn)}.`;
  return `${ruleWords(schedule.rule, schedule.frequency)}. ${from} ${target}`;
}

export const DUE_STATE_WORDS: Record<DueState, string> = {
  overdue: "Overdue",
  due: "Due now",
  soon: "Due soon",
  early: "Too early",
};

/** `3 days left`, `overdue by 3 days`, `opens in 12 days`. */
export function leftWords(state: DueState, daysLeft: number, untilOpen: number): string {
  if (state === "overdue") return `overdue by ${days(-daysLeft)}`;
  if (state === "due") return daysLeft === 0 ? "last day today" : `${days(daysLeft)} left`;
  return `opens in ${days(untilOpen)}`;
}

/** `Dec 15, 2026` is enough in a list. */
export const shortDate = (date: CalendarDate): string => dateWords(date).slice(5);
