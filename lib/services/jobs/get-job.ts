import { and, asc, desc, eq, inArray } from "drizzle-orm";
import type { Tx } from "@/db/client";
import { agreementItems, agreements } from "@/db/schema/agreements";
import { auditEntries } from "@/db/schema/audit";
import { jobs } from "@/db/schema/jobs";
import { members } from "@/db/schema/people";
import { sites } from "@/db/schema/sites";
import { systems } from "@/db/schema/systems";
import { visitCrew, visits } from "@/db/schema/visits";
import { dueState } from "@/lib/domain/agreements/due-window";
import { jobState } from "@/lib/domain/jobs/job-state";
import { JobRef } from "@/lib/domain/jobs/schemas";
import { calendarDate } from "@/lib/domain/shared/zone";
import { notFound } from "@/lib/errors";
import { query } from "@/lib/services/command";
import { contactsOfSites } from "@/lib/services/sites/site-contacts";
import { factsOf, termsOf, waitsOf } from "./internal";

export const getJob = query({
  name: "job.get",
  needs: "job:read",
  input: JobRef,
  async run({ tx, now }, { jobId }) {
    const [found] = await tx
      .select({ job: jobs, site: sites, madeBy: members.name })
      .from(jobs)
      .innerJoin(sites, and(eq(sites.companyId, jobs.companyId), eq(sites.id, jobs.siteId)))
      .leftJoin(members, and(eq(members.companyId, jobs.companyId), eq(members.id, jobs.createdBy)))
      .where(eq(jobs.id, jobId));
    if (!found) throw notFound("job");
    const { job, site, madeBy } = found;
    const waits = await waitsOf(tx, jobId);
    const visitRows = await visitsOf(tx, jobId);
    const waiting = waits.some((wait) => wait.endedAt === null);
    const today = calendarDate(now, site.zone);
    const { earliestOn: earliest, targetOn: target, latestOn: latest } = job;
    const window = earliest && target && latest ? { earliest, target, latest } : null;
    return {
      ...job,
      site,
      madeBy,
      today,
      state: jobState(factsOf(job, visitRows, waiting, now)),
      window,
      due: window && dueState(window, today),
      terms: await termsOf(tx, jobId),
      waits,
      visits: visitRows,
      systems: await tx
        .select({ id: systems.id, name: systems.name })
        .from(systems)
        .where(eq(systems.siteId, job.siteId))
        .orderBy(systems.name),
      agreement: await agreementOf(tx, job.agreementItemId),
      contacts: await contactsOfSites(tx, [job.siteId], now),
      history: await historyOf(tx, [jobId, ...visitRows.map((visit) => visit.id)]),
    };
  },
});

async function visitsOf(tx: Tx, jobId: string) {
  const rows = await tx.select().from(visits).where(eq(visits.jobId, jobId)).orderBy(asc(visits.startsAt));
  if (rows.length === 0) return [];
  const ids = rows.map((visit) => visit.id);
  // Also those who were released: of a canceled visit one wants to know who was to go.
  const crew = await tx
    .select({ visitId: visitCrew.visitId, name: members.name, releasedAt: visitCrew.releasedAt })
    .from(visitCrew)
    .innerJoin(members, and(eq(members.companyId, visitCrew.companyId), eq(members.id, visitCrew.memberId)))
    .where(inArray(visitCrew.visitId, ids))
    .orderBy(desc(visitCrew.lead), asc(members.name));
  return rows.map((visit) => ({
    ...visit,
    crew: crew
      .filter((one) => one.visitId === visit.id && (visit.canceledAt !== null || one.releasedAt === null))
      .map((one) => one.name),
  }));
}

async function agreementOf(tx: Tx, itemId: string | null) {
  if (itemId === null) return null;
  const [found] = await tx
    .select({
      id: agreements.id,
      number: agreements.number,
      name: agreements.name,
      purchaseOrderNeeded: agreements.purchaseOrderNeeded,
    })
    .from(agreementItems)
    .innerJoin(
      agreements,
      and(eq(agreements.companyId, agreementItems.companyId), eq(agreements.id, agreementItems.agreementId)),
    )
    .where(eq(agreementItems.id, itemId));
  return found ?? null;
}

const historyOf = (tx: Tx, ids: string[]) =>
  tx
    .select({
      id: auditEntries.id,
      at: auditEntries.at,
      command: auditEntries.command,
      actorKind: auditEntries.actorKind,
      person: members.name,
      after: auditEntries.after,
    })
    .from(auditEntries)
    .leftJoin(members, and(eq(members.companyId, auditEntries.companyId), eq(members.id, auditEntries.memberId)))
    .where(inArray(auditEntries.entityId, ids))
    .orderBy(desc(auditEntries.at), desc(auditEntries.id))
    .limit(100);
