import { and, asc, count, eq, isNull, notExists, sql } from "drizzle-orm";
import { z } from "zod";
import type { Tx } from "@/db/client";
import { companies } from "@/db/schema/company";
import { jobs, jobWaits } from "@/db/schema/jobs";
import { members } from "@/db/schema/people";
import { sites } from "@/db/schema/sites";
import { visits } from "@/db/schema/visits";
import type { WaitsFor } from "@/lib/domain/jobs/words";
import { calendarDateText } from "@/lib/domain/shared/inputs";
import { addDays, calendarDate, dateWords, daysBetween, startOfDate, toLocalTime } from "@/lib/domain/shared/zone";
import type { Span } from "@/lib/domain/visits/slot";
import { notFound } from "@/lib/errors";
import { query } from "@/lib/services/command";
import { asksOf, visitsBetween } from "./internal";

const MOST_IN_TRAY = 300;
const ROW_MS = 30 * 60_000;

/** One day of all crews, in the company's zone, and what waits to be booked. */
export const getRunSheet = query({
  name: "visit.run-sheet",
  needs: "visit:read",
  input: z.object({ date: calendarDateText.nullish().catch(null).default(null) }),
  async run({ tx, now }, input) {
    const [company] = await tx.select({ zone: companies.zone }).from(companies);
    if (!company) throw notFound("company");
    const { zone } = company;
    const today = calendarDate(now, zone);
    const date = input.date ?? today;
    const technicians = await tx
      .select({ id: members.id, name: members.name })
      .from(members)
      .where(and(eq(members.role, "technician"), isNull(members.endedAt)))
      .orderBy(members.name);
    const day = { startsAt: startOfDate(date, zone), endsAt: startOfDate(addDays(date, 1), zone) };
    const all = await visitsBetween(tx, day.startsAt, day.endsAt);
    const asks = await asksOf(
      tx,
      all.map((visit) => visit.id),
    );
    const onSheet = all.map((visit) => ({
      ...visit,
      asks: asks.filter((ask) => ask.visitId === visit.id).map(({ name, answer }) => ({ name, answer })),
    }));
    return { date, today, rows: rowsOf(day, zone), technicians, visits: onSheet, tray: await toBook(tx, today) };
  },
});

/** The day in half hours: one of 23 or 25 hours has fewer or more of them. */
function rowsOf({ startsAt, endsAt }: Span, zone: string) {
  const count = (endsAt.getTime() - startsAt.getTime()) / ROW_MS;
  return Array.from({ length: count }, (_, i) => {
    const at = new Date(startsAt.getTime() + i * ROW_MS);
    return { at, clock: toLocalTime(at, zone).slice(11) };
  });
}

/** Jobs that no visit stands for, the ones whose due window ends first on top. */
async function toBook(tx: Tx, today: string) {
  const standing = tx
    .select({ one: sql`1` })
    .from(visits)
    .where(and(eq(visits.companyId, jobs.companyId), eq(visits.jobId, jobs.id), isNull(visits.canceledAt)));
  const where = and(isNull(jobs.canceledAt), isNull(jobs.doneOn), notExists(standing));
  const rows = await tx
    .select({
      id: jobs.id,
      number: jobs.number,
      kind: jobs.kind,
      title: jobs.title,
      urgent: jobs.urgent,
      earliestOn: jobs.earliestOn,
      latestOn: jobs.latestOn,
      functions: jobs.functions,
      visitMinutes: jobs.visitMinutes,
      crewSize: jobs.crewSize,
      site: { id: sites.id, name: sites.name, city: sites.city },
      waitsFor: sql<
        WaitsFor[]
      >`array(select ${jobWaits.waitsFor} from ${jobWaits} where ${jobWaits.companyId} = ${jobs.companyId} and ${jobWaits.jobId} = ${jobs.id} and ${jobWaits.endedAt} is null order by 1)`,
    })
    .from(jobs)
    .innerJoin(sites, and(eq(sites.companyId, jobs.companyId), eq(sites.id, jobs.siteId)))
    .where(where)
    .orderBy(sql`${jobs.urgent} desc`, sql`${jobs.latestOn} asc nulls last`, asc(jobs.number))
    .limit(MOST_IN_TRAY);
  const [all] = await tx.select({ total: count() }).from(jobs).where(where);
  return {
    total: all?.total ?? 0,
    jobs: rows.map(({ earliestOn, latestOn, ...job }) => ({
      ...job,
      opens: earliestOn && earliestOn > today ? dateWords(earliestOn) : null,
      ends: latestOn && dateWords(latestOn),
      daysLeft: latestOn ? daysBetween(today, latestOn) : null,
    })),
  };
}
