import { eq, sql } from "drizzle-orm";
import type { AnyPgColumn, PgTable } from "drizzle-orm/pg-core";
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

/** A table of things that a site has for a while. */
type Register = PgTable & { id: AnyPgColumn };

/** Ends an entry that has not ended yet; answers the site that it belongs to. */
export async function endEntry(tx: Tx, table: Register, id: string, now: Date, what: string): Promise<string> {
  const [ended] = await tx.execute<{ site_id: string }>(
    sql`update ${table} set ended_at = ${now.toISOString()}
         where ${table.id} = ${id} and ended_at is null returning site_id`,
  );
  if (!ended) throw notFound(what);
  return ended.site_id;
}
