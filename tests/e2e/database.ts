import postgres from "postgres";
import { DEMO_COMPANY } from "../../db/demo/people";

/** Reads what the product has written, as the demo company's worker sees it. */
export async function rows<T extends object>(query: (sql: postgres.TransactionSql) => Promise<T[]>): Promise<T[]> {
  const url = process.env.DATABASE_URL;
  if (!url) throw new Error("DATABASE_URL is missing: run these tests through `npm test`");
  const sql = postgres(url, { max: 1 });
  try {
    const found = await sql.begin("read only", async (tx) => {
      await tx`select app.enter_worker(${DEMO_COMPANY.companyId}::uuid)`;
      return query(tx);
    });
    return found as T[];
  } finally {
    await sql.end();
  }
}
