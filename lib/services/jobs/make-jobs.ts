import { inArray } from "drizzle-orm";
import { v7 as uuidv7 } from "uuid";
import type { Tx } from "@/db/client";
import { agreementItems } from "@/db/schema/agreements";
import { jobs, jobTerms } from "@/db/schema/jobs";
import type { Entered } from "@/lib/auth/actor";
import { FREQUENCY_WORDS, TEST_KIND_WORDS } from "@/lib/domain/agreements/words";
import { nextNumbers } from "@/lib/services/series";
import { type DueItem, dueItems } from "./due-items";

/** Makes the job of each item's next occurrence; the items are locked first, so that one who comes later finds it made. */
export async function makeJobs(tx: Tx, who: Entered, now: Date, wanted: (item: DueItem) => boolean, itemIds: string[]) {
  if (itemIds.length === 0) return [];
  const chosen = inArray(agreementItems.id, itemIds);
  await tx
    .select({ id: agreementItems.id })
    .from(agreementItems)
    .where(chosen)
    .orderBy(agreementItems.id)
    .for("update");
  const items = (await dueItems(tx, now, chosen)).filter((item) => item.job === null && wanted(item));
  if (items.length === 0) return [];
  const first = await nextNumbers(tx, who, "job", items.length);
  const { companyId } = who;
  const rows = items.map(({ item, site, window }, i) => ({
    companyId,
    id: uuidv7(),
    number: first + i,
    siteId: site.id,
    kind: "test" as const,
    title: `${FREQUENCY_WORDS[item.frequency]}: ${TEST_KIND_WORDS[item.testKind].toLowerCase()}`,
    systemId: item.systemId,
    functions: item.functions,
    visitMinutes: item.visitMinutes,
    crewSize: item.crewSize,
    agreementItemId: item.id,
    earliestOn: window.earliest,
    targetOn: window.target,
    latestOn: window.latest,
    createdBy: who.kind === "person" ? who.memberId : null,
  }));
  await tx.insert(jobs).values(rows);
  // A purchase order that stands for the whole agreement stands for its jobs.
  const terms = rows.flatMap((job, i) => {
    const purchaseOrder = items[i]?.agreement.purchaseOrder;
    return purchaseOrder ? [{ companyId, jobId: job.id, purchaseOrder }] : [];
  });
  if (terms.length > 0) await tx.insert(jobTerms).values(terms);
  return rows;
}

export const madeEntries = (rows: Awaited<ReturnType<typeof makeJobs>>) =>
  rows.map(({ companyId: _, ...job }) => ({ entity: "job", entityId: job.id, after: job }));
