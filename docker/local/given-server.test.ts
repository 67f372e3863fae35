import { randomUUID } from "node:crypto";
import postgres from "postgres";
import { expect, test } from "vitest";
import { givenServer } from "./given-server.mjs";
import { freePort } from "./ports.mjs";

const { DATABASE_URL = "", DATABASE_OWNER_URL = "" } = process.env;
const changed = (url: string, change: Partial<URL>) => Object.assign(new URL(url), change).href;
const given = { DATABASE_URL, DATABASE_OWNER_URL };

test("a given server is used as it is, and asked for a fresh database where one is needed", async () => {
  const server = await givenServer(given);
  expect(await server.database("ignored")).toEqual(given);
  const name = `given_${randomUUID().slice(0, 8)}`;
  const fresh = (await server.database(name, { fresh: true })) as typeof given;
  const client = postgres(fresh.DATABASE_URL, { max: 1 });
  expect([...(await client`select current_database() as name`)]).toEqual([{ name }]);
  await client.end();
  const owner = postgres(DATABASE_OWNER_URL, { max: 1 });
  await owner`drop database ${owner(name)} with (force)`;
  await owner.end();
});

test("an address that leads nowhere is named, without its password", async () => {
  const nowhere = changed(DATABASE_OWNER_URL, { port: String(await freePort()), password: "hidden-word" });
  const refusal = givenServer({ DATABASE_URL, DATABASE_OWNER_URL: nowhere });
  await expect(refusal).rejects.toThrow(/^DATABASE_OWNER_URL does not lead into a database: .*ECONNREFUSED/);
  await expect(refusal).rejects.not.toThrow("hidden-word");
});

test("a database that is missing is named", async () => {
  const missing = changed(DATABASE_URL, { pathname: "nowhere_to_be_found" });
  await expect(givenServer({ DATABASE_URL: missing, DATABASE_OWNER_URL })).rejects.toThrow(
    'DATABASE_URL does not lead into a database: database "nowhere_to_be_found" does not exist',
  );
});
