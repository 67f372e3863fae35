import { calendarDate, dateWords, toLocalTime } from "../shared/zone";
import type { LicenseDemand, Place, SlotFacts, SlotReason, Span, WantedVisit } from "./slot";

type Crew = Place["crew"];
type CrewFacts = Pick<SlotFacts, "names" | "busy" | "licenses" | "siteState">;

/** What stands in the way on the side of those who go. */
export function crewReasons(
  visit: Pick<WantedVisit, "crewSize" | "licenses">,
  { crew, zone }: Pick<Place, "crew" | "zone">,
  span: Span,
  facts: CrewFacts,
): SlotReason[] {
  const lastDate = calendarDate(new Date(span.endsAt.getTime() - 1), zone);
  return [
    ...missing(crew, visit.crewSize),
    ...crew.flatMap(({ memberId }) => busy(memberId, span, zone, facts)),
    ...visit.licenses.flatMap((demand) => unlicensed(demand, crew, lastDate, facts)),
  ];
}

function missing(crew: Crew, crewSize: number): SlotReason[] {
  if (crew.length >= crewSize && crew.length > 0) return [];
  const words = crew.length === 0 ? "Nobody is chosen" : `${crewSize} people are needed, ${crew.length} chosen`;
  return [{ code: "crew_missing", words, overridable: crew.length > 0 }];
}

function busy(memberId: string, span: Span, zone: string, { busy, names }: CrewFacts): SlotReason[] {
  const clock = (at: Date) => toLocalTime(at, zone).slice(11);
  return busy
    .filter((other) => other.memberId === memberId && other.startsAt < span.endsAt && span.startsAt < other.endsAt)
    .map(({ where, startsAt, endsAt }) => ({
      code: "crew_busy",
      words: `${nameOf(memberId, names)} is at ${where} from ${clock(startsAt)} to ${clock(endsAt)}`,
      overridable: false,
    }));
}

function unlicensed(demand: LicenseDemand, crew: Crew, lastDate: string, facts: CrewFacts): SlotReason[] {
  const asked = demand.of === "lead" ? crew.filter((one) => one.lead) : crew;
  return asked.flatMap(({ memberId }): SlotReason[] => {
    const held = facts.licenses
      .filter((one) => one.memberId === memberId && one.jurisdiction === facts.siteState)
      .filter((one) => demand.kind === null || one.kind === demand.kind)
      .map((one) => one.expiresOn)
      .sort();
    const last = held.at(-1);
    const name = nameOf(memberId, facts.names);
    const what = `${demand.kind ?? "license"} in ${facts.siteState}`;
    if (!last) return [{ code: "license_missing", words: `${name} holds no ${what}`, overridable: true }];
    if (last >= lastDate) return [];
    return [{ code: "license_expired", words: `${name}’s ${what} ends on ${dateWords(last)}`, overridable: true }];
  });
}

const nameOf = (memberId: string, names: CrewFacts["names"]): string => names[memberId] ?? "This person";
