import { writeFileSync } from "node:fs";
import { dirname, join } from "node:path";
import autocannon from "autocannon";
import { demoAccounts } from "@/db/demo/accounts";
import { DEMO_PASSWORD } from "@/db/demo/people";
import { FIRST_SCREEN, type Role } from "@/lib/domain/shared/roles";
import { cookiesOf } from "./sign-in";

/** Rounds go around all pages in turn, so that what else the machine does hits them alike. */
const ROUNDS = 5;
const SECONDS_A_ROUND = 3;
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

const rounds: Map<Page, Round>[] = [];
for (let n = 0; n < ROUNDS; n++) {
  const round = new Map<Page, Round>();
  for (const page of PAGES) round.set(page, await measure(page));
  rounds.push(round);
}

const figures = ["perSecond", "p50", "p95"] as const;
type Figure = (typeof figures)[number];

/** Of all rounds the middle one: of what was measured, or of its ratio to the empty page in the same round. */
function middle(page: Page, figure: Figure, over?: Page): number {
  const of = (round: Map<Page, Round>, which: Page) => round.get(which)?.[figure] ?? Number.NaN;
  return quantile(
    rounds.map((round) => of(round, page) / (over ? of(round, over) : 1)),
    0.5,
  );
}

const results = PAGES.map((page) => ({
  page: page.name,
  measured: Object.fromEntries(figures.map((figure) => [figure, middle(page, figure)])) as Round,
  timesEmpty: Object.fromEntries(figures.map((figure) => [figure, middle(page, figure, EMPTY)])) as Round,
}));

console.table(
  Object.fromEntries(
    results.map(({ page, measured, timesEmpty }) => [
      page,
      {
        "requests/s": Math.round(measured.perSecond),
        "p50 ms": Number(measured.p50.toFixed(1)),
        "p95 ms": Number(measured.p95.toFixed(1)),
        "requests/s ÷ empty": Number(timesEmpty.perSecond.toFixed(2)),
        "p50 ÷ empty": Number(timesEmpty.p50.toFixed(2)),
        "p95 ÷ empty": Number(timesEmpty.p95.toFixed(2)),
      },
    ]),
  ),
);
const file = join(dirname(process.env.STATE_FILE ?? ""), "server.json");
writeFileSync(file, `${JSON.stringify(results, null, 2)}\n`);
console.log(`As JSON: ${file}`);
process.exit(0);
