import { and, desc, eq, isNull, type SQL, sql } from "drizzle-orm";
import type { Tx } from "@/db/client";
import { jobs, jobTerms, jobWaits } from "@/db/schema/jobs";
import { visits } from "@/db/schema/visits";
import { JOB_STATE_WORDS, type JobFacts, type JobState, jobState, mayBecome } from "@/lib/domain/jobs/job-state";
import { AppError, notFound } from "@/lib/errors";

export async function jobToChange(tx: Tx, jobId: string) {
  const [job] = await tx.select().from(jobs).where(eq(jobs.id, jobId)).for("update");
  if (!job) throw notFound("job");
  if (job.canceledAt) throw new AppError("blocked", "The job is canceled");
  return job;
}

const openWait = and(eq(jobWaits.companyId, jobs.companyId), eq(jobWaits.jobId, jobs.id), isNull(jobWaits.endedAt));
const standing = (more: SQL) =>
  sql`exists (select from ${visits} where ${and(
    eq(visits.companyId, jobs.companyId),
    eq(visits.jobId, jobs.id),
    isNull(visits.canceledAt),
  )} and ${more})`;

/** `jobState` as a condition on rows of `jobs`, for lists; a test compares the two. */
export function stateExpression(now: Date): SQL<JobState> {
  const at = sql`${now.toISOString()}::timestamptz`;
  const ahead = standing(sql`${visits.startsAt} > ${at}`);
  const current = standing(sql`${visits.startsAt} <= ${at} and ${visits.endsAt} > ${at}`);
  const ended = standing(sql`${visits.endsAt} <= ${at}`);
  return sql<JobState>`case
    when ${jobs.canceledAt} is not null then 'canceled'
    when ${jobs.doneOn} is not null then 'to_review'
    when ${current} then 'under_way'
    when exists (select from ${jobWaits} where ${openWait}) then 'waiting'
    when ${ahead} then case when ${ended} then 'under_way' else 'booked' end
    when ${ended} then 'to_review'
    else 'to_book' end`;
}

type JobRow = Pick<typeof jobs.$inferSelect, "canceledAt" | "doneOn">;
type Times = { startsAt: Date; endsAt: Date; canceledAt: Date | null };

/** What a job's state is derived from, of rows that are at hand. Reviewing and billing come with their own areas. */
export function factsOf(job: JobRow, times: readonly Times[], waiting: boolean, now: Date): JobFacts {
  const stand = times.filter((visit) => visit.canceledAt === null);
  return {
    canceled: job.canceledAt !== null,
    billed: false,
    reviewed: false,
    done: job.doneOn !== null,
    waiting,
    ended: stand.filter((visit) => visit.endsAt <= now).length,
    current: stand.filter((visit) => visit.startsAt <= now && visit.endsAt > now).length,
    ahead: stand.filter((visit) => visit.startsAt > now).length,
  };
}

export const waitsOf = (tx: Tx, jobId: string) =>
  tx.select().from(jobWaits).where(eq(jobWaits.jobId, jobId)).orderBy(desc(jobWaits.since));

/** Refuses what the table of transitions does not allow from the state a job is in. */
export async function mustMayBecome(tx: Tx, job: typeof jobs.$inferSelect, to: JobState, now: Date): Promise<void> {
  // Work that only seems to be over is "to review" as well; once somebody has said so, nothing here changes it.
  if (job.doneOn !== null) throw new AppError("blocked", "The job is done already");
  const times = await tx
    .select({ startsAt: visits.startsAt, endsAt: visits.endsAt, canceledAt: visits.canceledAt })
    .from(visits)
    .where(eq(visits.jobId, job.id));
  const waiting = (await waitsOf(tx, job.id)).some((wait) => wait.endedAt === null);
  const from = jobState(factsOf(job, times, waiting, now));
  if (from === to || mayBecome(from, to)) return;
  throw new AppError(
    "blocked",
    to === "canceled"
      ? "Cancel its visits first, so that crew and building hear of it"
      : `The job is ${JOB_STATE_WORDS[from].toLowerCase()}: that cannot follow now`,
  );
}

export async function termsOf(tx: Tx, jobId: string) {
  const [terms] = await tx.select().from(jobTerms).where(eq(jobTerms.jobId, jobId));
  return terms ?? null;
}
