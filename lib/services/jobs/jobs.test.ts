import { beforeAll, describe, expect, test } from "vitest";
import { NOW } from "@/tests/factories/company";
import { newJob } from "@/tests/factories/work";
import { newVisit, newWorld, type World } from "@/tests/factories/world";
import { cancelVisit } from "../visits/cancel-visit";
import { cancelJob } from "./cancel-job";
import { createJob } from "./create-job";
import { endWait } from "./end-wait";
import { getJob } from "./get-job";
import { listJobs } from "./list-jobs";
import { recordDone } from "./record-done";
import { setTerms } from "./set-terms";
import { waitFor } from "./wait-for";

let w: World;
beforeAll(async () => {
  w = await newWorld();
});
const at = (hours: number) => ({ actor: w.dispatcher.actor, now: new Date(NOW.getTime() + hours * 3_600_000) });
const wait = { waitsFor: "parts", person: "Parts counter", untilDate: "2026-12-09" };

test("the state of a job is told alike on its page and in the list, at every hour", async () => {
  // NOW is noon in Chicago.
  const span = (from: string, to: string) => [`2026-12-01T${from}`, `2026-12-01T${to}`] as const;
  const visited = async (...spans: (readonly [string, string])[]) => {
    const first = spans[0] ?? span("13:00", "14:00");
    const { jobId } = await newVisit(w.company, w.site.siteId, [w.otherTechnician], ...first);
    return jobId;
  };
  const ahead = await visited(span("15:00", "16:00"));
  const current = await visited(span("11:00", "13:00"));
  const ended = await visited(span("08:00", "09:00"));
  const toBook = await newJob(w);
  const waiting = await newJob(w);
  await waitFor(at(0), { ...wait, jobId: waiting });
  const bookedButWaiting = await visited(span("16:30", "17:00"));
  await waitFor(at(0), { ...wait, jobId: bookedButWaiting });
  const done = await newJob(w);
  await recordDone(at(0), { jobId: done, doneOn: "2026-12-01" });
  const canceled = await newJob(w);
  await cancelJob(at(0), { jobId: canceled, reason: "Not needed" });

  const expected = { ahead: "booked", current: "under_way", ended: "to_review", toBook: "to_book" };
  const ids = { ahead, current, ended, toBook, waiting, bookedButWaiting, done, canceled };
  const states = async (hours: number) =>
    Object.fromEntries(
      await Promise.all(
        Object.entries(ids).map(async ([name, jobId]) => [name, (await getJob(at(hours), { jobId })).state]),
      ),
    );
  expect(await states(0)).toEqual({
    ...expected,
    waiting: "waiting",
    bookedButWaiting: "waiting",
    done: "to_review",
    canceled: "canceled",
  });
  for (const hours of [-6, 0, 3.5, 5, 24]) {
    const listed = [
      ...(await listJobs(at(hours), { pageSize: 1000 })).rows,
      ...(await listJobs(at(hours), { pageSize: 1000, state: "canceled" })).rows,
    ];
    const told = Object.fromEntries(
      Object.entries(ids).map(([name, id]) => [name, listed.find((job) => job.id === id)?.state]),
    );
    expect(told, `${hours} hours on`).toEqual(await states(hours));
    for (const state of ["booked", "under_way", "waiting", "to_review", "to_book"] as const) {
      const { rows, total } = await listJobs(at(hours), { state, pageSize: 1000 });
      expect(total).toBe(rows.length);
      expect(rows.every((job) => job.state === state)).toBe(true);
    }
  }
});

