import { and, asc, eq, inArray, isNull, sql } from "drizzle-orm";
import type { Tx } from "@/db/client";
import { jobs } from "@/db/schema/jobs";
import { liveBlocks, visitCrew, visits } from "@/db/schema/visits";
import type { Entered } from "@/lib/auth/actor";
import { toInstant, toLocalTime } from "@/lib/domain/shared/zone";
import type { LiveBlockInput } from "@/lib/domain/visits/schemas";
import { LEAD_IS_LICENSED, type Place, type Span, spanFrom, type WantedVisit } from "@/lib/domain/visits/slot";
import { AppError, notFound } from "@/lib/errors";

/** Where and how a visit is to stand; the first of the crew leads. */
export type Placing = { startsLocal: string; minutes: number; crew: string[]; liveBlocks: LiveBlockInput[] };

export const spanOf = ({ startsLocal, minutes }: Placing, zone: string): Span =>
  spanFrom(toInstant(startsLocal, zone), minutes);

export const placeOf = ({ crew, startsLocal }: Placing, zone: string): Place => ({
  crew: crew.map((memberId, i) => ({ memberId, lead: i === 0 })),
  startsLocal,
  zone,
});

type Due = { crewSize: number; earliestOn: string | null; latestOn: string | null };

/** What operates during a visit is what its live blocks say: of a job with many visits each does a part. */
export const wantedOf = ({ minutes, liveBlocks }: Placing, job: Due): WantedVisit => ({
  minutes,
  functions: liveBlocks.flatMap((block) => block.functions),
  liveBlocks,
  crewSize: job.crewSize,
  licenses: LEAD_IS_LICENSED,
  due: { earliest: job.earliestOn, latest: job.latestOn },
});

export async function jobToBook(tx: Tx, jobId: string) {
  const [job] = await tx.select().from(jobs).where(eq(jobs.id, jobId));
  if (!job) throw notFound("job");
  if (job.canceledAt) throw new AppError("blocked", "The job is canceled");
  if (job.doneOn) throw new AppError("blocked", "The job is done");
  return job;
}

/**
 * Bookings of one person wait for each other, so that whoever comes second reads what the first wrote and can be told
 * where that person is. Taken in one order, and after the visits' own rows, so that nobody waits in a circle.
 */
export async function lockCrew(tx: Tx, who: Entered, memberIds: readonly string[]): Promise<void> {
  for (const id of [...new Set(memberIds)].sort())
    await tx.execute(sql`select pg_advisory_xact_lock(hashtextextended(${`${who.companyId} ${id}`}, 0))`);
}

/** Visits that are to change, locked, each as it was seen; with job, crew and live blocks. */
export async function visitsToChange(tx: Tx, seen: readonly { visitId: string; sequence?: number }[]) {
  const ids = seen.map(({ visitId }) => visitId);
  const rows = await tx.select().from(visits).where(inArray(visits.id, ids)).orderBy(asc(visits.id)).for("update");
  const crew = await tx
    .select()
    .from(visitCrew)
    .where(and(inArray(visitCrew.visitId, ids), isNull(visitCrew.releasedAt)))
    .orderBy(sql`${visitCrew.lead} desc`, asc(visitCrew.id));
  const blocks = await tx
    .select()
    .from(liveBlocks)
    .where(inArray(liveBlocks.visitId, ids))
    .orderBy(liveBlocks.startsAt);
  return seen.map(({ visitId, sequence }) => {
    const visit = rows.find((row) => row.id === visitId);
    if (!visit) throw notFound("visit");
    if (visit.canceledAt) throw new AppError("conflict", "This visit is canceled");
    if (sequence !== undefined && sequence !== visit.sequence)
      throw new AppError("conflict", "Somebody changed this visit meanwhile; look at it again");
    const minutesFrom = (from: Date, to: Date) => Math.round((to.getTime() - from.getTime()) / 60_000);
    const placing: Placing = {
      startsLocal: visit.startsLocal,
      minutes: minutesFrom(visit.startsAt, visit.endsAt),
      crew: crew.filter((row) => row.visitId === visitId).map((row) => row.memberId),
      liveBlocks: blocks
        .filter((block) => block.visitId === visitId)
        .map(({ startsAt, endsAt, functions, attendees }) => ({
          offsetMinutes: minutesFrom(visit.startsAt, startsAt),
          minutes: minutesFrom(startsAt, endsAt),
          functions,
          attendees,
        })),
    };
    return { visit, placing };
  });
}

/** Crew rows and live blocks of a visit as it stands from now on. */
export async function writePlacing(tx: Tx, who: Entered, visit: { id: string; zone: string }, placing: Placing) {
  const span = spanOf(placing, visit.zone);
  const of = { companyId: who.companyId, visitId: visit.id };
  await tx.insert(visitCrew).values(placing.crew.map((memberId, i) => ({ ...of, memberId, lead: i === 0, ...span })));
  await tx.delete(liveBlocks).where(eq(liveBlocks.visitId, visit.id));
  if (placing.liveBlocks.length === 0) return;
  await tx.insert(liveBlocks).values(
    placing.liveBlocks.map(({ offsetMinutes, minutes, functions, attendees }) => {
      const startsAt = new Date(span.startsAt.getTime() + offsetMinutes * 60_000);
      const live = spanFrom(startsAt, minutes);
      const [startsLocal, endsLocal] = [toLocalTime(live.startsAt, visit.zone), toLocalTime(live.endsAt, visit.zone)];
      return { ...of, functions, attendees, startsLocal, endsLocal, ...live };
    }),
  );
}

export const releaseCrew = (tx: Tx, visitIds: readonly string[], now: Date) =>
  tx
    .update(visitCrew)
    .set({ releasedAt: now })
    .where(and(inArray(visitCrew.visitId, [...visitIds]), isNull(visitCrew.releasedAt)));

/** The columns of `visits` that tell when. */
export function timesOf(placing: Placing, zone: string) {
  const span = spanOf(placing, zone);
  return { startsLocal: placing.startsLocal, endsLocal: toLocalTime(span.endsAt, zone), ...span };
}
