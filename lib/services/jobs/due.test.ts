import { eq } from "drizzle-orm";
import { beforeAll, describe, expect, test } from "vitest";
import { asActor } from "@/db/door";
import { completions } from "@/db/schema/agreements";
import { jobs } from "@/db/schema/jobs";
import { changeItem } from "@/lib/services/agreements/change-item";
import { endItem } from "@/lib/services/agreements/end-item";
import { recordCompletion } from "@/lib/services/agreements/record-completion";
import { addContact } from "@/lib/services/customers/add-contact";
import { createCustomer } from "@/lib/services/customers/create-customer";
import { recordLicense } from "@/lib/services/people/record-license";
import { NOW, unique, worker } from "@/tests/factories/company";
import { itemFacts, newItem } from "@/tests/factories/work";
import { newSite, newWorld, type World } from "@/tests/factories/world";
import { cancelJob } from "./cancel-job";
import { getJob } from "./get-job";
import { listDue } from "./list-due";
import { makeDue } from "./make-due";
import { recordDone } from "./record-done";
import { sweepDue } from "./sweep-due";

let w: World;
beforeAll(async () => {
  w = await newWorld();
});

const dueRow = async (world: World, itemId: string) => {
  const { rows } = await listDue(world.dispatcher.context, { pageSize: 1000 });
  return rows.find((row) => row.item.id === itemId);
};
const jobsOf = (world: World, itemId: string) =>
  asActor(
    worker(world.company.companyId),
    (tx) => tx.select().from(jobs).where(eq(jobs.agreementItemId, itemId)),
    "read",
  );
const sweep = (world: World) => sweepDue({ actor: worker(world.company.companyId), now: NOW }, {});

// NOW is 2026-12-01 in Chicago; the items are yearly by NFPA 72: 9 to 15 months after the last one.
describe("the due list", () => {
  test.each([
    ["2025-08-31", "overdue", -1],
    ["2025-09-01", "due", 0],
    ["2026-03-01", "due", 182],
    ["2026-03-02", "soon", 183],
    ["2026-11-01", "early", 427],
  ] as const)("last done %s: %s, %i days left", async (lastDoneOn, state, daysLeft) => {
    const { itemId } = await newItem(w, { anchor: "last_done", lastDoneOn });
    expect(await dueRow(w, itemId)).toMatchObject({ state, daysLeft, job: null });
  });

  test("ended items and agreements are not on it", async () => {
    const ended = await newItem(w);
    await endItem(w.owner.context, { itemId: ended.itemId });
    const over = await newItem(w, {}, { endsOn: "2026-11-30" });
    const lastDay = await newItem(w, {}, { endsOn: "2026-12-01" });
    expect(await dueRow(w, ended.itemId)).toBeUndefined();
    expect(await dueRow(w, over.itemId)).toBeUndefined();
    expect((await dueRow(w, lastDay.itemId))?.obstacles.map((one) => one.code)).toContain("agreement_ends");
  });

  test("what stands in the way goes once it is mended", async () => {
    const world = await newWorld();
    const site = await newSite(world.company, world.customer.customerId);
    const { itemId } = await newItem(
      world,
      { siteId: site.siteId, functions: [], testKind: "detectors" },
      { purchaseOrderNeeded: true },
    );
    const codes = async () => (await dueRow(world, itemId))?.obstacles.map((one) => one.code);
    expect(await codes()).toEqual(["no_license", "no_device_list", "no_purchase_order"]);
    await recordLicense(world.owner.context, {
      memberId: world.technician.memberId,
      kind: "Fire alarm technician",
      number: unique("IL"),
      jurisdiction: "IL",
      expiresOn: "2027-03-15",
    });
    expect(await codes()).toEqual(["no_device_list", "no_purchase_order"]);
  });

  test("a site whose contacts have no e-mail address says so", async () => {
    const world = await newWorld();
    const site = await newSite(world.company, (await freshCustomer(world)).customerId);
    const { itemId } = await newItem(world, { siteId: site.siteId });
    expect((await dueRow(world, itemId))?.obstacles.map((one) => one.code)).toContain("no_contact");
  });

  test("filters and orders as the address says, whatever is typed there", async () => {
    const world = await newWorld();
    await newItem(world, { testKind: "detectors", lastDoneOn: "2025-01-01", anchor: "last_done" });
    await newItem(world, {
      testKind: "batteries",
      frequency: "semiannual",
      lastDoneOn: "2026-11-01",
      anchor: "last_done",
    });
    const kinds = async (search: object) =>
      (await listDue(world.dispatcher.context, search)).rows.map((row) => row.item.testKind);
    expect(await kinds({})).toEqual(["detectors", "batteries"]);
    expect(await kinds({ sort: "-latest" })).toEqual(["batteries", "detectors"]);
    expect(await kinds({ sort: "test" })).toEqual(["batteries", "detectors"]);
    expect(await kinds({ when: "overdue" })).toEqual(["detectors"]);
    expect(await kinds({ kind: "batteries" })).toEqual(["batteries"]);
    expect(await kinds({ state: "WA" })).toEqual([]);
    expect(await kinds({ days: "30" })).toEqual(["detectors"]);
    expect(await kinds({ q: "no such site" })).toEqual([]);
    expect(await kinds({ page: "x", sort: "x", when: "x", days: "-1" })).toEqual(["detectors", "batteries"]);
    expect((await listDue(world.dispatcher.context, { when: "overdue" })).counts).toMatchObject({
      overdue: 1,
      early: 1,
    });
  });
});

