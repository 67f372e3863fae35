import { join, normalize } from "node:path";

/** `values` tells an import that is there at run time from one of types alone. */
export type Edge = { from: string; to: string; values: boolean };
type Rule = { folder: string; own: string[]; packages?: string[]; never?: string[] };

/** From upstream to downstream; inside a layer an area imports only from the left. */
const AREAS = (
  "company people customers sites systems sequences imports circuits agreements windows jobs offnormal deficiencies visits " +
  "planning field proposals invoices payments records messages audit find"
).split(" ");

const SERVER_ONLY = ["drizzle-orm", "postgres", "nodemailer", "pino", "@node-rs/argon2", "node:"];

/**
 * Who may import whom. `own` lists our folders and files by their beginning (a folder's own is always allowed);
 * `packages` is all that a layer may take from outside, `never` what it may not. The first rule that fits counts.
 */
const RULES: Rule[] = [
  { folder: "lib/domain/shared/zone.ts", own: [], packages: ["moment-timezone"] },
  { folder: "lib/domain/imports", own: ["lib/domain"], packages: ["zod", "papaparse"] },
  { folder: "lib/domain", own: [], packages: ["zod"] },
  { folder: "db/demo", own: ["db", "lib/services", "lib/domain", "lib/auth"] },
  { folder: "db/schema", own: ["lib/domain"], packages: ["drizzle-orm", "uuid"] },
  {
    folder: "db",
    own: ["lib/env.ts", "lib/log.ts", "lib/errors.ts", "lib/auth/actor.ts", "lib/domain"],
    never: ["next", "react"],
  },
  {
    folder: "lib/auth",
    own: ["db", "lib/env.ts", "lib/log.ts", "lib/errors.ts", "lib/domain/shared"],
    never: ["react"],
  },
  { folder: "lib/services/demo-accounts.ts", own: ["db/demo/accounts.ts", "lib/env.ts"], packages: [] },
  {
    folder: "lib/services",
    own: ["lib/domain", "db", "lib/auth/actor.ts", "lib/auth/password.ts", "lib/auth/secrets.ts", "lib/errors.ts"],
    packages: ["drizzle-orm", "zod", "uuid", "node:crypto"],
  },
  {
    folder: "lib/worker",
    own: ["lib/services", "lib/adapters", "lib/domain", "db", "emails", "lib/env.ts", "lib/log.ts", "lib/errors.ts"],
    never: ["next", "react"],
  },
  { folder: "lib/adapters", own: ["lib/env.ts", "lib/log.ts"] },
  {
    folder: "lib/web",
    own: ["lib/auth", "lib/errors.ts", "lib/services/command.ts", "lib/domain", "lib/log.ts", "lib/env.ts"],
    never: ["drizzle-orm", "postgres", "nodemailer"],
  },
  { folder: "lib/queries", own: ["lib/domain"], never: SERVER_ONLY },
  { folder: "lib/offline", own: ["lib/domain"], never: SERVER_ONLY },
  { folder: "lib/env.ts", own: [], packages: ["zod"] },
  { folder: "lib/log.ts", own: ["lib/env.ts"], packages: ["pino"] },
  { folder: "lib/errors.ts", own: [], packages: [] },
  { folder: "components/ui", own: [], never: SERVER_ONLY },
  {
    folder: "components",
    own: [
      "components/ui",
      "components/form",
      "components/layout",
      "components/data-table",
      "lib/domain",
      "lib/queries",
      "lib/offline",
    ],
    never: SERVER_ONLY,
  },
  { folder: "app/api/auth", own: ["lib/auth/auth.ts"], packages: [] },
  {
    folder: "app",
    own: ["components", "lib/services", "lib/web", "lib/queries", "lib/offline", "lib/domain"],
    never: SERVER_ONLY,
  },
  { folder: "emails", own: ["lib/domain"], packages: ["react-email", "react"] },
];

/** Only the door, sign-in and the worker hold the connection itself; others ask for types, or for its health. */
const HOLDERS_OF_THE_CONNECTION = ["db/door.ts", "lib/auth/", "lib/worker/", "lib/services/health.ts"];

const inside = (path: string, folder: string) => path === folder || path.startsWith(`${folder}/`);
const isOwn = (path: string) => /^(app|components|db|emails|lib|tests|docker)\//.test(path);
const packageFits = (name: string, wanted: string) =>
  name === wanted || name.startsWith(wanted.endsWith(":") ? wanted : `${wanted}/`);

/** Every import of a file: ours as a path from the root, packages by name. */
export function edgesOf(from: string, source: string): Edge[] {
  const clauses = source.matchAll(/\b(?:import|export)\s+(?:([^"';]*?)\s*from\s*)?["']([^"'\n]+)["']/g);
  const calls = source.matchAll(/\bimport\(\s*["']([^"'\n]+)["']/g);
  return [
    ...[...clauses].map(([, names = "", name = ""]) => ({ from, to: target(from, name), values: takesValues(names) })),
    ...[...calls].map(([, name = ""]) => ({ from, to: target(from, name), values: true })),
  ];
}

function target(from: string, name: string): string {
  if (!name.startsWith("@/") && !name.startsWith(".")) return name;
  const path = name.startsWith("@/") ? name.slice(2) : normalize(join(from, "..", name));
  return /\.\w+$/.test(path) ? path : `${path}.ts`;
}

const takesValues = (names: string): boolean =>
  !/^type\s/.test(names) && (!names.startsWith("{") || /[{,]\s*(?!type\s)\w/.test(names));

export function importFinding(edge: Edge): string | undefined {
  const { from, to } = edge;
  const say = (reason: string) => `${from} imports ${to}: ${reason}`;
  if (/^(tests|docker)\//.test(to)) return say("nobody imports tests or the launcher");
  if (to === "db/client.ts" && edge.values && !HOLDERS_OF_THE_CONNECTION.some((holder) => from.startsWith(holder)))
    return say("enter through db/door.ts");
  const rule = RULES.find(({ folder }) => inside(from, folder));
  if (!rule) return undefined;
  if (!isOwn(to)) return packageAllowed(to, rule) ? undefined : say(`not a package of ${rule.folder}`);
  if (![homeOf(from, rule), ...rule.own].some((folder) => inside(to, folder))) return say(`${rule.folder} may not`);
  return upstream(from, to) ? undefined : say("its area is not upstream");
}

/** `components/visits` is home to its own files, not to those of `components/people`. */
const homeOf = (from: string, { folder }: Rule) =>
  folder === "components" ? from.split("/").slice(0, 2).join("/") : folder;

const packageAllowed = (name: string, { packages, never = [] }: Rule): boolean =>
  (packages ? packages.some((wanted) => packageFits(name, wanted)) : true) &&
  !never.some((barred) => packageFits(name, barred));

/** Files that stand beside the areas, and `shared`, are for all of them; the registry lists every area. */
function upstream(from: string, to: string): boolean {
  const area = (path: string) => /^lib\/(?:domain|services)\/([\w-]+)\//.exec(path)?.[1] ?? "shared";
  if (from.split("/")[1] !== to.split("/")[1] || area(to) === "shared") return true;
  if (area(from) === "shared") return from === "lib/services/registry.ts";
  return AREAS.includes(area(to)) && AREAS.indexOf(area(to)) <= AREAS.indexOf(area(from));
}
