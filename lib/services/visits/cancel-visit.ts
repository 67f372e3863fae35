import { eq } from "drizzle-orm";
import { visits } from "@/db/schema/visits";
import { CancelVisitInput } from "@/lib/domain/visits/schemas";
import { command } from "@/lib/services/command";
import { tellCanceled } from "./asks";
import { releaseCrew, visitsToChange } from "./placing";

/** The answer says how the visit stood, so that it can be planned again. */
export const cancelVisit = command({
  name: "visit.cancel",
  needs: "visit:write",
  input: CancelVisitInput,
  async run({ tx, who, now }, { visitId, reason }) {
    const [standing] = await visitsToChange(tx, [{ visitId }]);
    if (!standing) throw new Error("a visit was neither found nor refused");
    const { visit, placing } = standing;
    await tellCanceled(tx, who, visit, reason, now);
    const canceledBy = who.kind === "person" ? who.memberId : null;
    const after = { canceledAt: now, canceledBy, cancelReason: reason, sequence: visit.sequence + 1 };
    await tx.update(visits).set(after).where(eq(visits.id, visitId));
    await releaseCrew(tx, [visitId], now);
    return {
      result: { jobId: visit.jobId, placing },
      audit: { entity: "visit", entityId: visitId, before: visit, after },
    };
  },
});
