import { mkdirSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import autocannon from "autocannon";
import { demoAccounts } from "@/db/demo/accounts";
import { DEMO_PASSWORD } from "@/db/demo/people";
import { FIRST_SCREEN, type Role } from "@/lib/domain/shared/roles";
import { cookiesOf } from "./sign-in";

/** Rounds go around all pages in turn, so that what else the machine does hits them alike. */
const ROUNDS = 3;
const SECONDS_A_ROUND = 4;
const CONNECTIONS = 4;

type Page = { name: string; path: string; role?: Role };
type Round = { perSecond: number; p50: number; p95: number };

const EMPTY: Page = { name: "empty page", path: "/empty" };
const PAGES: Page[] = [
  EMPTY,
  { name: "sign-in", path: "/sign-in" },
  { name: "owner: overview", path: FIRST_SCREEN.owner, role: "owner" },
  { name: "dispatcher: run sheet", path: FIRST_SCREEN.dispatcher, role: "dispatcher" },
  { name: "bookkeeper: customers", path: FIRST_SCREEN.bookkeeper, role: "bookkeeper" },
  { name: "technician: shell", path: FIRST_SCREEN.technician, role: "technician" },
  { name: "technician: day", path: "/api/field/day", role: "technician" },
  { name: "customer: buildings", path: FIRST_SCREEN.customer, role: "customer" },
];

const address = process.env.APP_URL ?? "";
const cookies = new Map<Role, string>();
for (const { role, email } of demoAccounts()) cookies.set(role, await cookiesOf(address, email, DEMO_PASSWORD));

const quantile = (numbers: number[], share: number) =>
  numbers.toSorted((a, b) => a - b)[Math.min(numbers.length - 1, Math.floor(numbers.length * share))] ?? 0;

/** The tool's own percentiles leave the 95th out. */
const load = (options: autocannon.Options) =>
  new Promise<{ result: autocannon.Result; times: number[] }>((resolve, reject) => {
    const times: number[] = [];
    const run = autocannon(options, (error, result) => (error ? reject(error) : resolve({ result, times })));
    run.on("response", (_client, _status, _bytes, milliseconds) => times.push(milliseconds));
  });

async function measure({ name, path, role }: Page): Promise<Round> {
  const headers = role ? { cookie: cookies.get(role) ?? "" } : undefined;
  const url = `${address}${path}`;
  const first = await fetch(url, { headers, redirect: "manual" });
  if (first.status !== 200) throw new Error(`${name} answers ${first.status}`);
  const { result, times } = await load({ url, headers, connections: CONNECTIONS, duration: SECONDS_A_ROUND });
  if (result.non2xx > 0 || result.errors > 0) throw new Error(`${name}: ${result.non2xx + result.errors} refusals`);
  return { perSecond: result.requests.average, p50: quantile(times, 0.5), p95: quantile(times, 0.95) };
}

const rounds = new Map<Page, Round[]>(PAGES.map((page) => [page, []]));
for (let round = 0; round < ROUNDS; round++) {
  for (const page of PAGES) rounds.get(page)?.push(await measure(page));
}

const middleOf = (page: Page, figure: keyof Round) =>
  quantile(
    (rounds.get(page) ?? []).map((round) => round[figure]),
    0.5,
  );
const rows = PAGES.map((page) => {
  const row = { perSecond: middleOf(page, "perSecond"), p50: middleOf(page, "p50"), p95: middleOf(page, "p95") };
  return { page: page.name, ...row, timesEmpty: middleOf(EMPTY, "perSecond") / row.perSecond };
});

console.table(
  rows.map((row) => ({
    page: row.page,
    "requests/s": Math.round(row.perSecond),
    "p50 ms": Number(row.p50.toFixed(1)),
    "p95 ms": Number(row.p95.toFixed(1)),
    "times the empty page": row.timesEmpty.toFixed(2),
  })),
);
const folder = join(import.meta.dirname, "../../bench-results");
mkdirSync(folder, { recursive: true });
writeFileSync(join(folder, "server.json"), `${JSON.stringify(rows, null, 2)}\n`);
console.log(`As JSON: ${join(folder, "server.json")}`);
process.exit(0);
