import { MoveVisitInput } from "@/lib/domain/visits/schemas";
import { AppError } from "@/lib/errors";
import { command } from "@/lib/services/command";
import { lockCrew, type Placing, visitsToChange } from "./placing";
import { rearrange } from "./rearrange";

/** Another time, another crew, another live block; what is not named stays. */
export const moveVisit = command({
  name: "visit.move",
  needs: "visit:write",
  input: MoveVisitInput,
  async run({ tx, who, now }, { visitId, sequence, overrides, ...wish }) {
    const [standing] = await visitsToChange(tx, [{ visitId, sequence }]);
    if (!standing) throw new Error("a visit was neither found nor refused");
    const { placing } = standing;
    const to: Placing = {
      startsLocal: wish.startsLocal ?? placing.startsLocal,
      minutes: wish.minutes ?? placing.minutes,
      crew: wish.crew ?? placing.crew,
      liveBlocks: wish.liveBlocks ?? placing.liveBlocks,
    };
    if (JSON.stringify(to) === JSON.stringify(placing)) throw new AppError("invalid", "The visit stands there already");
    await lockCrew(tx, who, [...placing.crew, ...to.crew]);
    await rearrange(tx, who, [{ ...standing, to }], overrides, now);
    return {
      result: { visitId, sequence: sequence + 1 },
      audit: { entity: "visit", entityId: visitId, before: placing, after: { ...to, overrides } },
    };
  },
});
