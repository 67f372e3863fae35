import { randomBytes } from "node:crypto";
import { and, eq, inArray, isNull } from "drizzle-orm";
import type { Tx } from "@/db/client";
import { hashToken } from "@/db/door";
import { links } from "@/db/schema/messages";
import type { Entered } from "@/lib/auth/actor";
import type { LinkGrant } from "@/lib/domain/shared/permissions";
import { AppError } from "@/lib/errors";

type NewLink = { grant: LinkGrant; subjectId: string; expiresAt: Date };

/** The token leaves this function once; only its hash stays. */
export async function makeLink(tx: Tx, who: Entered, link: NewLink): Promise<string> {
  const token = randomBytes(32).toString("base64url");
  await tx.insert(links).values({ ...link, companyId: who.companyId, tokenHash: hashToken(token) });
  return token;
}

/** A second press, or a second tab, loses the race here. */
export async function spendLink(tx: Tx, who: Entered, now: Date): Promise<string> {
  if (who.kind !== "link") throw new AppError("forbidden", "Only a link may do that");
  const used = await tx
    .update(links)
    .set({ usedAt: now })
    .where(and(eq(links.id, who.linkId), isNull(links.usedAt)))
    .returning({ subjectId: links.subjectId });
  if (!used[0]) throw new AppError("unauthenticated", "This link has been used");
  return used[0].subjectId;
}

export async function withdrawLinks(tx: Tx, subjectIds: string[], grant: LinkGrant, now: Date): Promise<void> {
  await tx
    .update(links)
    .set({ withdrawnAt: now })
    .where(
      and(
        inArray(links.subjectId, subjectIds),
        eq(links.grant, grant),
        isNull(links.usedAt),
        isNull(links.withdrawnAt),
      ),
    );
}
