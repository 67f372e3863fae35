import { spawn } from "node:child_process";
import { once } from "node:events";
import { chmodSync, existsSync, mkdtempSync, readFileSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import postgres from "postgres";
import { afterAll, beforeAll, expect, test } from "vitest";
import { startCluster } from "./cluster.mjs";
import { postgresPrograms } from "./debian.mjs";
import { bornAt } from "./locks.mjs";

type Urls = { DATABASE_URL: string; DATABASE_OWNER_URL: string; DATABASE_ADMIN_URL: string };

const here = postgresPrograms() !== undefined;
const folder = mkdtempSync(join(tmpdir(), "coastdown-cluster-"));
let cluster: Awaited<ReturnType<typeof startCluster>>;
let urls: Urls;

const ask = async (url: string, text: string) => {
  const sql = postgres(url, { max: 1, onnotice: () => {}, connect_timeout: 5 });
  try {
    return [...(await sql.unsafe(text))];
  } finally {
    await sql.end();
  }
};

/** Asks until the server is back; vitest's own limit ends a vain attempt. */
async function askUntilAnswered(url: string, text: string): Promise<unknown[]> {
  for (;;) {
    try {
      return await ask(url, text);
    } catch {
      await new Promise((resolve) => setImmediate(resolve));
    }
  }
}

const serverOf = (at: string) => Number(readFileSync(join(at, "postgres/postmaster.pid"), "utf8").split("\n")[0]);

beforeAll(async () => {
  if (!here) return;
  chmodSync(folder, 0o711);
  cluster = await startCluster(folder);
  urls = (await cluster.database("coastdown")) as Urls;
}, 60_000);

afterAll(async () => {
  await cluster?.stop();
  rmSync(folder, { recursive: true });
});

test.skipIf(!here)("the application's role owns nothing and cannot step around row-level security", async () => {
  const roles = await ask(
    urls.DATABASE_ADMIN_URL,
    `select rolname, rolsuper, rolbypassrls, rolcreatedb, rolcreaterole, rolcanlogin
     from pg_roles where rolname like 'coastdown%' order by 1`,
  );
  const plain = { rolsuper: false, rolbypassrls: false, rolcreatedb: false, rolcreaterole: false, rolcanlogin: true };
  expect(roles).toEqual([
    { ...plain, rolname: "coastdown_app" },
    { ...plain, rolname: "coastdown_gate", rolcanlogin: false },
    { ...plain, rolname: "coastdown_owner", rolcreatedb: true },
  ]);
  await expect(ask(urls.DATABASE_URL, "create table public.mine ()")).rejects.toThrow("permission denied");
});

test.skipIf(!here)("nobody gets in without the password, and only over loopback", async () => {
  const wrong = Object.assign(new URL(urls.DATABASE_ADMIN_URL), { password: "guess" }).href;
  await expect(ask(wrong, "select 1")).rejects.toThrow("password authentication failed");
  const show = await ask(urls.DATABASE_ADMIN_URL, "select current_setting('listen_addresses') as at");
  expect(show).toEqual([{ at: "127.0.0.1" }]);
});

test.skipIf(!here)("asking for the same database again keeps it; asking for a fresh one does not", async () => {
  await ask(urls.DATABASE_OWNER_URL, "create table kept ()");
  await cluster.database("coastdown");
  expect(await ask(urls.DATABASE_OWNER_URL, "select to_regclass('kept')::text as t")).toEqual([{ t: "kept" }]);
  await cluster.database("coastdown", { fresh: true });
  expect(await ask(urls.DATABASE_OWNER_URL, "select to_regclass('kept')::text as t")).toEqual([{ t: null }]);
});

test.skipIf(!here)("a killed server comes back by itself with what was committed", async () => {
  await ask(urls.DATABASE_OWNER_URL, "create table survives as select 1 as n");
  process.kill(serverOf(folder), "SIGKILL");
  expect(await askUntilAnswered(urls.DATABASE_OWNER_URL, "select n from survives")).toEqual([{ n: 1 }]);
});

test.skipIf(!here)("stopped and started again it has the same port, passwords and data", async () => {
  await ask(urls.DATABASE_OWNER_URL, "create table restarted as select 2 as n");
  await cluster.stop();
  cluster = await startCluster(folder);
  expect(await ask(urls.DATABASE_OWNER_URL, "select n from restarted")).toEqual([{ n: 2 }]);
});

test.skipIf(!here || !existsSync("/usr/bin/setpriv"))("a killed launcher takes its server along", async () => {
  const another = mkdtempSync(join(tmpdir(), "coastdown-cluster-"));
  chmodSync(another, 0o711);
  const code = `import { startCluster } from ${JSON.stringify(join(import.meta.dirname, "cluster.mjs"))};
    await startCluster(${JSON.stringify(another)});
    console.log("up");`;
  const launcher = spawn(process.execPath, ["--input-type=module", "-e", code], {
    stdio: ["ignore", "pipe", "inherit"],
  });
  await once(launcher.stdout, "data");
  const server = serverOf(another);
  expect(bornAt(server)).toBeDefined();
  launcher.kill("SIGKILL");
  while (bornAt(server)) await new Promise((resolve) => setImmediate(resolve));
  rmSync(another, { recursive: true });
});
