import { spawnSync } from "node:child_process";
import { randomBytes } from "node:crypto";
import { join } from "node:path";
import postgres from "postgres";
import { afterAll, beforeAll, expect, test } from "vitest";
import { migrateDatabase } from "@/db/migrations";

// Only a superuser can restore; a server given from outside does not lend us one.
const admin = process.env.DATABASE_ADMIN_URL;
const suffix = randomBytes(4).toString("hex");
const [source, copy] = [`backup_${suffix}`, `restore_${suffix}`];
const at = (url: string | undefined, name: string) => Object.assign(new URL(url ?? ""), { pathname: name }).href;
const password = (url: string | undefined) => new URL(url ?? "").password;

function script(name: string, url: string, input?: Buffer) {
  const { hostname, port, username, password: secret, pathname } = new URL(url);
  return spawnSync(join(import.meta.dirname, name), {
    input,
    maxBuffer: 100_000_000,
    env: {
      ...process.env,
      PGHOST: hostname,
      PGPORT: port,
      PGUSER: username,
      PGPASSWORD: secret,
      PGDATABASE: pathname.slice(1),
      COASTDOWN_OWNER_PASSWORD: password(process.env.DATABASE_OWNER_URL),
      COASTDOWN_APP_PASSWORD: password(process.env.DATABASE_URL),
    },
  });
}

async function asking<T>(url: string, ask: (sql: postgres.Sql) => Promise<T>): Promise<T> {
  const sql = postgres(url, { max: 1, onnotice: () => {} });
  try {
    return await ask(sql);
  } finally {
    await sql.end();
  }
}

/** Rows of every table, every policy, and who owns what, as a superuser sees them. */
const contents = (url: string) =>
  asking(url, async (sql) => {
    const tables = await sql<{ name: string; forced: boolean; owner: string }[]>`
      select c.oid::regclass::text as name, c.relforcerowsecurity as forced, c.relowner::regrole::text as owner
      from pg_class c join pg_namespace n on n.oid = c.relnamespace
      where c.relkind = 'r' and n.nspname not in ('pg_catalog', 'information_schema') order by 1`;
    const counts: Record<string, unknown> = {};
    for (const { name, forced, owner } of tables) {
      counts[name] = { forced, owner, rows: (await sql.unsafe(`select count(*)::int as n from ${name}`))[0]?.n };
    }
    const policies = await sql`select tablename, policyname, qual, with_check from pg_policies order by 1, 2`;
    const functions = await sql`select p.oid::regprocedure::text, proowner::regrole::text, prosecdef, proacl::text
      from pg_proc p where pronamespace = 'app'::regnamespace order by 1`;
    return { counts, policies: [...policies], functions: [...functions] };
  });

async function fill() {
  await migrateDatabase(at(process.env.DATABASE_OWNER_URL, source), join(import.meta.dirname, "../db/migrations"));
  await asking(at(admin, source), async (sql) => {
    await sql`create table readings (company_id uuid, seconds int)`;
    await sql`alter table readings owner to coastdown_owner`;
    await sql`alter table readings enable row level security`;
    await sql`alter table readings force row level security`;
    await sql`create policy own on readings using (company_id = app.company_id())`;
    await sql`insert into readings select gen_random_uuid(), n from generate_series(1, 500) n`;
  });
}

beforeAll(async () => {
  if (!admin) return;
  await asking(at(admin, "postgres"), (sql) => sql.unsafe(`create database ${source} owner coastdown_owner`));
  await fill();
});

afterAll(async () => {
  if (!admin) return;
  for (const name of [source, copy]) {
    await asking(at(admin, "postgres"), (sql) => sql.unsafe(`drop database if exists ${name} with (force)`));
  }
});

test.skipIf(!admin)("a backup restored elsewhere holds every row, policy and owner", async () => {
  const backup = script("backup.sh", at(admin, source));
  expect(backup.stderr.toString()).toBe("");
  const restored = script("restore.sh", at(admin, copy), backup.stdout);
  expect(restored.stderr.toString()).toBe("");
  const [before, after] = [await contents(at(admin, source)), await contents(at(admin, copy))];
  expect(after).toEqual(before);
  expect(after.counts.readings).toEqual({ forced: true, owner: "coastdown_owner", rows: 500 });

  const again = script("restore.sh", at(admin, copy), backup.stdout);
  expect(again.stderr.toString()).toContain("is not empty");
  expect(again.status).toBe(1);
});

test.skipIf(!admin)("a backup by a role that row-level security binds is refused, not cut short", () => {
  const backup = script("backup.sh", at(process.env.DATABASE_OWNER_URL, source));
  expect(backup.status).not.toBe(0);
  expect(backup.stderr.toString()).toContain("row-level security");
});
