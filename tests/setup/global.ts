import { randomBytes } from "node:crypto";
import { join } from "node:path";
import postgres from "postgres";
import type { TestProject } from "vitest/node";
import { migrateDatabase } from "../../db/migrations";

declare module "vitest" {
  interface ProvidedContext {
    databases: string[];
  }
}

const WORKERS = 2;

/** One migrated template, copied for each worker, so that test files share nothing. */
export default async function setup(project: TestProject) {
  const { DATABASE_URL, DATABASE_OWNER_URL } = process.env;
  if (!DATABASE_URL || !DATABASE_OWNER_URL) {
    throw new Error("The tests need DATABASE_URL and DATABASE_OWNER_URL: run `npm test`, which brings a database.");
  }
  const run = `test_${randomBytes(4).toString("hex")}`;
  const named = (url: string, name: string) => Object.assign(new URL(url), { pathname: `/${name}` }).toString();
  const owner = postgres(DATABASE_OWNER_URL, { max: 1, onnotice: () => {} });
  const template = `${run}_template`;
  await owner.unsafe(`create database ${template}`);
  await migrateDatabase(named(DATABASE_OWNER_URL, template), join(import.meta.dirname, "../../db/migrations"));
  const names = Array.from({ length: WORKERS }, (_, i) => `${run}_${i + 1}`);
  for (const name of names) await owner.unsafe(`create database ${name} template ${template}`);
  project.provide("databases", names);
  return async () => {
    for (const name of [...names, template]) await owner.unsafe(`drop database if exists ${name}`);
    await owner.end();
  };
}
