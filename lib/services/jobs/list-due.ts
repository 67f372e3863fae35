import { eq } from "drizzle-orm";
import { z } from "zod";
import { agreementItems } from "@/db/schema/agreements";
import { DUE_STATES } from "@/lib/domain/agreements/due-window";
import { TEST_KIND_WORDS, TEST_KINDS } from "@/lib/domain/agreements/words";
import { rowId } from "@/lib/domain/shared/inputs";
import { query } from "@/lib/services/command";
import { offsetOf, PageInput, sortInput } from "@/lib/services/paging";
import { obstaclesOf } from "./due-facts";
import { type DueItem, dueItems } from "./due-items";

const ListDueInput = PageInput.extend({
  kind: z.enum(TEST_KINDS).nullish().catch(null).default(null),
  when: z.enum(DUE_STATES).nullish().catch(null).default(null),
  state: z.string().max(2).catch("").default(""),
  city: z.string().trim().max(100).catch("").default(""),
  /** The latest date lies within so many days, or has passed. */
  days: z.coerce.number().int().min(1).max(3660).nullish().catch(null).default(null),
  job: z.enum(["made", "none"]).nullish().catch(null).default(null),
  site: rowId.nullish().catch(null).default(null),
  sort: sortInput(["test", "site", "earliest", "target", "latest"]),
});

/** The due list: filtered and sorted as the address says, what stands in the way for the page's rows alone. */
export const listDue = query({
  name: "due.list",
  needs: "agreement:read",
  input: ListDueInput,
  async run({ tx, now }, { page, pageSize, q, kind, when, state, city, days, job, site, sort }) {
    const all = await dueItems(tx, now, site ? eq(agreementItems.siteId, site) : undefined);
    const words = q.toLowerCase();
    const there = all.filter(
      (row) =>
        (kind === null || row.item.testKind === kind) &&
        (state === "" || row.site.state === state) &&
        (city === "" || row.site.city === city) &&
        (days === null || row.daysLeft <= days) &&
        (job === null || (row.job !== null) === (job === "made")) &&
        [row.site.name, row.site.city, row.customer.name].some((text) => text.toLowerCase().includes(words)),
    );
    const found = there.filter((row) => when === null || row.state === when).sort(ordered(sort));
    const rows = found.slice(offsetOf(page, pageSize), offsetOf(page, pageSize) + pageSize);
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
      total: found.length,
      page,
      pageSize,
    };
  },
});

const KEYS: Record<"test" | "site" | "earliest" | "target" | "latest", (row: DueItem) => string> = {
  test: (row) => TEST_KIND_WORDS[row.item.testKind],
  site: (row) => row.site.name,
  earliest: (row) => row.window.earliest,
  target: (row) => row.window.target,
  latest: (row) => row.window.latest,
};

/** The chosen order first, then the latest date, so that pages never overlap. */
function ordered(sort: z.output<typeof ListDueInput>["sort"]) {
  const down = sort?.startsWith("-");
  const chosen = KEYS[(sort?.replace("-", "") ?? "latest") as keyof typeof KEYS];
  return (a: DueItem, b: DueItem): number => {
    const first = compare(chosen(a), chosen(b));
    return (down ? -first : first) || compare(KEYS.latest(a), KEYS.latest(b)) || compare(a.item.id, b.item.id);
  };
}

const compare = (a: string, b: string): number => (a === b ? 0 : a < b ? -1 : 1);
