import { sql } from "drizzle-orm";
import type { Tx } from "@/db/client";
import { series } from "@/db/schema/company";
import type { Entered } from "@/lib/auth/actor";

/** The next gapless number; whoever asks later waits for this transaction to end. */
export const nextNumber = (tx: Tx, who: Entered, name: string): Promise<number> => nextNumbers(tx, who, name, 1);

/** The first of so many numbers in a row. */
export async function nextNumbers(tx: Tx, who: Entered, name: string, count: number): Promise<number> {
  const [row] = await tx
    .insert(series)
    .values({ companyId: who.companyId, name, last: count })
    .onConflictDoUpdate({ target: [series.companyId, series.name], set: { last: sql`${series.last} + ${count}` } })
    .returning({ last: series.last });
  if (!row) throw new Error(`no number in series ${name}`);
  return row.last - count + 1;
}
