import { addItem } from "@/lib/services/agreements/add-item";
import { createAgreement } from "@/lib/services/agreements/create-agreement";
import { createJob } from "@/lib/services/jobs/create-job";
import { waitFor } from "@/lib/services/jobs/wait-for";
import { unique } from "./company";
import type { World } from "./world";

/** An item as it is typed: yearly, by NFPA 72, counted from the agreed date. */
export const itemFacts = (w: World) => ({
  siteId: w.site.siteId,
  testKind: "fan_shutdown",
  functions: ["fan_shutdown"],
  frequency: "annual",
  rule: "nfpa_72",
  anchor: "fixed",
  anchorOn: "2027-03-15",
  visitMinutes: "240",
  crewSize: "2",
  price: "1,850.00",
});

type Change = Partial<Record<keyof ReturnType<typeof itemFacts> | "toleranceDays" | "lastDoneOn", unknown>>;
type Terms = { endsOn?: string; purchaseOrderNeeded?: boolean; purchaseOrder?: string };

/** An agreement of its own with one item. */
export async function newItem(w: World, change: Change = {}, terms: Terms = {}) {
  const { agreementId } = await createAgreement(w.owner.context, {
    customerId: w.customer.customerId,
    name: unique("Agreement"),
    startsOn: "2020-01-01",
    ...terms,
  });
  const { itemId } = await addItem(w.owner.context, { ...itemFacts(w), agreementId, ...change });
  return { agreementId, itemId };
}

export const newJob = async (w: World): Promise<string> =>
  (await createJob(w.owner.context, { siteId: w.site.siteId, kind: "repair", title: unique("Job") })).jobId;

export const newWait = async (w: World): Promise<string> =>
  (await waitFor(w.owner.context, { jobId: await newJob(w), waitsFor: "access", person: "Front desk" })).waitId;
