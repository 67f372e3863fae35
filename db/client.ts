import { drizzle } from "drizzle-orm/postgres-js";
import postgres from "postgres";
import { env } from "@/lib/env";
import { log } from "@/lib/log";

function connect() {
  const client = postgres(env().DATABASE_URL, {
    max: 10,
    onnotice: (notice) => log().debug({ notice: notice.message }, "database notice"),
    connection: { application_name: "coastdown" },
  });
  return drizzle(client);
}

export type Database = ReturnType<typeof connect>;
export type Tx = Parameters<Parameters<Database["transaction"]>[0]>[0];

// Hot reload loads this module again; the pool must outlive it.
const kept = globalThis as { coastdownDatabase?: Database };

/** For `db/door.ts` and `lib/auth` (its own tables) alone. */
export function database(): Database {
  kept.coastdownDatabase ??= connect();
  return kept.coastdownDatabase;
}

/** Raw statements and LISTEN, on a client that Drizzle has not changed. */
export function rawClient(options: { max: number }) {
  return postgres(env().DATABASE_URL, { ...options, onnotice: () => {} });
}
