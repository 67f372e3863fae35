import { and, eq } from "drizzle-orm";
import type { Tx } from "@/db/client";
import { companies } from "@/db/schema/company";
import { accessRequests, users } from "@/db/schema/identity";
import { members } from "@/db/schema/people";
import { notFound } from "@/lib/errors";

type Request = typeof accessRequests.$inferSelect;
type Taken = { request: Request; email: string; companyName: string };

/**
 * Takes up what was asked on the sign-in page, or null where that has been done: the request goes in the very
 * transaction that writes the letter, so neither a crash nor a second worker writes two. The letter goes to the address
 * on file, never to the one typed.
 */
export async function takeRequest(
  tx: Tx,
  requestId: string,
  kind: Request["kind"],
  memberId: string,
): Promise<Taken | null> {
  const [request] = await tx
    .delete(accessRequests)
    .where(and(eq(accessRequests.id, requestId), eq(accessRequests.kind, kind)))
    .returning();
  if (!request) return null;
  const [person] = await tx
    .select({ email: users.email, companyName: companies.name })
    .from(members)
    .innerJoin(users, eq(users.id, members.userId))
    .innerJoin(companies, eq(companies.companyId, members.companyId))
    .where(eq(members.id, memberId));
  if (!person) throw notFound("person");
  return { request, ...person };
}
