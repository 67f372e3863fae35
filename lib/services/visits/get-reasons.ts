import { ReasonsInput } from "@/lib/domain/visits/schemas";
import { slotReasons } from "@/lib/domain/visits/slot-reasons";
import { query } from "@/lib/services/command";
import { placeOf, spanOf, wantedOf } from "./placing";
import { slotFacts } from "./slot-facts";
import { wantedVisit } from "./wanted";

/** What stands against a visit exactly as somebody is about to book or move it. */
export const getReasons = query({
  name: "visit.reasons",
  needs: "visit:write",
  input: ReasonsInput,
  async run({ tx, now }, { jobId, visitId, ...placing }) {
    const { job, site } = await wantedVisit(tx, { jobId, visitId });
    const span = spanOf(placing, site.zone);
    const except = visitId ? [visitId] : [];
    const facts = await slotFacts(tx, { site, memberIds: placing.crew, span, except, now });
    return { reasons: slotReasons(wantedOf(placing, job), placeOf(placing, site.zone), facts) };
  },
});
