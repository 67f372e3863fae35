import { toLocalTime } from "@/lib/domain/shared/zone";
import { SwapVisitsInput } from "@/lib/domain/visits/schemas";
import { command } from "@/lib/services/command";
import { lockCrew, visitsToChange } from "./placing";
import { type Change, rearrange } from "./rearrange";

/** Two visits exchange their crews, or the times at which they begin, in one step. */
export const swapVisits = command({
  name: "visit.swap",
  needs: "visit:write",
  input: SwapVisitsInput,
  async run({ tx, who, now }, { first, second, exchange, overrides }) {
    const [a, b] = await visitsToChange(tx, [first, second]);
    if (!a || !b) throw new Error("a visit was neither found nor refused");
    const taking = (own: typeof a, other: typeof a): Change => ({
      ...own,
      to:
        exchange === "crews"
          ? { ...own.placing, crew: other.placing.crew }
          : { ...own.placing, startsLocal: toLocalTime(other.visit.startsAt, own.visit.zone) },
    });
    const changes = [taking(a, b), taking(b, a)];
    await lockCrew(tx, who, [...a.placing.crew, ...b.placing.crew]);
    await rearrange(tx, who, changes, overrides, now);
    return {
      result: { visitIds: [first.visitId, second.visitId] },
      audit: changes.map(({ visit, placing, to }) => ({
        entity: "visit",
        entityId: visit.id,
        before: placing,
        after: to,
      })),
    };
  },
});
