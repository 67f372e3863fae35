import { readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { expect, test } from "vitest";
import { COMMANDS, QUERIES } from "@/lib/services/registry";

const services = join(import.meta.dirname, "../../lib/services");

test("every file that defines a verb is in the registry, and no name is there twice", () => {
  const defined = readdirSync(services, { recursive: true, encoding: "utf8" })
    .filter((file) => file.endsWith(".ts") && !file.endsWith(".test.ts"))
    .flatMap((file) => [...readFileSync(join(services, file), "utf8").matchAll(/^ {2}name: "([^"]+)",\n {2}needs:/gm)])
    .map((match) => match[1]);
  const listed = [...COMMANDS, ...QUERIES].map((verb) => verb.verbName);
  expect([...listed].sort()).toEqual([...defined].sort());
  expect(new Set(listed).size).toBe(listed.length);
});
