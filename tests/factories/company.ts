import { randomUUID } from "node:crypto";
import { eq } from "drizzle-orm";
import { v7 as uuidv7 } from "uuid";
import { database } from "@/db/client";
import { asActor } from "@/db/door";
import { passwords, sessions, users } from "@/db/schema/identity";
import { members } from "@/db/schema/people";
import type { Actor } from "@/lib/auth/actor";
import { hashPassword } from "@/lib/auth/password";
import type { StaffRole } from "@/lib/domain/shared/roles";
import type { Context } from "@/lib/services/command";
import { foundCompany } from "@/lib/services/people/found-company";
import { inviteStaff } from "@/lib/services/people/invite-staff";

/** A Tuesday noon in Chicago; tests of what depends on dates count from here. */
export const NOW = new Date("2026-12-01T18:00:00Z");
const DAY_MS = 86_400_000;

let counter = 0;
/** Unlike any other in this run, so that test files and tests share nothing. */
export const unique = (word: string): string => `${word} ${++counter}-${randomUUID().slice(0, 8)}`;
export const uniqueAddress = (): string => `${randomUUID().slice(0, 12)}@people.example`;

export const worker = (companyId: string): Actor => ({ kind: "worker", companyId });

/** What signing in does: a session of a user in a company, under the user's present version. */
export async function sessionOf(companyId: string, memberId: string): Promise<Extract<Actor, { kind: "session" }>> {
  const userId = await userOf(companyId, memberId);
  const [user] = await database().select().from(users).where(eq(users.id, userId));
  const id = uuidv7();
  await database()
    .insert(sessions)
    .values({
      id,
      userId,
      companyId,
      sessionVersion: user?.sessionVersion ?? 0,
      expiresAt: new Date(Date.now() + 30 * DAY_MS),
    });
  return { kind: "session", sessionId: id };
}

async function sessionRow(actor: Actor) {
  const sessionId = actor.kind === "session" ? actor.sessionId : "";
  const [row] = await database().select().from(sessions).where(eq(sessions.id, sessionId));
  if (!row) throw new Error("nobody is signed in");
  return row;
}

/** The same person, signed in once more. */
export async function secondSession(actor: Actor): Promise<string> {
  const id = uuidv7();
  await database()
    .insert(sessions)
    .values({ ...(await sessionRow(actor)), id });
  return id;
}

export async function givePassword(actor: Actor, password: string): Promise<void> {
  const { userId } = await sessionRow(actor);
  const hash = await hashPassword(password);
  await database()
    .insert(passwords)
    .values({ userId, hash })
    .onConflictDoUpdate({ target: passwords.userId, set: { hash } });
}

async function userOf(companyId: string, memberId: string): Promise<string> {
  const [member] = await asActor(
    worker(companyId),
    (tx) => tx.select({ userId: members.userId }).from(members).where(eq(members.id, memberId)),
    "read",
  );
  if (!member?.userId) throw new Error("no such member");
  return member.userId;
}

export type Person = { memberId: string; email: string; actor: Actor; context: Context };
export type Company = { companyId: string; name: string; owner: Person };

export async function newCompany(): Promise<Company> {
  const companyId = uuidv7();
  const name = unique("Company");
  const email = uniqueAddress();
  const { memberId } = await foundCompany(
    { actor: { kind: "operator", companyId }, now: NOW },
    {
      companyId,
      name,
      phone: "312-555-0100",
      street: "1 Test Street",
      city: "Chicago",
      state: "IL",
      postalCode: "60601",
      zone: "America/Chicago",
      ownerName: unique("Owner"),
      ownerEmail: email,
    },
  );
  return { companyId, name, owner: await person(companyId, memberId, email) };
}

export async function person(companyId: string, memberId: string, email: string): Promise<Person> {
  const actor = await sessionOf(companyId, memberId);
  return { memberId, email, actor, context: { actor, now: NOW } };
}

export async function hire(company: Company, role: StaffRole): Promise<Person> {
  const email = uniqueAddress();
  const { memberId } = await inviteStaff(company.owner.context, { name: unique(role), email, role });
  return person(company.companyId, memberId, email);
}
