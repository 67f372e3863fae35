export type VisitFacts = { endsAt: Date; canceledAt: Date | null };
export type VisitState = "planned" | "missed" | "canceled";

export const VISIT_STATE_WORDS: Record<VisitState, string> = {
  planned: "Planned",
  missed: "Missed",
  canceled: "Canceled",
};

/** The state in words, from stored facts and the given instant; never stored itself. */
export function visitState(visit: VisitFacts, now: Date): VisitState {
  if (visit.canceledAt) return "canceled";
  return visit.endsAt <= now ? "missed" : "planned";
}
