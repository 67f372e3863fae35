import { and, desc, eq, isNull } from "drizzle-orm";
import type { Tx } from "@/db/client";
import { agreementItems, agreements, completions } from "@/db/schema/agreements";
import { jobs } from "@/db/schema/jobs";
import { sites } from "@/db/schema/sites";
import { systems } from "@/db/schema/systems";
import type { Entered } from "@/lib/auth/actor";
import { type Completion, type DueSchedule, dueWindow } from "@/lib/domain/agreements/due-window";
import { intervalRule } from "@/lib/domain/agreements/interval-rules";
import { type CalendarDate, calendarDate } from "@/lib/domain/shared/zone";
import { AppError, notFound } from "@/lib/errors";

type Item = typeof agreementItems.$inferSelect;

export const scheduleOf = (
  item: Pick<Item, "frequency" | "rule" | "toleranceDays" | "anchor" | "anchorOn">,
): DueSchedule => ({
  frequency: item.frequency,
  rule: intervalRule(item.rule, item.toleranceDays),
  anchor: item.anchor,
  anchorOn: item.anchorOn,
});

export async function agreementToChange(tx: Tx, agreementId: string) {
  const [agreement] = await tx.select().from(agreements).where(eq(agreements.id, agreementId)).for("update");
  if (!agreement) throw notFound("agreement");
  return agreement;
}

/** Locked, so that two who make the next job, or record a completion, come one after the other. */
export async function itemToChange(tx: Tx, itemId: string) {
  const [item] = await tx.select().from(agreementItems).where(eq(agreementItems.id, itemId)).for("update");
  if (!item) throw notFound("item");
  if (item.endedAt) throw new AppError("blocked", "This item has ended");
  return item;
}

export async function systemMustBeOfSite(tx: Tx, siteId: string, systemId: string | null): Promise<void> {
  if (systemId === null) return;
  const [system] = await tx.select({ siteId: systems.siteId }).from(systems).where(eq(systems.id, systemId));
  if (!system) throw notFound("system");
  if (system.siteId !== siteId)
    throw new AppError("invalid", "Some entries need another look", { systemId: ["This system is at another site"] });
}

export async function lastCompletion(tx: Tx, itemId: string): Promise<Completion | null> {
  const [last] = await tx
    .select({ targetOn: completions.targetOn, doneOn: completions.doneOn })
    .from(completions)
    .where(eq(completions.itemId, itemId))
    .orderBy(desc(completions.targetOn))
    .limit(1);
  return last ?? null;
}

/** What was done cannot lie ahead: dates count where the building stands. */
export async function mustNotLieAhead(tx: Tx, siteId: string, doneOn: CalendarDate, now: Date, field = "doneOn") {
  const [site] = await tx.select({ zone: sites.zone }).from(sites).where(eq(sites.id, siteId));
  if (!site) throw notFound("site");
  if (doneOn > calendarDate(now, site.zone))
    throw new AppError("invalid", "Some entries need another look", { [field]: ["This day is still to come"] });
}

/** The job that does the item's next occurrence, if there is one. */
export async function openJobOf(tx: Tx, itemId: string) {
  const [job] = await tx
    .select()
    .from(jobs)
    .where(and(eq(jobs.agreementItemId, itemId), isNull(jobs.canceledAt), isNull(jobs.doneOn)))
    .orderBy(jobs.targetOn)
    .limit(1);
  return job ?? null;
}

/** Writes down that an occurrence was done; said again, the later word counts. */
export async function complete(tx: Tx, who: Entered, itemId: string, { targetOn, doneOn }: Completion): Promise<void> {
  await tx
    .insert(completions)
    .values({ companyId: who.companyId, itemId, targetOn, doneOn })
    .onConflictDoUpdate({
      target: [completions.companyId, completions.itemId, completions.targetOn],
      set: { doneOn },
    });
}

/** The window that an open job was made for follows what has become known of its item since. */
export async function refreshWindow(tx: Tx, item: Item): Promise<void> {
  const job = await openJobOf(tx, item.id);
  if (!job) return;
  const { earliest, target, latest } = dueWindow(scheduleOf(item), await lastCompletion(tx, item.id));
  await tx.update(jobs).set({ earliestOn: earliest, targetOn: target, latestOn: latest }).where(eq(jobs.id, job.id));
}
