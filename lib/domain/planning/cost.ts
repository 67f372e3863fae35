import { type CalendarDate, calendarDate, daysBetween, type Zone } from "../shared/zone";
import type { Span } from "../visits/slot";
import { type Coordinates, travelMinutes } from "./travel";

/** A visit that somebody has already, and where it is. */
export type Errand = Span & { memberId: string; where: string; latitude: number | null; longitude: number | null };

type Somewhere = { latitude: number | null; longitude: number | null };

/** What a place on the run sheet costs beyond the visit itself. */
export type SlotCost = {
  /** An estimate; null where a place is not on the map. */
  travel: { minutes: number; from: string } | null;
  /** The way takes longer than the time between the visits. */
  tight: boolean;
  overtimeMinutes: number;
  daysLate: number;
};

/** Work on visits beyond this on one date counts as overtime here; the way there does not. */
export const WORKDAY_MINUTES = 480;

type Wanted = {
  span: Span;
  site: Somewhere;
  home: Somewhere;
  errands: readonly Errand[];
  /** The company's: in which the day of those who work is reckoned. */
  zone: Zone;
  latest: CalendarDate | null;
};

const minutesOf = ({ startsAt, endsAt }: Span) => (endsAt.getTime() - startsAt.getTime()) / 60_000;

const onMap = ({ latitude, longitude }: Somewhere): Coordinates | null =>
  latitude === null || longitude === null ? null : { latitude, longitude };

export function costOf({ span, site, home, errands, zone, latest }: Wanted): SlotCost {
  const date = calendarDate(span.startsAt, zone);
  const thatDay = errands.filter((errand) => calendarDate(errand.startsAt, zone) === date);
  const previous = thatDay.filter((errand) => errand.endsAt <= span.startsAt).at(-1);
  const [from, to] = [onMap(previous ?? home), onMap(site)];
  const travel = from && to ? { minutes: travelMinutes(from, to), from: previous?.where ?? "home" } : null;
  const gap = previous ? minutesOf({ startsAt: previous.endsAt, endsAt: span.startsAt }) : Number.POSITIVE_INFINITY;
  const worked = thatDay.reduce((sum, errand) => sum + minutesOf(errand), minutesOf(span));
  return {
    travel,
    tight: travel !== null && travel.minutes > gap,
    overtimeMinutes: Math.max(0, worked - WORKDAY_MINUTES),
    daysLate: latest && date > latest ? daysBetween(latest, date) : 0,
  };
}
