import { getTableColumns, getTableName, type SQL, sql } from "drizzle-orm";
import type { PgColumn, PgTable } from "drizzle-orm/pg-core";
import type { Tx } from "@/db/client";

const ROWS_AT_ONCE = 2000;

type Row = { id: string };
type Write = { tx: Tx; companyId: string; table: PgTable; wrote: (rows: number) => void };

/**
 * Rows travel as one JSON value a chunk, which the server takes apart by the table's own types: COPY is refused under
 * row-level security, and a parameter for each cell costs more than the rows do.
 */
async function inChunks(write: Write, rows: readonly Row[], statement: (source: SQL, names: string[]) => SQL) {
  const columns = Object.entries(getTableColumns(write.table) as Record<string, PgColumn>);
  const used = columns.filter(([field]) => field === "companyId" || field in (rows[0] ?? {}));
  const stored = (row: Row) =>
    Object.fromEntries(
      used.map(([field, { name }]) => [name, field === "companyId" ? write.companyId : row[field as keyof Row]]),
    );
  for (let i = 0; i < rows.length; i += ROWS_AT_ONCE) {
    const chunk = rows.slice(i, i + ROWS_AT_ONCE);
    const source = sql`jsonb_populate_recordset(null::${write.table}, ${JSON.stringify(chunk.map(stored))}::text::jsonb)`;
    await write.tx.execute(
      statement(
        source,
        used.map(([, { name }]) => name),
      ),
    );
    write.wrote(chunk.length);
  }
}

const list = (parts: SQL[]) => sql.join(parts, sql`, `);

export const addRows = (write: Write, rows: readonly Row[]): Promise<void> =>
  inChunks(write, rows, (source, names) => {
    const columns = list(names.map((name) => sql.identifier(name)).map((name) => sql`${name}`));
    return sql`insert into ${write.table} (${columns}) select ${columns} from ${source}`;
  });

/** Writes every field that the rows have, but for what tells which row it is. */
export const changeRows = (write: Write, rows: readonly Row[]): Promise<void> =>
  inChunks(write, rows, (source, names) => {
    const table = sql.identifier(getTableName(write.table));
    const facts = names.filter((name) => !["company_id", "id", "system_id"].includes(name));
    const set = list(facts.map((name) => sql`${sql.identifier(name)} = fresh.${sql.identifier(name)}`));
    return sql`update ${table} set ${set} from ${source} as fresh
                where ${table}.company_id = fresh.company_id and ${table}.id = fresh.id`;
  });
