import { expect, test } from "vitest";
import { asActor } from "@/db/door";
import { dueSweeps } from "@/db/schema/agreements";
import { listJobs } from "@/lib/services/jobs/list-jobs";
import { NOW, worker } from "@/tests/factories/company";
import { newItem } from "@/tests/factories/work";
import { newWorld, type World } from "@/tests/factories/world";
import { dueSweeper } from "./due-sweeps";

const later = (minutes: number) => new Date(NOW.getTime() + minutes * 60_000);
const on = () => true;
const made = async (w: World) => (await listJobs(w.owner.context, { q: "Annual: fan shutdown" })).total;
const nextSweep = async (w: World) => {
  const [row] = await asActor(worker(w.company.companyId), (tx) => tx.select().from(dueSweeps), "read");
  return row?.nextAt.toISOString();
};

test("every company at the start, then again when its own day begins, and once however many workers there are", async () => {
  const w = await newWorld();
  const overdue = () => newItem(w, { anchor: "last_done", lastDoneOn: "2025-01-01" });
  await overdue();
  let now = NOW;
  const workers = [1, 2, 3].map(() => dueSweeper(() => now));
  const look = () => Promise.all(workers.map((sweep) => sweep(on)));
  await look();
  expect(await made(w)).toBe(1);
  // Midnight in Chicago, 2026-12-02.
  expect(await nextSweep(w)).toBe("2026-12-02T06:00:00.000Z");
  await overdue();
  now = later(60 * 11 + 59);
  await look();
  expect(await made(w)).toBe(1);
  now = later(60 * 12 + 1);
  await look();
  expect(await made(w)).toBe(2);
  expect(await nextSweep(w)).toBe("2026-12-03T06:00:00.000Z");
});

test("a worker that is told to stop leaves the rest to the next one", async () => {
  const w = await newWorld();
  await newItem(w, { anchor: "last_done", lastDoneOn: "2025-12-01" });
  await dueSweeper(() => NOW)(() => false);
  expect(await made(w)).toBe(0);
  await dueSweeper(() => NOW)(on);
  expect(await made(w)).toBe(1);
});
