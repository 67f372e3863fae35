import { and, eq } from "drizzle-orm";
import { v7 as uuidv7 } from "uuid";
import { visitAsks, visits } from "@/db/schema/visits";
import { toInstant } from "@/lib/domain/shared/zone";
import { RecordAnswerInput } from "@/lib/domain/visits/schemas";
import { AppError, notFound } from "@/lib/errors";
import { command } from "@/lib/services/command";

/** What somebody said by telephone or letter: of one who was asked, or of anybody by name. The latest word counts. */
export const recordAnswer = command({
  name: "visit.record-answer",
  needs: "visit:write",
  input: RecordAnswerInput,
  async run({ tx, who, now }, { visitId, askId, name, answeredLocal, ...said }) {
    const [visit] = await tx.select().from(visits).where(eq(visits.id, visitId)).for("update");
    if (!visit) throw notFound("visit");
    if (visit.canceledAt) throw new AppError("conflict", "This visit is canceled");
    const answeredAt = toInstant(answeredLocal, visit.zone);
    if (answeredAt > now)
      throw new AppError("invalid", "That answer lies ahead", { answeredLocal: ["That time has not come yet"] });
    const answer = { ...said, answeredAt, recordedBy: who.kind === "person" ? who.memberId : null };
    const [before] = askId
      ? await tx
          .select()
          .from(visitAsks)
          .where(and(eq(visitAsks.id, askId), eq(visitAsks.visitId, visitId), eq(visitAsks.sequence, visit.sequence)))
      : [];
    if (askId && !before) throw new AppError("not_found", "That was asked about the visit as it stood before");
    const id = before?.id ?? uuidv7();
    if (before) await tx.update(visitAsks).set(answer).where(eq(visitAsks.id, id));
    else
      await tx
        .insert(visitAsks)
        .values({ ...answer, id, companyId: who.companyId, visitId, sequence: visit.sequence, name: name ?? "" });
    return {
      result: { askId: id },
      audit: { entity: "visit", entityId: visitId, before, after: { askId: id, name, ...answer } },
    };
  },
});
