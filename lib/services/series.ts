import { sql } from "drizzle-orm";
import type { Tx } from "@/db/client";
import { series } from "@/db/schema/company";
import type { Entered } from "@/lib/auth/actor";

/** The next gapless number; whoever asks later waits for this transaction to end. */
export async function nextNumber(tx: Tx, who: Entered, name: string): Promise<number> {
  const [row] = await tx
    .insert(series)
    .values({ companyId: who.companyId, name, last: 1 })
    .onConflictDoUpdate({ target: [series.companyId, series.name], set: { last: sql`${series.last} + 1` } })
    .returning({ last: series.last });
  if (!row) throw new Error(`no number in series ${name}`);
  return row.last;
}