const freshCustomer = async (world: World) => {
  const customer = await createCustomer(world.owner.context, { name: unique("Customer") });
  await addContact(world.owner.context, {
    ...customer,
    name: unique("Contact"),
    phone: "312-555-0100",
    allSites: true,
  });
  return customer;
};

describe("one click makes the job", () => {
  test("with everything the agreement says", async () => {
    const { itemId } = await newItem(w, { lastDoneOn: "2026-03-15" }, { purchaseOrder: "BPO 7" });
    const { jobId } = await makeDue(w.dispatcher.context, { itemId });
    expect(await getJob(w.dispatcher.context, { jobId })).toMatchObject({
      title: "Annual: fan shutdown test",
      kind: "test",
      state: "to_book",
      functions: ["fan_shutdown"],
      visitMinutes: 240,
      crewSize: 2,
      window: { earliest: "2026-12-15", target: "2027-03-15", latest: "2027-06-15" },
      terms: { purchaseOrder: "BPO 7" },
    });
  });

  test("once: a second click, and two at the same moment, answer the same job", async () => {
    const { itemId } = await newItem(w);
    const clicks = await Promise.all([1, 2, 3].map(() => makeDue(w.dispatcher.context, { itemId })));
    const again = await makeDue(w.owner.context, { itemId });
    expect(new Set([...clicks, again].map(({ jobId }) => jobId)).size).toBe(1);
    expect(await jobsOf(w, itemId)).toHaveLength(1);
  });

  test("a canceled job leaves the occurrence to be made again", async () => {
    const { itemId } = await newItem(w);
    const first = await makeDue(w.dispatcher.context, { itemId });
    await cancelJob(w.dispatcher.context, { jobId: first.jobId, reason: "The wing is being rebuilt" });
    expect((await makeDue(w.dispatcher.context, { itemId })).jobId).not.toBe(first.jobId);
  });

  test("done on a day, the next window counts from it", async () => {
    const { itemId } = await newItem(w, { lastDoneOn: "2025-11-20", anchor: "last_done" });
    const { jobId } = await makeDue(w.dispatcher.context, { itemId });
    await recordDone(w.dispatcher.context, { jobId, doneOn: "2026-11-30" });
    expect((await getJob(w.dispatcher.context, { jobId })).state).toBe("to_review");
    expect((await dueRow(w, itemId))?.window).toEqual({
      earliest: "2027-08-30",
      target: "2027-11-30",
      latest: "2028-02-29",
    });
  });

  test("a day to come, or before the last one, is refused at its field", async () => {
    const { itemId } = await newItem(w, { lastDoneOn: "2026-03-15" });
    for (const doneOn of ["2026-12-02", "2026-03-15"])
      await expect(recordCompletion(w.owner.context, { itemId, doneOn })).rejects.toMatchObject({
        fieldErrors: { doneOn: [expect.any(String)] },
      });
  });

  test("a change of the item moves the window of the job that is still to do", async () => {
    const { itemId } = await newItem(w, { lastDoneOn: "2026-03-15" });
    const { jobId } = await makeDue(w.dispatcher.context, { itemId });
    await changeItem(w.owner.context, { ...itemFacts(w), itemId, rule: "by_agreement", toleranceDays: "10" });
    expect((await getJob(w.owner.context, { jobId })).window).toEqual({
      earliest: "2027-03-05",
      target: "2027-03-15",
      latest: "2027-03-25",
    });
  });
});

