import { readFileSync } from "node:fs";
import { join } from "node:path";
import { expect, test } from "vitest";
import { EnvSchema } from "@/lib/env";

const root = join(import.meta.dirname, "../..");

test(".env.example names every setting that the program reads, and no other", () => {
  const example = readFileSync(join(root, ".env.example"), "utf8");
  const named = [...example.matchAll(/^([A-Z_]+)=/gm)].map(([, name]) => name);
  const program = readFileSync(join(root, "lib/env.ts"), "utf8");
  const readByName = [...program.matchAll(/process\.env\.([A-Z_]+)/g)].map(([, name]) => name);
  expect(named.sort()).toEqual([...new Set([...Object.keys(EnvSchema.shape), ...readByName])].sort());
});

test("the example's values are accepted, once the secrets are filled in", () => {
  const example = readFileSync(join(root, ".env.example"), "utf8");
  const values = [...example.matchAll(/^([A-Z_]+)="?([^"\n]*)"?$/gm)].map(([, name, value]) => [name, value]);
  const filled = {
    ...Object.fromEntries(values),
    AUTH_SECRET: "x".repeat(32),
    SECRETS_KEY: Buffer.alloc(32).toString("base64"),
  };
  expect(EnvSchema.safeParse(filled).error).toBeUndefined();
});
