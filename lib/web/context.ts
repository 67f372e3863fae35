import "server-only";
import { randomUUID } from "node:crypto";
import { headers } from "next/headers";
import { cache } from "react";
import type { Actor } from "@/lib/auth/actor";
import { auth } from "@/lib/auth/auth";
import type { Context } from "@/lib/services/command";

export const REQUEST_ID_HEADER = "x-request-id";

export const requestId = async (): Promise<string> => (await headers()).get(REQUEST_ID_HEADER) ?? randomUUID();

const signedIn = cache(async (): Promise<Actor> => {
  const session = await auth();
  return session?.sid ? { kind: "session", sessionId: session.sid } : { kind: "nobody" };
});

/** Who is asking, when, and under which request id: what every verb wants to know. */
export async function contextOf(actor?: Actor): Promise<Context> {
  return { actor: actor ?? (await signedIn()), now: new Date(), requestId: await requestId() };
}
