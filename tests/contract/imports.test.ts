import { readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { expect, test } from "vitest";
import { edgesOf, importFinding } from "./imports";

const root = join(import.meta.dirname, "../..");
const files = ["app", "components", "db", "emails", "lib"]
  .flatMap((folder) =>
    readdirSync(join(root, folder), { recursive: true, encoding: "utf8" }).map((file) => `${folder}/${file}`),
  )
  .filter((file) => /\.tsx?$/.test(file) && !/\.test\.tsx?$/.test(file))
  .sort();
const sources = new Map(files.map((file) => [file, readFileSync(join(root, file), "utf8")]));
const edges = files.flatMap((file) => edgesOf(file, sources.get(file) ?? ""));
const filesWith = (pattern: RegExp) => files.filter((file) => pattern.test(sources.get(file) ?? ""));

test("imports flow one way", () => {
  console.log(`imports: ${files.length} files, ${edges.length} imports`);
  expect(files.length).toBeGreaterThan(150);
  expect(edges.length).toBeGreaterThan(3 * files.length);
  expect(edges.map(importFinding).filter(Boolean)).toEqual([]);
});

test.each([
  ["app/(office)/page.tsx", `import { sites } from "@/db/schema/sites";`],
  ["app/(office)/page.tsx", `import { eq } from "drizzle-orm/pg-core";`],
  ["components/ui/button.tsx", `import { paths } from "@/lib/domain/shared/paths";`],
  ["components/visits/run-sheet.tsx", `import { planVisit } from "@/lib/services/visits/plan-visit";`],
  ["components/visits/run-sheet.tsx", `import { Card } from "../people/card";`],
  ["lib/domain/visits/rules.ts", `import { readFileSync } from "node:fs";`],
  ["lib/domain/visits/rules.ts", `import moment from "moment-timezone";`],
  ["lib/domain/people/rules.ts", `import { SITE_KINDS } from "../sites/words";`],
  ["lib/domain/shared/ids.ts", `import { SITE_KINDS } from "@/lib/domain/sites/words";`],
  ["lib/services/people/end.ts", `import { siteById } from "@/lib/services/sites/internal";`],
  ["lib/services/paging.ts", `import { siteById } from "@/lib/services/sites/internal";`],
  ["lib/services/people/end.ts", `import { sendMail } from "@/lib/adapters/mail/send-mail";`],
  ["lib/services/people/end.ts", `import { headers } from "next/headers";`],
  ["lib/services/people/end.ts", `import { database } from "@/db/client";`],
  ["lib/services/people/end.ts", `import * as client from "@/db/client";`],
  ["lib/services/people/end.ts", `import { type Tx, database } from "@/db/client";`],
  ["lib/services/people/end.ts", `const { database } = await import("@/db/client");`],
  ["lib/web/route.ts", `import { sites } from "@/db/schema/sites";`],
  ["lib/worker/main.ts", `import { newWorld } from "@/tests/factories/world";`],
  ["emails/letter.tsx", `import { env } from "@/lib/env";`],
])("%s is told off for %s", (file, source) => {
  expect(edgesOf(file, source).map(importFinding)).toEqual([expect.stringContaining(file)]);
});

test.each([
  ["lib/services/sites/get-site.ts", `import type { Tx } from "@/db/client";`],
  ["lib/services/sites/get-site.ts", `import { type Tx, type Database } from "@/db/client";`],
  ["lib/services/visits/plan-visit.ts", `import { siteById } from "@/lib/services/sites/internal";`],
  ["components/visits/run-sheet.tsx", `import { Card } from "@/components/ui/card";`],
])("%s may say %s", (file, source) => {
  expect(edgesOf(file, source)).toHaveLength(1);
  expect(edgesOf(file, source).map(importFinding)).toEqual([undefined]);
});

test("verbs do not call verbs", () => {
  const verbs = new Set(filesWith(/= (command|query)\(\{/).filter((file) => file.startsWith("lib/services/")));
  expect(verbs.size).toBeGreaterThan(40);
  const calls = edges.filter(({ from, to }) => verbs.has(to) && /^lib\/services\/(?!registry)/.test(from));
  expect(calls).toEqual([]);
});

test("every public function is a verb behind its door, or signing in", () => {
  const publicFiles = filesWith(/["']use server["']/);
  expect(publicFiles.length).toBeGreaterThan(4);
  const wrong = publicFiles.flatMap((file) => publicExportFindings(file, sources.get(file) ?? ""));
  expect(wrong).toEqual([]);
});

/** Every export of such a file is an address on the internet: it leads to a verb, or to signing in. */
function publicExportFindings(file: string, source: string): string[] {
  if (!source.startsWith(`"use server";\n`)) return [`${file}: the directive stands first, for a whole file`];
  const signIn = /import \{([^}]+)\} from "@\/lib\/web\/sign-in"/.exec(source)?.[1]?.split(",") ?? [];
  const doors = signIn.map((name) => name.trim()).filter(Boolean);
  const exported = source.match(/^export .*$/gm) ?? [];
  return exported
    .filter((line) => {
      const value = /^export const \w+ = (action\(|\w+;$)/.exec(line)?.[1];
      return value !== "action(" && !doors.includes(value?.slice(0, -1) ?? "");
    })
    .map((line) => `${file}: ${line}`);
}

test("a public file that exports a plain function is found", () => {
  const source = `"use server";\n\nexport const a = action(verb);\nexport async function b() {}\nexport const c = other;\n`;
  expect(publicExportFindings("a.ts", source)).toEqual([
    "a.ts: export async function b() {}",
    "a.ts: export const c = other;",
  ]);
});

test("the environment is read in one file", () => {
  expect(filesWith(/process\s*\.\s*env|process\[|import\.meta\.env/)).toEqual(["lib/env.ts"]);
});

test("the rules of the trade have no clock, no chance and no machine of their own", () => {
  const impure = filesWith(/Date\.now\(|new Date\(\)|Math\.random\(|\bprocess\.|\bmoment\(\)|moment\.tz\([^,)]*\)/);
  expect(impure.filter((file) => file.startsWith("lib/domain/"))).toEqual([]);
});
