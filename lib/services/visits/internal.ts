import { and, asc, eq, gte, inArray, isNull, lt } from "drizzle-orm";
import type { Tx } from "@/db/client";
import { jobs } from "@/db/schema/jobs";
import { members } from "@/db/schema/people";
import { sites } from "@/db/schema/sites";
import { visitCrew, visits } from "@/db/schema/visits";

/** Visits that overlap a span, as the actor may see them, with site, job and crew. */
export async function visitsBetween(tx: Tx, from: Date, to: Date) {
  const rows = await tx
    .select({
      id: visits.id,
      startsAt: visits.startsAt,
      endsAt: visits.endsAt,
      startsLocal: visits.startsLocal,
      endsLocal: visits.endsLocal,
      zone: visits.zone,
      canceledAt: visits.canceledAt,
      site: { id: sites.id, name: sites.name, street: sites.street, city: sites.city, state: sites.state },
      job: { id: jobs.id, number: jobs.number, kind: jobs.kind, title: jobs.title },
    })
    .from(visits)
    .innerJoin(sites, and(eq(sites.companyId, visits.companyId), eq(sites.id, visits.siteId)))
    .innerJoin(jobs, and(eq(jobs.companyId, visits.companyId), eq(jobs.id, visits.jobId)))
    .where(and(lt(visits.startsAt, to), gte(visits.endsAt, from)))
    .orderBy(asc(visits.startsAt), asc(visits.id));
  const crew = await crewOf(
    tx,
    rows.map((row) => row.id),
  );
  return rows.map((row) => ({ ...row, crew: crew.filter((person) => person.visitId === row.id) }));
}

async function crewOf(tx: Tx, visitIds: string[]) {
  if (visitIds.length === 0) return [];
  return tx
    .select({ visitId: visitCrew.visitId, memberId: members.id, name: members.name, lead: visitCrew.lead })
    .from(visitCrew)
    .innerJoin(members, and(eq(members.companyId, visitCrew.companyId), eq(members.id, visitCrew.memberId)))
    .where(and(inArray(visitCrew.visitId, visitIds), isNull(visitCrew.releasedAt)))
    .orderBy(asc(members.name));
}
