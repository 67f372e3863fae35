import { and, eq, gte, inArray, isNull, max } from "drizzle-orm";
import type { Tx } from "@/db/client";
import { jobTerms } from "@/db/schema/jobs";
import { licenses, members } from "@/db/schema/people";
import { points, systems } from "@/db/schema/systems";
import { noTestDates, testWindows } from "@/db/schema/windows";
import { type Obstacle, standsInTheWay } from "@/lib/domain/jobs/stands-in-the-way";
import { grouped } from "@/lib/domain/shared/grouped";
import { earlierOf } from "@/lib/domain/shared/zone";
import { contactsOfSites } from "@/lib/services/sites/site-contacts";
import type { DueItem } from "./due-items";

/** What stands in the way of each item, asked for all of them together. */
export async function obstaclesOf(tx: Tx, items: readonly DueItem[], now: Date): Promise<Map<string, Obstacle[]>> {
  if (items.length === 0) return new Map();
  const siteIds = [...new Set(items.map((item) => item.site.id))];
  const jobIds = items.flatMap((item) => (item.job ? [item.job.id] : []));
  const firstDay = items.reduce((first, { today }) => earlierOf(first, today), "9999-12-31");
  const people = await contactsOfSites(tx, siteIds, now);
  const windows = await tx
    .select()
    .from(testWindows)
    .where(and(inArray(testWindows.siteId, siteIds), isNull(testWindows.endedAt)));
  const shut = await tx
    .select()
    .from(noTestDates)
    .where(and(inArray(noTestDates.siteId, siteIds), isNull(noTestDates.endedAt), gte(noTestDates.toDate, firstDay)));
  const licensed = await licensedUntil(tx);
  const listed = await systemsWithDevices(tx, siteIds);
  const terms = jobIds.length > 0 ? await tx.select().from(jobTerms).where(inArray(jobTerms.jobId, jobIds)) : [];
  const [reached, windowsAt, shutAt, listedAt] = [
    grouped(people, (person) => person.siteId),
    grouped(windows, (window) => window.siteId),
    grouped(shut, (dates) => dates.siteId),
    grouped(listed, (system) => system.siteId),
  ];
  const answered = new Map(terms.map((one) => [one.jobId, one]));
  return new Map(
    items.map(({ item, agreement, site, job, window, today }) => {
      const systemsHere = listedAt.get(site.id) ?? [];
      const said = job ? answered.get(job.id) : undefined;
      const obstacles = standsInTheWay({
        siteId: site.id,
        agreementId: agreement.id,
        jobId: job?.id ?? null,
        state: site.state,
        functions: item.functions,
        window,
        today,
        hasContactWithEmail: (reached.get(site.id) ?? []).some((person) => person.email !== null),
        testWindows: windowsAt.get(site.id) ?? [],
        noTestDates: shutAt.get(site.id) ?? [],
        licensedUntil: licensed.get(site.state) ?? null,
        hasDeviceList: systemsHere.some((system) => item.systemId === null || system.id === item.systemId),
        agreementEndsOn: agreement.endsOn,
        purchaseOrderMissing:
          agreement.purchaseOrderNeeded && !agreement.purchaseOrder && !said?.purchaseOrder && !said?.noneNeeded,
      });
      return [item.id, obstacles];
    }),
  );
}

/** The last day on which any technician is licensed, by state. */
async function licensedUntil(tx: Tx): Promise<Map<string, string>> {
  const rows = await tx
    .select({ state: licenses.jurisdiction, until: max(licenses.expiresOn) })
    .from(licenses)
    .innerJoin(members, and(eq(members.companyId, licenses.companyId), eq(members.id, licenses.memberId)))
    .where(and(isNull(members.endedAt), eq(members.role, "technician")))
    .groupBy(licenses.jurisdiction);
  return new Map(rows.flatMap(({ state, until }) => (until ? [[state, until] as const] : [])));
}

async function systemsWithDevices(tx: Tx, siteIds: string[]) {
  return tx
    .selectDistinct({ id: systems.id, siteId: systems.siteId })
    .from(systems)
    .innerJoin(
      points,
      and(eq(points.companyId, systems.companyId), eq(points.systemId, systems.id), isNull(points.removedOn)),
    )
    .where(inArray(systems.siteId, siteIds));
}
