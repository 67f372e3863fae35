import { sql } from "drizzle-orm";
import { z } from "zod";
import { dueSweeps } from "@/db/schema/agreements";
import { companies } from "@/db/schema/company";
import { addDays, calendarDate, startOfDate } from "@/lib/domain/shared/zone";
import { notFound } from "@/lib/errors";
import { command } from "@/lib/services/command";
import { type DueItem, dueItems } from "./due-items";
import { madeEntries, makeJobs } from "./make-jobs";

/** A job is made so many days before its window opens: time to agree on a date. Common practice, no source. */
export const MADE_DAYS_AHEAD = 45;

const isWanted = ({ job, window, today, agreement }: DueItem): boolean =>
  job === null &&
  window.earliest <= addDays(today, MADE_DAYS_AHEAD) &&
  (agreement.endsOn === null || window.earliest <= agreement.endsOn);

/** Makes the jobs of one company ahead of their time, and writes down when to look again: the next day there. */
export const sweepDue = command({
  name: "due.sweep",
  needs: "due:sweep",
  input: z.object({}),
  async run({ tx, who, now }) {
    const [company] = await tx.select({ zone: companies.zone }).from(companies);
    if (!company) throw notFound("company");
    // One sweep of a company at a time: the second waits here, and finds nothing left to make.
    await tx.execute(sql`select pg_advisory_xact_lock(hashtextextended(${`due.sweep ${who.companyId}`}, 0))`);
    const items = (await dueItems(tx, now)).filter(isWanted);
    const made = await makeJobs(
      tx,
      who,
      now,
      isWanted,
      items.map(({ item }) => item.id),
    );
    const nextAt = startOfDate(addDays(calendarDate(now, company.zone), 1), company.zone);
    await tx
      .insert(dueSweeps)
      .values({ companyId: who.companyId, lastAt: now, nextAt })
      .onConflictDoUpdate({ target: dueSweeps.companyId, set: { lastAt: now, nextAt } });
    return { result: { made: made.length }, audit: madeEntries(made) };
  },
});
