import { costWords } from "@/lib/domain/planning/cost-words";
import type { PlaceBand, Places } from "@/lib/queries/visits";
import { timeOf } from "@/lib/queries/visits";

export type PlaceState = "free" | "override" | "shut";

/** A glyph and a word for each state, so that color tells nothing alone. */
export const PLACE_WORDS: Record<PlaceState, { glyph: string; word: string }> = {
  free: { glyph: "✓", word: "Can go here" },
  override: { glyph: "!", word: "Only with a reason" },
  shut: { glyph: "✕", word: "Cannot go here" },
};

export type PlaceAt = { state: PlaceState; words: string; first: boolean; last: boolean; band: PlaceBand };

const stateOf = ({ reasons }: PlaceBand): PlaceState => {
  if (reasons.length === 0) return "free";
  return reasons.every((reason) => reason.overridable) ? "override" : "shut";
};

/** What is to be said about one start for one person; nothing where nobody can begin. */
export function placeAt(column: Places["columns"][number] | undefined, at: number, stepMs: number): PlaceAt | null {
  const band = column?.bands.find(({ from, to }) => timeOf(from) <= at && at <= timeOf(to));
  if (!band) return null;
  const state = stateOf(band);
  const why = state === "free" ? costWords(band.cost) : band.reasons.map((reason) => reason.words).join(". ");
  return { state, words: why, first: timeOf(band.from) === at, last: timeOf(band.to) < at + stepMs, band };
}