describe("canceling", () => {
  test("is refused while a visit stands, and possible once it is canceled", async () => {
    const { jobId, visitId } = await newVisit(
      w.company,
      w.site.siteId,
      [w.technician],
      "2026-12-08T08:00",
      "2026-12-08T09:00",
    );
    const cancel = () => cancelJob(at(0), { jobId, reason: "The building was sold" });
    await expect(cancel()).rejects.toMatchObject({ code: "blocked", message: /visits first/ });
    await cancelVisit(at(0), { visitId, reason: "The building was sold" });
    await cancel();
    const job = await getJob(at(0), { jobId });
    expect(job).toMatchObject({ state: "canceled", cancelReason: "The building was sold" });
    await expect(cancel()).rejects.toMatchObject({ code: "blocked" });
  });

  test("asks for a reason", async () => {
    await expect(cancelJob(at(0), { jobId: await newJob(w), reason: " " })).rejects.toMatchObject({
      fieldErrors: { reason: [expect.any(String)] },
    });
  });
});

describe("waiting", () => {
  test("for one thing once, for several things together; the job goes on when the last has come", async () => {
    const jobId = await newJob(w);
    const parts = await waitFor(at(0), { ...wait, jobId });
    const access = await waitFor(at(1), { jobId, waitsFor: "access", person: "Front desk" });
    await expect(waitFor(at(1), { ...wait, jobId })).rejects.toMatchObject({ code: "conflict", message: /already/ });
    await endWait(at(2), parts);
    expect((await getJob(at(2), { jobId })).state).toBe("waiting");
    await endWait(at(3), access);
    expect((await getJob(at(3), { jobId })).state).toBe("to_book");
    await expect(endWait(at(4), access)).rejects.toMatchObject({ code: "conflict" });
  });

  test("is over when the job is done, and cannot begin after it", async () => {
    const jobId = await newJob(w);
    await waitFor(at(0), { ...wait, jobId });
    await recordDone(at(0), { jobId, doneOn: "2026-12-01" });
    expect((await getJob(at(0), { jobId })).waits.every((one) => one.endedAt !== null)).toBe(true);
    await expect(waitFor(at(0), { ...wait, jobId })).rejects.toMatchObject({ code: "blocked" });
  });
});

describe("purchase order and limit", () => {
  test.each([
    [
      { purchaseOrder: "PO 1", limit: "1,250.50" },
      { purchaseOrder: "PO 1", limitCents: 125_050, noneNeeded: false },
    ],
    [{ noneNeeded: "on" }, { purchaseOrder: null, limitCents: null, noneNeeded: true }],
  ])("%j", async (said, kept) => {
    const jobId = await newJob(w);
    await setTerms(at(0), { jobId, ...said });
    expect((await getJob(at(0), { jobId })).terms).toMatchObject(kept);
  });
  test.each([
    [{}, "purchaseOrder"],
    [{ purchaseOrder: "PO 1", noneNeeded: "on" }, "noneNeeded"],
    [{ limit: "12,5" }, "limit"],
    [{ limit: "0" }, "limit"],
  ])("%j is refused at %s", async (said, field) => {
    const refused = setTerms(at(0), { jobId: await newJob(w), ...said });
    await expect(refused).rejects.toMatchObject({ fieldErrors: { [field]: [expect.any(String)] } });
  });
});

test("a call keeps who called, and its history names who took it", async () => {
  const { jobId } = await createJob(at(0), {
    siteId: w.site.siteId,
    kind: "service_call",
    title: "Trouble on loop 2",
    callerName: "Front desk",
    callerPhone: "312-555-0107",
    urgent: "on",
  });
  const job = await getJob(at(0), { jobId });
  expect(job).toMatchObject({ urgent: true, callerName: "Front desk", state: "to_book" });
  expect(job.history).toMatchObject([{ command: "job.create", person: expect.stringContaining("dispatcher") }]);
});

test("a job is found by number, work, site and street", async () => {
  const { jobId, number } = await createJob(at(0), {
    siteId: w.site.siteId,
    kind: "repair",
    title: "Sluice gate relay",
  });
  for (const q of [String(number), "sluice GATE", w.site.name])
    expect((await listJobs(at(0), { q, pageSize: 1000 })).rows.map((job) => job.id)).toContain(jobId);
  expect((await listJobs(at(0), { site: w.secondSite.siteId })).rows).toEqual([]);
});
