import { and, asc, desc, eq, inArray, isNull } from "drizzle-orm";
import { z } from "zod";
import type { Tx } from "@/db/client";
import { agreementItems, agreements, completions } from "@/db/schema/agreements";
import { customers } from "@/db/schema/customers";
import { jobs } from "@/db/schema/jobs";
import { siteHolders, sites } from "@/db/schema/sites";
import { systems } from "@/db/schema/systems";
import { dueState, dueWindow } from "@/lib/domain/agreements/due-window";
import { reckoningWords } from "@/lib/domain/agreements/due-words";
import { grouped } from "@/lib/domain/shared/grouped";
import { rowId } from "@/lib/domain/shared/inputs";
import { calendarDate } from "@/lib/domain/shared/zone";
import { notFound } from "@/lib/errors";
import { query } from "@/lib/services/command";
import { scheduleOf } from "./internal";

export const getAgreement = query({
  name: "agreement.get",
  needs: "agreement:read",
  input: z.object({ agreementId: rowId }),
  async run({ tx, now }, { agreementId }) {
    const [found] = await tx
      .select({ agreement: agreements, customer: { id: customers.id, name: customers.name } })
      .from(agreements)
      .innerJoin(customers, and(eq(customers.companyId, agreements.companyId), eq(customers.id, agreements.customerId)))
      .where(eq(agreements.id, agreementId));
    if (!found) throw notFound("agreement");
    return {
      ...found.agreement,
      customer: found.customer,
      items: await itemsOf(tx, agreementId, now),
      sites: await sitesHeldBy(tx, found.customer.id),
    };
  },
});

async function itemsOf(tx: Tx, agreementId: string, now: Date) {
  const rows = await tx
    .select({
      item: agreementItems,
      site: { id: sites.id, name: sites.name, street: sites.street, city: sites.city, zone: sites.zone },
      system: { id: systems.id, name: systems.name },
    })
    .from(agreementItems)
    .innerJoin(sites, and(eq(sites.companyId, agreementItems.companyId), eq(sites.id, agreementItems.siteId)))
    .leftJoin(systems, and(eq(systems.companyId, agreementItems.companyId), eq(systems.id, agreementItems.systemId)))
    .where(eq(agreementItems.agreementId, agreementId))
    .orderBy(asc(sites.name), asc(agreementItems.createdAt));
  const ids = rows.map((row) => row.item.id);
  if (ids.length === 0) return [];
  const panels = await tx
    .select({ id: systems.id, name: systems.name, siteId: systems.siteId })
    .from(systems)
    .where(
      inArray(
        systems.siteId,
        rows.map((row) => row.site.id),
      ),
    );
  const ofSite = grouped(panels, (system) => system.siteId);
  const done = await tx
    .select({ itemId: completions.itemId, targetOn: completions.targetOn, doneOn: completions.doneOn })
    .from(completions)
    .where(inArray(completions.itemId, ids))
    .orderBy(desc(completions.targetOn));
  const open = await tx
    .select({ id: jobs.id, number: jobs.number, itemId: jobs.agreementItemId })
    .from(jobs)
    .where(and(inArray(jobs.agreementItemId, ids), isNull(jobs.canceledAt), isNull(jobs.doneOn)))
    .orderBy(jobs.targetOn);
  return rows.map(({ item, ...row }) => {
    const schedule = scheduleOf(item);
    const history = done.filter((one) => one.itemId === item.id);
    const last = history[0] ?? null;
    const window = dueWindow(schedule, last);
    return {
      ...item,
      ...row,
      systems: ofSite.get(row.site.id) ?? [],
      history,
      job: open.find((job) => job.itemId === item.id) ?? null,
      window,
      due: dueState(window, calendarDate(now, row.site.zone)),
      reckoning: reckoningWords(schedule, last),
      source: schedule.rule.source,
    };
  });
}

/** Offered first where a site is chosen. */
async function sitesHeldBy(tx: Tx, customerId: string) {
  const held = await tx
    .selectDistinct({ id: sites.id, name: sites.name, street: sites.street, city: sites.city })
    .from(siteHolders)
    .innerJoin(sites, and(eq(sites.companyId, siteHolders.companyId), eq(sites.id, siteHolders.siteId)))
    .where(and(eq(siteHolders.customerId, customerId), isNull(siteHolders.toDate)))
    .orderBy(asc(sites.name));
  const ids = held.map((site) => site.id);
  const panels = ids.length > 0 ? await tx.select().from(systems).where(inArray(systems.siteId, ids)) : [];
  const ofSite = grouped(panels, (system) => system.siteId);
  return held.map((site) => ({
    ...site,
    systems: (ofSite.get(site.id) ?? []).map(({ id, name }) => ({ id, name })),
  }));
}
