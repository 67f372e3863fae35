import { and, asc, desc, eq, isNull, type SQL, sql } from "drizzle-orm";
import type { Tx } from "@/db/client";
import { agreementItems, agreements, completions } from "@/db/schema/agreements";
import { customers } from "@/db/schema/customers";
import { jobs } from "@/db/schema/jobs";
import { sites } from "@/db/schema/sites";
import { dueState, dueWindow } from "@/lib/domain/agreements/due-window";
import { reckoningWords } from "@/lib/domain/agreements/due-words";
import { calendarDate, daysBetween } from "@/lib/domain/shared/zone";
import { scheduleOf } from "@/lib/services/agreements/internal";

/** Every active item with its next occurrence, in one question to the database; windows are reckoned here. */
export async function dueItems(tx: Tx, now: Date, more?: SQL) {
  // Looked up item by item through their indexes, whatever the planner knows of the tables' sizes.
  const last = tx
    .select({ targetOn: completions.targetOn, doneOn: completions.doneOn })
    .from(completions)
    .where(and(eq(completions.companyId, agreementItems.companyId), eq(completions.itemId, agreementItems.id)))
    .orderBy(desc(completions.targetOn))
    .limit(1)
    .as("last");
  const open = tx
    .select({ id: jobs.id, number: jobs.number })
    .from(jobs)
    .where(
      and(
        eq(jobs.companyId, agreementItems.companyId),
        eq(jobs.agreementItemId, agreementItems.id),
        isNull(jobs.canceledAt),
        isNull(jobs.doneOn),
      ),
    )
    .orderBy(asc(jobs.targetOn))
    .limit(1)
    .as("open");
  const rows = await tx
    .select({
      item: {
        id: agreementItems.id,
        systemId: agreementItems.systemId,
        testKind: agreementItems.testKind,
        functions: agreementItems.functions,
        frequency: agreementItems.frequency,
        rule: agreementItems.rule,
        toleranceDays: agreementItems.toleranceDays,
        anchor: agreementItems.anchor,
        anchorOn: agreementItems.anchorOn,
        visitMinutes: agreementItems.visitMinutes,
        crewSize: agreementItems.crewSize,
      },
      agreement: {
        id: agreements.id,
        number: agreements.number,
        endsOn: agreements.endsOn,
        purchaseOrderNeeded: agreements.purchaseOrderNeeded,
        purchaseOrder: agreements.purchaseOrder,
      },
      customer: { id: customers.id, name: customers.name },
      site: { id: sites.id, name: sites.name, city: sites.city, state: sites.state, zone: sites.zone },
      last: { targetOn: last.targetOn, doneOn: last.doneOn },
      job: { id: open.id, number: open.number },
    })
    .from(agreementItems)
    .innerJoin(
      agreements,
      and(eq(agreements.companyId, agreementItems.companyId), eq(agreements.id, agreementItems.agreementId)),
    )
    .innerJoin(customers, and(eq(customers.companyId, agreements.companyId), eq(customers.id, agreements.customerId)))
    .innerJoin(sites, and(eq(sites.companyId, agreementItems.companyId), eq(sites.id, agreementItems.siteId)))
    .leftJoinLateral(last, sql`true`)
    .leftJoinLateral(open, sql`true`)
    .where(and(isNull(agreementItems.endedAt), more));
  const today = todayIn(now);
  return rows
    .filter(({ agreement, site }) => agreement.endsOn === null || agreement.endsOn >= today(site.zone))
    .map(({ last: done, job, ...row }) => {
      const schedule = scheduleOf(row.item);
      const completion = done?.targetOn && done.doneOn ? { targetOn: done.targetOn, doneOn: done.doneOn } : null;
      const window = dueWindow(schedule, completion);
      const day = today(row.site.zone);
      return {
        ...row,
        job: job?.id ? job : null,
        window,
        today: day,
        untilOpen: daysBetween(day, window.earliest),
        reckoning: () => reckoningWords(schedule, completion),
        ...dueState(window, day),
      };
    });
}
export type DueItem = Awaited<ReturnType<typeof dueItems>>[number];

/** The date in each zone, looked up once. */
function todayIn(now: Date): (zone: string) => string {
  const known = new Map<string, string>();
  return (zone) => {
    const date = known.get(zone) ?? calendarDate(now, zone);
    known.set(zone, date);
    return date;
  };
}
