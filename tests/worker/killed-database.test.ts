import { chmodSync, mkdtempSync, readFileSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import postgres from "postgres";
import { afterAll, beforeAll, expect, test } from "vitest";
import { migrateDatabase } from "@/db/migrations";
import { startCluster } from "../../docker/local/cluster.mjs";
import { postgresPrograms } from "../../docker/local/debian.mjs";
import { start } from "./program";

type Urls = { DATABASE_URL: string; DATABASE_OWNER_URL: string; DATABASE_ADMIN_URL: string };

const here = postgresPrograms() !== undefined;
if (!here) console.log("skipped: no PostgreSQL programs on this machine to make a server of our own");
const folder = mkdtempSync(join(tmpdir(), "coastdown-killed-"));
let cluster: Awaited<ReturnType<typeof startCluster>>;
let urls: Urls;

beforeAll(async () => {
  if (!here) return;
  chmodSync(folder, 0o711);
  cluster = await startCluster(folder);
  urls = (await cluster.database("coastdown")) as Urls;
  await migrateDatabase(urls.DATABASE_OWNER_URL, join(import.meta.dirname, "../../db/migrations"));
}, 60_000);

afterAll(async () => {
  await cluster?.stop();
  rmSync(folder, { recursive: true });
});

const killServer = () =>
  process.kill(Number(readFileSync(join(folder, "postgres/postmaster.pid"), "utf8").split("\n")[0]), "SIGKILL");

/** Who has each part of what hiring writes: the person, the letter, its delivery, the audit entry. */
async function whoHasWhat(companyId: string): Promise<Map<string, number[]>> {
  const sql = postgres(urls.DATABASE_ADMIN_URL, { max: 1 });
  const rows = await sql<{ email: string; parts: number[] }[]>`
    select d.email, array[
      (select count(*) from members m where m.id = d.member_id),
      (select count(*) from messages t where t.to_address = d.email),
      (select count(*) from outbox o join messages t on o.payload->>'messageId' = t.id::text where t.to_address = d.email),
      (select count(*) from audit_entries a where a.entity_id = d.member_id and a.command = 'person.invite')
    ]::int[] as parts from member_details d where d.company_id = ${companyId}`;
  const [loose] = await sql<{ total: number }[]>`
    select count(*)::int as total from audit_entries a
     where a.company_id = ${companyId} and a.command = 'person.invite'
       and not exists (select from members m where m.id = a.entity_id)`;
  await sql.end();
  expect(loose?.total).toBe(0);
  return new Map(rows.map(({ email, parts }) => [email, parts]));
}

test.skipIf(!here)(
  "a database killed during writes keeps what was confirmed, whole, and nothing by half",
  async () => {
    const writer = start("tests/worker/writer.ts", urls);
    const hired: string[] = [];
    let refused = 0;
    let companyId = "";
    for await (const line of writer.lines) {
      const said = JSON.parse(line) as { company?: string; hired?: string; refused?: string };
      if (said.company) companyId = said.company;
      if (said.refused) refused++;
      if (said.hired) hired.push(said.hired);
      if (hired.length === 40 && refused === 0 && said.hired) killServer();
    }
    await writer.exited;
    const kept = await whoHasWhat(companyId);
    console.log(
      `${hired.length} confirmed, ${refused} refused, ${kept.size - 1 - hired.length} kept without an answer`,
    );
    expect(refused).toBeGreaterThan(0);
    expect(hired.length).toBeGreaterThanOrEqual(100);
    expect(hired.filter((email) => kept.get(email)?.join() !== "1,1,1,1")).toEqual([]);
    // The owner came with the company, by another verb.
    const halves = [...kept].filter(([email, parts]) => parts.join() !== "1,1,1,1" && hired.includes(email));
    expect(halves).toEqual([]);
    const unanswered = [...kept].filter(([email]) => !hired.includes(email));
    expect(unanswered.filter(([, parts]) => parts.join() !== "1,1,1,1")).toHaveLength(1);
  },
  120_000,
);
