import { and, count, eq, isNull, sql } from "drizzle-orm";
import { v7 as uuidv7 } from "uuid";
import type { Tx } from "@/db/client";
import { passwords, sessions, users } from "@/db/schema/identity";
import { memberDetails, members } from "@/db/schema/people";
import type { Entered } from "@/lib/auth/actor";
import type { Role } from "@/lib/domain/shared/roles";
import { AppError, notFound } from "@/lib/errors";

export async function userForAddress(tx: Tx, email: string, name: string): Promise<string> {
  const id = uuidv7();
  await tx.insert(users).values({ id, email, name }).onConflictDoNothing();
  const [user] = await tx
    .select({ id: users.id })
    .from(users)
    .where(eq(sql`lower(${users.email})`, email));
  if (!user) throw new Error("a user was neither found nor made");
  return user.id;
}

type NewMember = {
  userId: string;
  role: Role;
  name: string;
  email: string;
  phone: string | null;
  contactId?: string;
};

export async function addMember(tx: Tx, who: Entered, { email, phone, ...member }: NewMember): Promise<string> {
  const id = uuidv7();
  await tx.insert(members).values({ ...member, id, companyId: who.companyId });
  await tx.insert(memberDetails).values({ companyId: who.companyId, memberId: id, email, phone });
  return id;
}

export async function memberToChange(tx: Tx, memberId: string) {
  const [member] = await tx.select().from(members).where(eq(members.id, memberId)).for("update");
  if (!member) throw notFound("person");
  return member;
}

type Membership = { companyId: string; companyName: string; role: Role };

export async function membershipsOf(tx: Tx, userId: string): Promise<Membership[]> {
  const rows = await tx.execute<{ company_id: string; company_name: string; role: Role }>(
    sql`select * from app.memberships_of(${userId}::uuid)`,
  );
  return rows.map((row) => ({ companyId: row.company_id, companyName: row.company_name, role: row.role }));
}

/** A company without an owner could never be managed again. */
export async function mustKeepAnOwner(tx: Tx): Promise<void> {
  const [row] = await tx
    .select({ owners: count() })
    .from(members)
    .where(and(eq(members.role, "owner"), isNull(members.endedAt)));
  if (!row || row.owners === 0) throw new AppError("blocked", "The company needs at least one owner");
}

/** A new password ends every session of that person, here and elsewhere. */
export async function setPassword(tx: Tx, userId: string, hash: string, now: Date): Promise<void> {
  await tx
    .insert(passwords)
    .values({ userId, hash, changedAt: now })
    .onConflictDoUpdate({ target: passwords.userId, set: { hash, changedAt: now } });
  await signOutEverywhere(tx, userId, now);
}

export async function signOutEverywhere(tx: Tx, userId: string, now: Date): Promise<void> {
  await tx
    .update(users)
    .set({ sessionVersion: sql`${users.sessionVersion} + 1` })
    .where(eq(users.id, userId));
  await tx
    .update(sessions)
    .set({ endedAt: now })
    .where(and(eq(sessions.userId, userId), isNull(sessions.endedAt)));
}
