import { and, eq, isNull } from "drizzle-orm";
import { visitAsks, visits } from "@/db/schema/visits";
import { AnswerInput } from "@/lib/domain/visits/schemas";
import { AppError, notFound } from "@/lib/errors";
import { command } from "@/lib/services/command";

/** By whoever was asked, with the signed link or signed in. The first answer counts; to change it people call. */
export const answerVisit = command({
  name: "visit.answer",
  needs: "visit:answer",
  input: AnswerInput,
  async run({ tx, who, now }, { askId: named, ...answer }) {
    const askId = who.kind === "link" ? who.subjectId : named;
    if (!askId) throw new AppError("invalid", "Which visit?", { askId: ["Choose one"] });
    const [ask] = await tx
      .select({ sequence: visits.sequence, canceledAt: visits.canceledAt, endsAt: visits.endsAt, asked: visitAsks })
      .from(visitAsks)
      .innerJoin(visits, and(eq(visits.companyId, visitAsks.companyId), eq(visits.id, visitAsks.visitId)))
      .where(eq(visitAsks.id, askId));
    if (!ask) throw notFound("visit");
    if (ask.canceledAt) throw new AppError("blocked", "This visit has been canceled");
    if (ask.asked.sequence !== ask.sequence) throw new AppError("blocked", "This visit has been moved meanwhile");
    if (ask.endsAt <= now) throw new AppError("blocked", "This visit is over");
    const written = { ...answer, answeredAt: now, channel: who.kind === "link" ? "link" : "portal" } as const;
    const rows = await tx
      .update(visitAsks)
      .set(written)
      .where(and(eq(visitAsks.id, askId), isNull(visitAsks.answer)))
      .returning({ id: visitAsks.id });
    if (rows.length === 0) throw new AppError("conflict", "This has been answered already");
    return {
      result: { answer: answer.answer },
      audit: { entity: "visit", entityId: ask.asked.visitId, after: { askId, ...written } },
    };
  },
});
