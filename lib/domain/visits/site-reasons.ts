import { FUNCTION_WORDS, type SystemFunction } from "@/lib/domain/systems/words";
import { type NoTestDate, noTestOn, type TestWindow, windowSpans } from "@/lib/domain/windows/spans";
import { addDays, type CalendarDate, calendarDate, dateWords, type Zone } from "../shared/zone";
import { type LiveBlock, type SlotReason, type Span, spanFrom, type WantedVisit, within } from "./slot";

/** Times at which functions may operate, each with the notice that it asks for. */
export type OpenSpan = Span & { functions: readonly SystemFunction[]; noticeHours: number };

/** What the site allows around some time; `known` names the functions that any window speaks of at all. */
export type OpenTimes = { known: ReadonlySet<SystemFunction>; spans: readonly OpenSpan[] };

export function windowsBetween(windows: readonly TestWindow[], { startsAt, endsAt }: Span, zone: Zone): OpenTimes {
  // A window that began the evening before may reach into the day.
  const from = addDays(calendarDate(startsAt, zone), -1);
  const to = calendarDate(endsAt, zone);
  return {
    known: new Set(windows.flatMap((window) => window.functions)),
    spans: windows.flatMap((window) =>
      windowSpans(window, from, to, zone).map(({ startsAt, endsAt }) => ({
        startsAt,
        endsAt,
        functions: window.functions,
        noticeHours: window.noticeHours,
      })),
    ),
  };
}

/** The live blocks, and the whole visit for functions that none of them names. */
export function operatedIn({ minutes, functions, liveBlocks }: WantedVisit): LiveBlock[] {
  const named = new Set(liveBlocks.flatMap((block) => block.functions));
  const rest = functions.filter((one) => !named.has(one));
  return rest.length === 0 ? [...liveBlocks] : [...liveBlocks, { offsetMinutes: 0, minutes, functions: rest }];
}

type SiteFacts = { now: Date; windows: OpenTimes; noTestDates: readonly NoTestDate[] };

/** What stands in the way on the side of the building and the calendar. */
export function siteReasons(
  visit: Pick<WantedVisit, "minutes" | "liveBlocks" | "due">,
  span: Span,
  zone: Zone,
  facts: SiteFacts,
): SlotReason[] {
  return [
    ...visit.liveBlocks.flatMap((block) => blockReasons(block, visit.minutes, span, zone, facts)),
    ...dueReasons(visit.due, span, zone),
  ];
}

function blockReasons(block: LiveBlock, visitMinutes: number, span: Span, zone: Zone, facts: SiteFacts): SlotReason[] {
  const startsAt = new Date(span.startsAt.getTime() + block.offsetMinutes * 60_000);
  const live = spanFrom(startsAt, block.minutes);
  const reasons: SlotReason[] = [];
  if (block.offsetMinutes < 0 || block.offsetMinutes + block.minutes > visitMinutes)
    reasons.push({
      code: "live_block_outside_visit",
      words: "The live block does not lie inside the visit",
      overridable: false,
    });
  for (const one of block.functions) {
    reasons.push(...windowReasons(one, live, facts), ...noTestReasons(one, live, zone, facts.noTestDates));
  }
  return reasons;
}

function windowReasons(one: SystemFunction, live: Span, { windows, now }: SiteFacts): SlotReason[] {
  const word = FUNCTION_WORDS[one];
  if (!windows.known.has(one))
    return [{ code: "no_window", words: `${word}: the site has no window recorded`, overridable: true }];
  const around = windows.spans.filter((open) => open.functions.includes(one) && within(live, open));
  if (around.length === 0) {
    const words = `${word}: the live block lies outside every window of the site`;
    return [{ code: "outside_window", words, overridable: true }];
  }
  const notice = Math.min(...around.map((open) => open.noticeHours));
  if (live.startsAt.getTime() - now.getTime() >= notice * 3_600_000) return [];
  const words = `${word}: the site asks for ${notice} hours’ notice`;
  return [{ code: "notice_too_short", words, overridable: true }];
}

function noTestReasons(one: SystemFunction, live: Span, zone: Zone, noTestDates: readonly NoTestDate[]): SlotReason[] {
  const [first, last] = datesOf(live, zone);
  const hit = [first, last].flatMap((date) => noTestOn(noTestDates, [one], date)).at(0);
  if (!hit) return [];
  return [{ code: "no_test_date", words: `${FUNCTION_WORDS[one]}: no tests then, ${hit.reason}`, overridable: true }];
}

/** The first and the last calendar date of a span; midnight at its end belongs to the day before. */
const datesOf = ({ startsAt, endsAt }: Span, zone: Zone): [CalendarDate, CalendarDate] => [
  calendarDate(startsAt, zone),
  calendarDate(new Date(endsAt.getTime() - 1), zone),
];

function dueReasons({ earliest, latest }: WantedVisit["due"], span: Span, zone: Zone): SlotReason[] {
  const [first, last] = datesOf(span, zone);
  if (earliest && first < earliest)
    return [{ code: "too_early", words: `The due window opens on ${dateWords(earliest)}`, overridable: true }];
  if (latest && last > latest)
    return [{ code: "too_late", words: `The due window ends on ${dateWords(latest)}`, overridable: true }];
  return [];
}
