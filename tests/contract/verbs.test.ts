import { sql } from "drizzle-orm";
import { beforeAll, describe, expect, test } from "vitest";
import { database } from "@/db/client";
import { asActor } from "@/db/door";
import { auditEntries } from "@/db/schema/audit";
import { sessions } from "@/db/schema/identity";
import type { Actor } from "@/lib/auth/actor";
import { ROLE_GRANTS } from "@/lib/domain/shared/permissions";
import { ROLES, type Role } from "@/lib/domain/shared/roles";
import { AppError } from "@/lib/errors";
import type { Verb } from "@/lib/services/command";
import { endMembership } from "@/lib/services/people/end-membership";
import { COMMANDS, QUERIES } from "@/lib/services/registry";
import { hire, NOW, sessionOf } from "../factories/company";
import { newWorld, type World } from "../factories/world";
import { SAMPLES } from "./samples";

const VERBS = [...COMMANDS, ...QUERIES].map((verb) => [verb.verbName, verb] as const);
const covered = { verbs: COMMANDS.length, reads: QUERIES.length, refusals: 0, allowed: 0 };

let ours: World;
let theirs: World;
beforeAll(async () => {
  [ours, theirs] = [await newWorld(), await newWorld()];
});

const actors = (world: World): Record<Role, Actor> => ({
  owner: world.owner.actor,
  dispatcher: world.dispatcher.actor,
  technician: world.technician.actor,
  bookkeeper: world.bookkeeper.actor,
  customer: world.contact.actor,
});

async function outcome(verb: Verb, actor: Actor, input: unknown): Promise<string> {
  try {
    await verb({ actor, now: NOW }, input);
    return "done";
  } catch (error) {
    if (error instanceof AppError) return error.code;
    throw error;
  }
}

async function refused(verb: Verb, actor: Actor, input: unknown, codes: string[]) {
  const before = await trailLength(ours);
  expect(codes).toContain(await outcome(verb, actor, input));
  expect(await trailLength(ours)).toBe(before);
  covered.refusals++;
}

const trailLength = ({ owner }: World): Promise<number> =>
  asActor(owner.actor, async (tx) => (await tx.select().from(auditEntries)).length, "read");

test("every verb and every read has a sample, and no sample is left over", () => {
  expect(Object.keys(SAMPLES).sort()).toEqual(VERBS.map(([name]) => name).sort());
});

const ENDS_SESSIONS = ["account.sign-out-everywhere", "account.change-password"];

/** Verbs that end the caller's own sessions would take the other tests' callers away. */
const callersOf = async (world: World, role: Role, verbName: string): Promise<Actor> => {
  if (!ENDS_SESSIONS.includes(verbName)) return actors(world)[role];
  if (role === "customer") return sessionOf(world.company.companyId, world.otherContact.memberId);
  return (await hire(world.company, role)).actor;
};

describe.each(VERBS)("%s", (name, verb) => {
  const sample = async (world: World, caller?: Actor) => (SAMPLES[name] ?? (() => ({})))(world, caller);

  test.each(ROLES)("as %s: just what the table of permissions says", async (role) => {
    const actor = await callersOf(ours, role, name);
    const input = await sample(ours, actor);
    if (ROLE_GRANTS[role].includes(verb.needs)) {
      const before = await trailLength(ours);
      expect(await outcome(verb, actor, input)).toBe("done");
      if (verb.kind === "command") expect(await trailLength(ours)).toBeGreaterThan(before);
      covered.allowed++;
    } else {
      await refused(verb, actor, input, ["forbidden"]);
    }
  });

  test("with nobody signed in, an unknown session and a forged link: shut", async () => {
    const input = await sample(ours);
    for (const actor of strangers()) await refused(verb, actor, input, ["unauthenticated"]);
  });

  test("as somebody whose membership has ended, or who signed out: shut", async () => {
    const gone = await hire(ours.company, "owner");
    await endMembership(ours.owner.context, { memberId: gone.memberId });
    await refused(verb, gone.actor, await sample(ours), ["unauthenticated"]);
    const out = await sessionOf(ours.company.companyId, ours.dispatcher.memberId);
    await database().update(sessions).set({ endedAt: NOW }).where(sql`id = ${out.sessionId}`);
    await refused(verb, out, await sample(ours), ["unauthenticated"]);
  });

  test("as another company's owner: what is ours is not there", async () => {
    const input = await sample(ours);
    const speaksOfOurs = /Id"/.test(JSON.stringify(input));
    if (verb.kind === "query") {
      const answer = await verb({ actor: theirs.owner.actor, now: NOW }, input).catch((error: AppError) => error.code);
      expect(JSON.stringify(answer)).not.toContain(ours.company.companyId);
      expect(JSON.stringify(answer)).not.toContain(ours.site.siteId);
      expect(JSON.stringify(answer)).not.toContain(ours.technician.memberId);
      covered.refusals++;
    } else if (speaksOfOurs && ROLE_GRANTS.owner.includes(verb.needs)) {
      await refused(verb, theirs.owner.actor, input, ["not_found"]);
    }
  });

  test("as another customer of ours: nothing of this customer", async () => {
    const answer = await verb({ actor: ours.otherContact.actor, now: NOW }, await sample(ours)).catch(
      (error: AppError) => error.code,
    );
    const words = JSON.stringify(answer) ?? "";
    for (const id of [ours.site.siteId, ours.customer.customerId, ours.visit.visitId]) expect(words).not.toContain(id);
    covered.refusals++;
  });
});

const strangers = (): Actor[] => [
  { kind: "nobody" },
  { kind: "session", sessionId: "0193c000-0000-7000-8000-000000000000" },
  { kind: "link", token: "forged" },
];

test("what was covered", () => {
  expect(covered.refusals).toBeGreaterThan(VERBS.length * 5);
});
