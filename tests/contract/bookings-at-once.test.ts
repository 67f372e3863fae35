import { sql } from "drizzle-orm";
import { expect, test } from "vitest";
import { asActor } from "@/db/door";
import { AppError } from "@/lib/errors";
import type { Context, Verb } from "@/lib/services/command";
import { createJob } from "@/lib/services/jobs/create-job";
import { cancelVisit } from "@/lib/services/visits/cancel-visit";
import { moveVisit } from "@/lib/services/visits/move-visit";
import { planVisit } from "@/lib/services/visits/plan-visit";
import { swapVisits } from "@/lib/services/visits/swap-visits";
import { hire, type Person, sessionOf, worker } from "../factories/company";
import { newWorld, UNLICENSED } from "../factories/world";

/** Mulberry32: the same figures for the same seed, everywhere. */
function randomFrom(seed: number): (below: number) => number {
  let state = seed;
  return (below) => {
    state = (state + 0x6d2b79f5) | 0;
    let t = Math.imul(state ^ (state >>> 15), 1 | state);
    t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t;
    return Math.floor((((t ^ (t >>> 14)) >>> 0) / 4294967296) * below);
  };
}

const SEED = 20261201;
const COMMANDS = 100;
const AT_ONCE = 10;
const PEOPLE = 6;

type Count = { overlapping: number; standing: number };

/** Asked of the rows themselves, with nothing of the rules under test in between. */
async function overlaps(companyId: string): Promise<Count> {
  const [row] = await asActor(
    worker(companyId),
    (tx) =>
      tx.execute<Count>(sql`
        select count(*)::int as standing,
               count(*) filter (where exists (
                 select from visit_crew other
                  where other.member_id = crew.member_id and other.id <> crew.id and other.released_at is null
                    and other.starts_at < crew.ends_at and crew.starts_at < other.ends_at))::int as overlapping
          from visit_crew crew where released_at is null`),
    "read",
  );
  if (!row) throw new Error("the rows did not answer");
  return row;
}

test(`a hundred bookings, moves, swaps and cancellations at once (seed ${SEED}): no overlap, every refusal explained`, async () => {
  const w = await newWorld();
  const random = randomFrom(SEED);
  const crew: Person[] = [];
  for (let i = 0; i < PEOPLE; i++) crew.push(await hire(w.company, "technician"));
  const { jobId } = await createJob(w.owner.context, { siteId: w.site.siteId, kind: "repair", title: "Much to do" });
  const desks: Context[] = [];
  for (let i = 0; i < AT_ONCE; i++) {
    const actor = await sessionOf(w.company.companyId, w.dispatcher.memberId);
    desks.push({ actor, now: w.dispatcher.context.now });
  }

  const one = <T>(of: readonly T[]): T => of[random(of.length)] as T;
  const some = () => [...new Set([one(crew).memberId, one(crew).memberId])];
  const start = () =>
    `2026-12-0${7 + random(2)}T${String(6 + random(10)).padStart(2, "0")}:${one(["00", "15", "30", "45"])}`;
  const placing = () => ({ startsLocal: start(), minutes: 30 + 15 * random(5), crew: some() });
  const booked: string[] = [];
  const sequences = new Map<string, number>();
  const seen = () => {
    const visitId = one(booked);
    return { visitId, sequence: sequences.get(visitId) ?? 0 };
  };

  const step = (): [Verb, unknown] => {
    const dice = random(10);
    if (booked.length < 4 || dice < 4) return [planVisit, { jobId, ...placing(), overrides: UNLICENSED }];
    if (dice < 6) return [moveVisit, { ...seen(), ...placing(), overrides: UNLICENSED }];
    if (dice < 9)
      return [swapVisits, { first: seen(), second: seen(), exchange: one(["crews", "times"]), overrides: UNLICENSED }];
    return [cancelVisit, { visitId: seen().visitId, reason: "no longer wanted" }];
  };

  const refusals: AppError[] = [];
  const done = new Map<string, number>();
  const perform = async (desk: Context, [verb, input]: [Verb, unknown]) => {
    try {
      const result = (await verb(desk, input)) as { visitId?: string; visitIds?: string[] };
      done.set(verb.verbName, (done.get(verb.verbName) ?? 0) + 1);
      if (verb.verbName === "visit.plan" && result.visitId) booked.push(result.visitId);
      const changed = verb.verbName === "visit.move" && result.visitId ? [result.visitId] : (result.visitIds ?? []);
      for (const visitId of changed) sequences.set(visitId, (sequences.get(visitId) ?? 0) + 1);
    } catch (error) {
      if (!(error instanceof AppError)) throw error;
      refusals.push(error);
    }
  };
  for (let round = 0; round < COMMANDS / AT_ONCE; round++) {
    await Promise.all(desks.map((desk) => perform(desk, step())));
    expect((await overlaps(w.company.companyId)).overlapping).toBe(0);
  }

  const { standing, overlapping } = await overlaps(w.company.companyId);
  const total = [...done.values()].reduce((sum, count) => sum + count, 0);
  console.log(`bookings at once: ${JSON.stringify(Object.fromEntries(done))}, ${refusals.length} refused`);
  expect(overlapping).toBe(0);
  expect(standing).toBeGreaterThan(5);
  expect(total + refusals.length).toBe(COMMANDS);
  expect(refusals.length).toBeGreaterThan(5);
  for (const name of ["visit.plan", "visit.move", "visit.swap"]) expect(done.get(name), name).toBeGreaterThan(0);
  for (const { code, message, fieldErrors } of refusals) {
    expect(["blocked", "conflict", "invalid"]).toContain(code);
    const words = [message, ...Object.values(fieldErrors).flat()];
    for (const said of words) expect(said).toMatch(/^\w+ .{6,}/);
    if (code === "blocked") expect(Object.keys(fieldErrors)).not.toEqual([]);
  }
}, 120_000);
