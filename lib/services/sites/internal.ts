import { eq } from "drizzle-orm";
import type { Tx } from "@/db/client";
import { siteAccess, sites } from "@/db/schema/sites";
import type { Entered } from "@/lib/auth/actor";
import { notFound } from "@/lib/errors";

export async function siteById(tx: Tx, siteId: string) {
  const [site] = await tx.select().from(sites).where(eq(sites.id, siteId));
  if (!site) throw notFound("site");
  return site;
}

export async function setAccessNote(tx: Tx, who: Entered, siteId: string, note: string | null): Promise<void> {
  if (note === null) {
    await tx.delete(siteAccess).where(eq(siteAccess.siteId, siteId));
    return;
  }
  await tx
    .insert(siteAccess)
    .values({ companyId: who.companyId, siteId, note })
    .onConflictDoUpdate({ target: [siteAccess.companyId, siteAccess.siteId], set: { note } });
}
