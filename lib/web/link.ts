import "server-only";
import { type EndedLink, endedVisitLink } from "@/lib/auth/ended-link";
import { AppError } from "@/lib/errors";
import type { Verb } from "@/lib/services/command";
import { contextOf } from "./context";

/** A page's read by whoever holds a signed link; of a link that works no longer, why. */
export async function readByLink<R>(verb: Verb<R>, token: string): Promise<{ open: R } | { ended: EndedLink | null }> {
  try {
    return { open: await verb(await contextOf({ kind: "link", token }), {}) };
  } catch (error) {
    if (error instanceof AppError && ["unauthenticated", "forbidden", "not_found"].includes(error.code))
      return { ended: await endedVisitLink(token) };
    throw error;
  }
}
