import postgres from "postgres";
import { afterAll, expect, test } from "vitest";
import { database } from "@/db/client";
import { ownerUrl } from "@/lib/env";
import { doorFindings } from "./catalog";

const owner = postgres(ownerUrl(), { max: 1, onnotice: () => {} });
afterAll(() => owner.end());

test("every tenant table keeps the rules of the one door", async () => {
  const { findings, covered } = await doorFindings(owner);
  expect(findings).toEqual([]);
  expect(covered.tables).toBeGreaterThan(15);
});

test("a table with a forgotten policy, FORCE, key or company is found", async () => {
  const undo = new Error("undo");
  let findings: string[] = [];
  await owner
    .begin(async (sql) => {
      await sql`create table forgotten (id uuid primary key, company_id uuid not null)`;
      await sql`create table pointing (company_id uuid, id uuid, other uuid references forgotten (id), primary key (company_id, id))`;
      await sql`alter table pointing enable row level security`;
      await sql`create policy read on pointing for select to coastdown_app using (true)`;
      findings = (await doorFindings(sql)).findings;
      throw undo;
    })
    .catch((error) => {
      if (error !== undo) throw error;
    });
  expect(findings.sort()).toEqual(
    [
      "forgotten: no policy says who may add",
      "forgotten: no policy says who may read",
      "forgotten: row-level security is not forced",
      "forgotten: row-level security is off",
      "forgotten: the primary key leads with id",
      "pointing: no policy says who may add",
      "pointing: policy read forgets the company",
      "pointing: row-level security is not forced",
      "pointing_other_fkey does not lead with the company",
    ].sort(),
  );
});

test("without an actor every tenant table raises, and none answers with an empty list", async () => {
  const tables = await owner<{ name: string }[]>`select tablename as name from pg_tables where schemaname = 'public'`;
  for (const { name } of tables) {
    const refused = await database()
      .execute(`select * from "${name}"`)
      .then(
        () => `${name} answered`,
        (error) => (error.cause?.code === "CD401" ? "refused" : String(error.cause)),
      );
    expect(`${name}: ${refused}`).toBe(`${name}: refused`);
  }
});
