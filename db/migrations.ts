import { readFileSync } from "node:fs";
import { join } from "node:path";
import { drizzle } from "drizzle-orm/postgres-js";
import { migrate } from "drizzle-orm/postgres-js/migrator";
import postgres from "postgres";

/** Applies what is missing and refuses to go on when the database and the files disagree. */
export async function migrateDatabase(ownerUrl: string, folder: string): Promise<number> {
  const { entries } = JSON.parse(readFileSync(join(folder, "meta/_journal.json"), "utf8")) as {
    entries: { when: number; tag: string }[];
  };
  entries.forEach((entry, i) => {
    // A migration dated before the last applied one is skipped without a word.
    if (i > 0 && entry.when <= (entries[i - 1]?.when ?? 0))
      throw new Error(`${entry.tag} is dated before its predecessor`);
  });
  const client = postgres(ownerUrl, { max: 1, onnotice: () => {} });
  try {
    // Two launchers at once: the second waits, then finds nothing to do.
    await client`select pg_advisory_lock(hashtext('coastdown migrations'))`;
    await migrate(drizzle(client), { migrationsFolder: folder });
    const [row] = await client<
      { applied: number }[]
    >`select count(*)::int as applied from drizzle.__drizzle_migrations`;
    if (row?.applied !== entries.length)
      throw new Error(`${row?.applied} migrations applied, ${entries.length} in files`);
    return entries.length;
  } finally {
    await client.end();
  }
}
