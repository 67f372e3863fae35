import "server-only";
import { and, desc, eq, isNull, sql } from "drizzle-orm";
import { v7 as uuidv7 } from "uuid";
import { database } from "@/db/client";
import { passwords, sessions, users } from "@/db/schema/identity";
import type { Role } from "@/lib/domain/shared/roles";

export const SESSION_DAYS = 30;

type Membership = { company_id: string; company_name: string; role: Role };

export async function membershipsOf(userId: string): Promise<Membership[]> {
  return database().execute<Membership>(sql`select * from app.memberships_of(${userId}::uuid)`);
}

export async function storedPassword(email: string) {
  const [row] = await database()
    .select({ userId: users.id, hash: passwords.hash })
    .from(users)
    .innerJoin(passwords, eq(passwords.userId, users.id))
    .where(eq(sql`lower(${users.email})`, email.toLowerCase()));
  return row;
}

/** Starts in the company where the person last was, else in their first. */
export async function startSession(userId: string, now: Date, userAgent: string | null): Promise<string | null> {
  const memberships = await membershipsOf(userId);
  const [user] = await database().select().from(users).where(eq(users.id, userId));
  if (!user || !memberships[0]) return null;
  const [last] = await database()
    .select({ companyId: sessions.companyId })
    .from(sessions)
    .where(eq(sessions.userId, userId))
    .orderBy(desc(sessions.createdAt))
    .limit(1);
  const company = memberships.find((membership) => membership.company_id === last?.companyId) ?? memberships[0];
  const id = uuidv7();
  await database()
    .insert(sessions)
    .values({
      id,
      userId,
      companyId: company.company_id,
      sessionVersion: user.sessionVersion,
      userAgent: userAgent?.slice(0, 300) ?? null,
      expiresAt: new Date(now.getTime() + SESSION_DAYS * 86_400_000),
    });
  return id;
}

export async function endSession(sessionId: string, now: Date): Promise<void> {
  await database()
    .update(sessions)
    .set({ endedAt: now })
    .where(and(eq(sessions.id, sessionId), isNull(sessions.endedAt)));
}
