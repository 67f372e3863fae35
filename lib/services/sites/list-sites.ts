import { and, asc, count, eq, ilike, or } from "drizzle-orm";
import { z } from "zod";
import { sites } from "@/db/schema/sites";
import { SITE_KINDS } from "@/lib/domain/sites/words";
import { query } from "@/lib/services/command";
import { containing, offsetOf, orderBy, PageInput, sortInput } from "@/lib/services/paging";

const SORTS = { name: sites.name, kind: sites.kind, city: sites.city };

const ListSitesInput = PageInput.extend({
  kind: z.enum(SITE_KINDS).nullish().catch(null).default(null),
  sort: sortInput(["name", "kind", "city"]),
});

export const listSites = query({
  name: "site.list",
  needs: "site:read",
  input: ListSitesInput,
  async run({ tx }, { page, pageSize, q, kind, sort }) {
    const words = containing(q);
    const where = and(
      q ? or(ilike(sites.name, words), ilike(sites.street, words), ilike(sites.city, words)) : undefined,
      kind ? eq(sites.kind, kind) : undefined,
    );
    const rows = await tx
      .select()
      .from(sites)
      .where(where)
      .orderBy(...orderBy(sort, SORTS, [asc(sites.name), asc(sites.id)]))
      .limit(pageSize)
      .offset(offsetOf(page, pageSize));
    const [all] = await tx.select({ total: count() }).from(sites).where(where);
    return { rows, total: all?.total ?? 0, page, pageSize };
  },
});
