import { and, eq, inArray, isNull } from "drizzle-orm";
import { v7 as uuidv7 } from "uuid";
import type { Tx } from "@/db/client";
import { jobs } from "@/db/schema/jobs";
import { members } from "@/db/schema/people";
import { visitCrew, visits } from "@/db/schema/visits";
import { toInstant } from "@/lib/domain/shared/zone";
import { PlanVisitInput } from "@/lib/domain/visits/schemas";
import { AppError, notFound } from "@/lib/errors";
import { command } from "@/lib/services/command";
import { siteById } from "@/lib/services/sites/internal";

export const planVisit = command({
  name: "visit.plan",
  needs: "visit:write",
  input: PlanVisitInput,
  async run({ tx, who }, { jobId, startsLocal, endsLocal, crew }) {
    const [job] = await tx.select().from(jobs).where(eq(jobs.id, jobId));
    if (!job) throw notFound("job");
    if (job.canceledAt) throw new AppError("blocked", "The job is canceled");
    await mustBeTechnicians(tx, crew);
    const { zone } = await siteById(tx, job.siteId);
    const span = { startsAt: toInstant(startsLocal, zone), endsAt: toInstant(endsLocal, zone) };
    const { companyId } = who;
    const visitId = uuidv7();
    await tx
      .insert(visits)
      .values({ companyId, id: visitId, jobId, siteId: job.siteId, startsLocal, endsLocal, zone, ...span });
    await tx
      .insert(visitCrew)
      .values(crew.map((memberId, i) => ({ companyId, visitId, memberId, lead: i === 0, ...span })));
    return {
      result: { visitId },
      audit: { entity: "visit", entityId: visitId, after: { jobId, startsLocal, endsLocal, crew } },
    };
  },
});

async function mustBeTechnicians(tx: Tx, crew: string[]): Promise<void> {
  const found = await tx
    .select({ id: members.id })
    .from(members)
    .where(and(inArray(members.id, crew), eq(members.role, "technician"), isNull(members.endedAt)));
  if (found.length !== new Set(crew).size) throw notFound("technician");
}
