import { toInstant } from "../shared/zone";
import { crewReasons } from "./crew-reasons";
import { operatedIn, siteReasons, windowsBetween } from "./site-reasons";
import { type Place, type SlotFacts, type SlotReason, spanFrom, type WantedVisit } from "./slot";

/** Everything that stands against a visit at a place and time, the crew first; an empty list means: book it. */
export function slotReasons(visit: WantedVisit, place: Place, facts: SlotFacts): SlotReason[] {
  const span = spanFrom(toInstant(place.startsLocal, place.zone), visit.minutes);
  const windows = windowsBetween(facts.windows, span, place.zone);
  return [
    ...crewReasons(visit, place, span, facts),
    ...siteReasons({ ...visit, liveBlocks: operatedIn(visit) }, span, place.zone, { ...facts, windows }),
  ];
}
