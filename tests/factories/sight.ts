import { sql } from "drizzle-orm";
import { asActor } from "@/db/door";
import type { Actor } from "@/lib/auth/actor";

type Row = Record<string, string | null>;

/** Every row of a table that exists for an actor, with no condition but the database's own. */
export const rowsSeen = (actor: Actor, table: string): Promise<Row[]> =>
  asActor(actor, async (tx) => [...(await tx.execute<Row>(sql`select * from ${sql.identifier(table)}`))], "read");

/** The values of one column, sorted, each once. */
export async function seen(actor: Actor, table: string, column = "id"): Promise<string[]> {
  const rows = await rowsSeen(actor, table);
  return [...new Set(rows.map((row) => String(row[column])))].sort();
}
