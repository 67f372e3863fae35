import postgres from "postgres";
import { afterAll, expect, test } from "vitest";
import { database } from "@/db/client";
import { ownerUrl } from "@/lib/env";
import { doorFindings } from "./catalog";

const owner = postgres(ownerUrl(), { max: 1, onnotice: () => {} });
afterAll(() => owner.end());

/** What the checker says about statements of the owner, which are then undone. */
async function findingsAfter(...statements: string[]): Promise<string[]> {
  const undo = new Error("undo");
  let findings: string[] = [];
  const attempt = owner.begin(async (sql) => {
    for (const statement of statements) await sql.unsafe(statement);
    findings = (await doorFindings(sql)).findings;
    throw undo;
  });
  await attempt.catch((error) => {
    if (error !== undo) throw error;
  });
  return findings.sort();
}

test("every tenant table keeps the rules of the one door", async () => {
  const { findings, covered } = await doorFindings(owner);
  const { tables, policies, foreignKeys, functions } = covered;
  console.log(
    `catalog: ${tables} tables, ${policies} policies, ${foreignKeys} foreign keys, ${functions} definer functions`,
  );
  expect(findings).toEqual([]);
  expect(tables).toBeGreaterThanOrEqual(20);
  expect(policies).toBeGreaterThan(2 * tables);
  expect(foreignKeys).toBeGreaterThan(20);
  expect(functions).toBeGreaterThan(10);
});

test("a table with a forgotten policy, FORCE or key is found", async () => {
  const found = await findingsAfter(
    "create table forgotten (id uuid primary key, company_id uuid not null)",
    "create table pointing (company_id uuid, id uuid, other uuid references forgotten (id), primary key (company_id, id))",
    "alter table pointing enable row level security",
    "create policy read on pointing for select to coastdown_app using (true)",
  );
  expect(found).toEqual([
    "forgotten: no policy says who may add",
    "forgotten: no policy says who may read",
    "forgotten: row-level security is not forced",
    "forgotten: row-level security is off",
    "forgotten: the primary key leads with id",
    "pointing: no policy says who may add",
    "pointing: policy read forgets the company",
    "pointing: row-level security is not forced",
    "pointing_other_fkey does not lead with the company",
  ]);
});

test("one forgotten policy on a table of ours is found", async () => {
  expect(await findingsAfter("drop policy read on sites")).toEqual(["sites: no policy says who may read"]);
});

test("a policy that lets the company be one way in among others is found", async () => {
  const found = await findingsAfter(
    "create policy wide on sites for select to coastdown_app using (company_id = (select app.company_id()) or app.is_owner())",
    "create policy half on jobs for update to coastdown_app using (company_id = (select app.company_id()) and true) with check (true)",
  );
  expect(found).toEqual(["jobs: policy half forgets the company", "sites: policy wide forgets the company"]);
});

test("a view, an ownership, a right to change the trail and a definer function outside the gate are found", async () => {
  const found = await findingsAfter(
    "create view all_sites as select * from sites",
    "grant update on audit_entries to coastdown_app",
    "create function app.shortcut() returns bigint language sql security definer as 'select count(*) from public.sites'",
    "grant truncate on jobs to coastdown_app",
  );
  expect(found).toEqual([
    "all_sites is a view with its owner's rights",
    "app.shortcut() acts as coastdown_owner, not as the gate",
    "app.shortcut() has no fixed search_path",
    "jobs: the application may empty it, refer to it or put triggers on it",
    "the audit trail may be changed: UPDATE",
  ]);
});

test("without an actor every tenant table raises, and none answers with an empty list", async () => {
  const tables = await owner<{ name: string }[]>`select tablename as name from pg_tables where schemaname = 'public'`;
  const ask = (name: string) =>
    database().transaction(async (tx) => {
      // Read from end to end, a table without rows has nobody to ask its policy of; by its key every table is asked.
      await tx.execute("set local enable_seqscan = off");
      return tx.execute(`select * from "${name}"`);
    });
  const answers = await Promise.all(
    tables.map(({ name }) =>
      ask(name).then(
        () => `${name} answered`,
        (error) => (error.cause?.code === "CD401" ? "raised" : `${name}: ${error.cause}`),
      ),
    ),
  );
  expect(new Set(answers)).toEqual(new Set(["raised"]));
});

test("whichever part of a policy PostgreSQL asks first: without an actor it raises", async () => {
  const parts = ["company_id", "role", "is_owner", "is_office", "is_technician", "is_worker", "is_operator", "is_link"];
  for (const part of parts) {
    const asked = database().execute(`select app.${part}()`);
    await expect(asked, part).rejects.toMatchObject({ cause: { code: "CD401" } });
  }
});
