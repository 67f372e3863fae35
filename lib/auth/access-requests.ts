import "server-only";
import { database } from "@/db/client";
import { accessRequests } from "@/db/schema/identity";

type AccessRequest = typeof accessRequests.$inferInsert;

/** Written alike for known and unknown addresses; the worker finds out whether anybody is there. */
export async function requestAccess(request: AccessRequest): Promise<void> {
  await database().insert(accessRequests).values(request);
}
