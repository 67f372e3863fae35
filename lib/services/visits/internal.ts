import { and, asc, desc, eq, gt, inArray, isNull, lt, type SQL } from "drizzle-orm";
import type { Tx } from "@/db/client";
import { jobs } from "@/db/schema/jobs";
import { members } from "@/db/schema/people";
import { sites } from "@/db/schema/sites";
import { liveBlocks, visitAsks, visitCrew, visits } from "@/db/schema/visits";

/** Visits that overlap a span, as the actor may see them. */
export const visitsBetween = (tx: Tx, from: Date, to: Date) =>
  visitsWhere(tx, and(lt(visits.startsAt, to), gt(visits.endsAt, from)));

/** Visits as the actor may see them, with site, job, crew (the lead first) and live blocks. */
export async function visitsWhere(tx: Tx, condition: SQL | undefined) {
  const rows = await tx
    .select({
      id: visits.id,
      startsAt: visits.startsAt,
      endsAt: visits.endsAt,
      startsLocal: visits.startsLocal,
      endsLocal: visits.endsLocal,
      zone: visits.zone,
      sequence: visits.sequence,
      canceledAt: visits.canceledAt,
      cancelReason: visits.cancelReason,
      site: { id: sites.id, name: sites.name, street: sites.street, city: sites.city, state: sites.state },
      job: { id: jobs.id, number: jobs.number, kind: jobs.kind, title: jobs.title },
    })
    .from(visits)
    .innerJoin(sites, and(eq(sites.companyId, visits.companyId), eq(sites.id, visits.siteId)))
    .innerJoin(jobs, and(eq(jobs.companyId, visits.companyId), eq(jobs.id, visits.jobId)))
    .where(condition)
    .orderBy(asc(visits.startsAt), asc(visits.id));
  const ids = rows.map((row) => row.id);
  const [crew, blocks] = [await crewOf(tx, ids), await liveBlocksOf(tx, ids)];
  return rows.map((row) => ({
    ...row,
    crew: crew.filter((person) => person.visitId === row.id),
    liveBlocks: blocks.filter((block) => block.visitId === row.id),
  }));
}

async function crewOf(tx: Tx, visitIds: string[]) {
  if (visitIds.length === 0) return [];
  return tx
    .select({ visitId: visitCrew.visitId, memberId: members.id, name: members.name, lead: visitCrew.lead })
    .from(visitCrew)
    .innerJoin(members, and(eq(members.companyId, visitCrew.companyId), eq(members.id, visitCrew.memberId)))
    .where(and(inArray(visitCrew.visitId, visitIds), isNull(visitCrew.releasedAt)))
    .orderBy(desc(visitCrew.lead), asc(members.name));
}

async function liveBlocksOf(tx: Tx, visitIds: string[]) {
  if (visitIds.length === 0) return [];
  return tx
    .select({
      visitId: liveBlocks.visitId,
      functions: liveBlocks.functions,
      startsAt: liveBlocks.startsAt,
      endsAt: liveBlocks.endsAt,
      startsLocal: liveBlocks.startsLocal,
      endsLocal: liveBlocks.endsLocal,
      attendees: liveBlocks.attendees,
    })
    .from(liveBlocks)
    .where(inArray(liveBlocks.visitId, visitIds))
    .orderBy(asc(liveBlocks.startsAt), asc(liveBlocks.id));
}

/** What was asked of whom about visits as they stand now, as the actor may see it. */
export async function asksOf(tx: Tx, visitIds: string[]) {
  if (visitIds.length === 0) return [];
  return tx
    .select({
      id: visitAsks.id,
      visitId: visitAsks.visitId,
      contactId: visitAsks.contactId,
      name: visitAsks.name,
      byMail: visitAsks.email,
      askedAt: visitAsks.askedAt,
      answer: visitAsks.answer,
      answeredAt: visitAsks.answeredAt,
      channel: visitAsks.channel,
      permitNumber: visitAsks.permitNumber,
      note: visitAsks.note,
    })
    .from(visitAsks)
    .innerJoin(
      visits,
      and(
        eq(visits.companyId, visitAsks.companyId),
        eq(visits.id, visitAsks.visitId),
        eq(visits.sequence, visitAsks.sequence),
      ),
    )
    .where(inArray(visitAsks.visitId, visitIds))
    .orderBy(asc(visitAsks.name), asc(visitAsks.id));
}