describe("the sweep", () => {
  test("makes what opens within 45 days, and nothing that opens later or after the agreement has ended", async () => {
    const world = await newWorld();
    const overdue = await newItem(world, { anchor: "last_done", lastDoneOn: "2025-01-01" });
    const opens = await newItem(world, { anchor: "last_done", lastDoneOn: "2026-04-15" });
    const later = await newItem(world, { anchor: "last_done", lastDoneOn: "2026-04-16" });
    const ends = await newItem(world, { anchor: "last_done", lastDoneOn: "2026-04-15" }, { endsOn: "2027-01-14" });
    expect(await sweep(world)).toEqual({ made: 2 });
    expect(await jobsOf(world, overdue.itemId)).toHaveLength(1);
    expect(await jobsOf(world, opens.itemId)).toHaveLength(1);
    expect(await jobsOf(world, later.itemId)).toEqual([]);
    expect(await jobsOf(world, ends.itemId)).toEqual([]);
    expect(await sweep(world)).toEqual({ made: 0 });
  });

  test("four at once, with clicks between them: each job once, numbers without a gap", async () => {
    const world = await newWorld();
    const items = [];
    for (let i = 0; i < 6; i++) items.push(await newItem(world, { anchor: "last_done", lastDoneOn: "2025-12-01" }));
    const clicks = items.slice(0, 3).map(({ itemId }) => makeDue(world.dispatcher.context, { itemId }));
    await Promise.all([...[1, 2, 3, 4].map(() => sweep(world)), ...clicks]);
    const made = (await Promise.all(items.map(({ itemId }) => jobsOf(world, itemId)))).flat();
    expect(made).toHaveLength(6);
    const numbers = made.map((job) => job.number).sort((a, b) => a - b);
    expect(numbers).toEqual(numbers.map((_, i) => (numbers[0] ?? 0) + i));
  });

  test("the database itself refuses a second job for one occurrence", async () => {
    const { itemId } = await newItem(w);
    await makeDue(w.dispatcher.context, { itemId });
    const [job] = await jobsOf(w, itemId);
    if (!job) throw new Error("no job");
    const { id: _, ...copy } = job;
    const twice = asActor(w.dispatcher.actor, (tx) => tx.insert(jobs).values({ ...copy, number: 900_000 }), "write");
    await expect(twice).rejects.toMatchObject({ cause: { constraint_name: "jobs_occurrence_once" } });
  });
});

test("technicians and customers see nothing of agreements", async () => {
  await newItem(w, { lastDoneOn: "2026-03-15" });
  for (const actor of [w.technician.actor, w.contact.actor]) {
    expect(await asActor(actor, (tx) => tx.select().from(completions), "read")).toEqual([]);
  }
});
