import { and, eq, isNull } from "drizzle-orm";
import { visitCrew, visits } from "@/db/schema/visits";
import { CancelVisitInput } from "@/lib/domain/visits/schemas";
import { AppError, notFound } from "@/lib/errors";
import { command } from "@/lib/services/command";

export const cancelVisit = command({
  name: "visit.cancel",
  needs: "visit:write",
  input: CancelVisitInput,
  async run({ tx, who, now }, { visitId }) {
    const [before] = await tx.select().from(visits).where(eq(visits.id, visitId)).for("update");
    if (!before) throw notFound("visit");
    if (before.canceledAt) throw new AppError("conflict", "This visit is already canceled");
    const canceledBy = who.kind === "person" ? who.memberId : null;
    await tx.update(visits).set({ canceledAt: now, canceledBy }).where(eq(visits.id, visitId));
    await tx
      .update(visitCrew)
      .set({ releasedAt: now })
      .where(and(eq(visitCrew.visitId, visitId), isNull(visitCrew.releasedAt)));
    return { result: null, audit: { entity: "visit", entityId: visitId, before, after: { canceledAt: now } } };
  },
});
