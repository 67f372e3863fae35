import type { DueWindow } from "@/lib/domain/agreements/due-window";
import { paths } from "@/lib/domain/shared/paths";
import { addDays, type CalendarDate, dateWords, daysBetween, earlierOf, laterOf } from "@/lib/domain/shared/zone";
import { FUNCTION_WORDS, type SystemFunction } from "@/lib/domain/systems/words";

type Spoken = { functions: readonly SystemFunction[] };
type OpenOn = Spoken & {
  /** ISO 8601, 1 Monday to 7 Sunday; empty for a single date. */
  weekdays: readonly number[];
  onDate: CalendarDate | null;
  fromDate: CalendarDate | null;
  toDate: CalendarDate | null;
};

/** What is known of an occurrence that should be booked. */
export type DueFacts = {
  siteId: string;
  agreementId: string;
  jobId: string | null;
  /** US state of the site. */
  state: string;
  functions: readonly SystemFunction[];
  window: DueWindow;
  today: CalendarDate;
  hasContactWithEmail: boolean;
  testWindows: readonly OpenOn[];
  noTestDates: readonly (Spoken & { fromDate: CalendarDate; toDate: CalendarDate })[];
  /** The last day on which some technician is licensed in the state. */
  licensedUntil: CalendarDate | null;
  hasDeviceList: boolean;
  agreementEndsOn: CalendarDate | null;
  purchaseOrderMissing: boolean;
};

export const OBSTACLES = [
  "agreement_ends",
  "no_contact",
  "no_window",
  "no_test_dates",
  "no_license",
  "no_device_list",
  "no_purchase_order",
] as const;

/** What stands in the way of booking, and where it is mended. */
export type Obstacle = { code: (typeof OBSTACLES)[number]; words: string; href: string };

/** Everything that stands in the way of an occurrence, as far as it can be seen before a time is chosen. */
export function standsInTheWay(facts: DueFacts): Obstacle[] {
  const { window, today, agreementEndsOn, licensedUntil } = facts;
  const site = paths.site(facts.siteId);
  const agreement = paths.agreement(facts.agreementId);
  const found: Obstacle[] = [];
  const add = (code: Obstacle["code"], words: string, href: string) => found.push({ code, words, href });
  // A window that is over is still worth doing: from today on, as soon as can be.
  const from = laterOf(window.earliest, today);
  const to = laterOf(window.latest, today);
  if (agreementEndsOn !== null && agreementEndsOn < from)
    add("agreement_ends", `The agreement ends ${dateWords(agreementEndsOn)}`, agreement);
  if (!facts.hasContactWithEmail) add("no_contact", "No contact with an e-mail address", `${site}#people`);
  const shut = facts.functions.filter((one) => !facts.testWindows.some((open) => opens(open, one, from, to)));
  if (shut.length > 0) add("no_window", `No test window for ${listOf(shut)}`, `${site}#windows`);
  const forbidden = facts.functions.filter((one) => covers(facts.noTestDates, one, from, to));
  if (forbidden.length > 0) add("no_test_dates", `No-test dates cover it for ${listOf(forbidden)}`, `${site}#windows`);
  const needed = laterOf(window.target, today);
  if (licensedUntil === null || licensedUntil < needed)
    add("no_license", `Nobody licensed in ${facts.state} on ${dateWords(needed)}`, paths.people);
  if (!facts.hasDeviceList) add("no_device_list", "No device list yet", `${site}#systems`);
  if (facts.purchaseOrderMissing)
    add("no_purchase_order", "No purchase order yet", facts.jobId ? `${paths.job(facts.jobId)}#terms` : agreement);
  return found;
}

const listOf = (functions: readonly SystemFunction[]): string =>
  functions.map((one) => FUNCTION_WORDS[one].toLowerCase()).join(", ");

/** Whether a test window lets a function operate on any day of a span, both ends included. */
function opens(open: OpenOn, one: SystemFunction, from: CalendarDate, to: CalendarDate): boolean {
  if (!open.functions.includes(one)) return false;
  if (open.onDate !== null) return open.onDate >= from && open.onDate <= to;
  const first = laterOf(open.fromDate ?? from, from);
  const last = earlierOf(open.toDate ?? to, to);
  // Every weekday comes within a week.
  const days = Math.min(daysBetween(first, last), 6);
  for (let day = 0; day <= days; day++) if (open.weekdays.includes(isoWeekday(addDays(first, day)))) return true;
  return false;
}

/** 1970-01-05 was a Monday. */
const isoWeekday = (date: CalendarDate): number => (((daysBetween("1970-01-05", date) % 7) + 7) % 7) + 1;

/** Whether no-test dates leave a function no day of a span, both ends included. */
function covers(dates: DueFacts["noTestDates"], one: SystemFunction, from: CalendarDate, to: CalendarDate): boolean {
  let free = from;
  const spans = dates.filter((span) => span.functions.includes(one));
  for (const span of spans.toSorted((a, b) => (a.fromDate < b.fromDate ? -1 : 1))) {
    if (span.fromDate > free) break;
    if (span.toDate >= free) free = addDays(span.toDate, 1);
  }
  return free > to;
}
