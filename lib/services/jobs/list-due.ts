import { eq } from "drizzle-orm";
import { z } from "zod";
import { agreementItems } from "@/db/schema/agreements";
import { DUE_STATES } from "@/lib/domain/agreements/due-window";
import { TEST_KINDS } from "@/lib/domain/agreements/words";
import { rowId } from "@/lib/domain/shared/inputs";
import { query } from "@/lib/services/command";
import { offsetOf, PAGE_SIZE, PageInput } from "@/lib/services/paging";
import { obstaclesOf } from "./due-facts";
import { type DueItem, dueItems } from "./due-items";

const ListDueInput = PageInput.extend({
  kind: z.enum(TEST_KINDS).nullish().catch(null).default(null),
  when: z.enum(DUE_STATES).nullish().catch(null).default(null),
  state: z.string().max(2).catch("").default(""),
  city: z.string().trim().max(100).catch("").default(""),
  job: z.enum(["made", "none"]).nullish().catch(null).default(null),
  site: rowId.nullish().catch(null).default(null),
  sort: z.enum(["latest", "target", "earliest", "site"]).catch("latest").default("latest"),
});

/** The due list: filtered and sorted as the address says, what stands in the way for the page's rows alone. */
export const listDue = query({
  name: "due.list",
  needs: "agreement:read",
  input: ListDueInput,
  async run({ tx, now }, { page, q, kind, when, state, city, job, site, sort }) {
    const all = await dueItems(tx, now, site ? eq(agreementItems.siteId, site) : undefined);
    const words = q.toLowerCase();
    const there = all.filter(
      (row) =>
        (kind === null || row.item.testKind === kind) &&
        (state === "" || row.site.state === state) &&
        (city === "" || row.site.city === city) &&
        (job === null || (row.job !== null) === (job === "made")) &&
        [row.site.name, row.site.city, row.customer.name].some((text) => text.toLowerCase().includes(words)),
    );
    const found = there.filter((row) => when === null || row.state === when).sort(ORDER[sort]);
    const rows = found.slice(offsetOf(page), offsetOf(page) + PAGE_SIZE);
    const obstacles = await obstaclesOf(tx, rows, now);
    return {
      rows: rows.map(({ reckoning, ...row }) => ({
        ...row,
        reckoning: reckoning(),
        obstacles: obstacles.get(row.item.id) ?? [],
      })),
      counts: Object.fromEntries(
        DUE_STATES.map((name) => [name, there.filter((row) => row.state === name).length]),
      ) as Record<(typeof DUE_STATES)[number], number>,
      /** What can be chosen from. */
      states: [...new Set(all.map((row) => row.site.state))].sort(),
      cities: [...new Set(all.map((row) => row.site.city))].sort(),
      anything: all.length > 0,
      total: found.length,
      page,
      pageSize: PAGE_SIZE,
    };
  },
});

const by =
  (...keys: ((row: DueItem) => string)[]) =>
  (a: DueItem, b: DueItem): number => {
    for (const key of keys) {
      const [left, right] = [key(a), key(b)];
      if (left !== right) return left < right ? -1 : 1;
    }
    return 0;
  };

const id = (row: DueItem) => row.item.id;
const latest = (row: DueItem) => row.window.latest;
const ORDER = {
  latest: by(latest, id),
  target: by((row) => row.window.target, latest, id),
  earliest: by((row) => row.window.earliest, latest, id),
  site: by((row) => row.site.name, latest, id),
};
