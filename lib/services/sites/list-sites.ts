import { and, count, eq, ilike, or } from "drizzle-orm";
import { z } from "zod";
import { sites } from "@/db/schema/sites";
import { SITE_KINDS } from "@/lib/domain/sites/words";
import { query } from "@/lib/services/command";
import { containing, offsetOf, PAGE_SIZE, PageInput } from "@/lib/services/paging";

const ListSitesInput = PageInput.extend({ kind: z.enum(SITE_KINDS).nullish().catch(null).default(null) });

export const listSites = query({
  name: "site.list",
  needs: "site:read",
  input: ListSitesInput,
  async run({ tx }, { page, q, kind }) {
    const words = containing(q);
    const where = and(
      q ? or(ilike(sites.name, words), ilike(sites.street, words), ilike(sites.city, words)) : undefined,
      kind ? eq(sites.kind, kind) : undefined,
    );
    const rows = await tx
      .select()
      .from(sites)
      .where(where)
      .orderBy(sites.name, sites.id)
      .limit(PAGE_SIZE)
      .offset(offsetOf(page));
    const [all] = await tx.select({ total: count() }).from(sites).where(where);
    return { rows, total: all?.total ?? 0, page, pageSize: PAGE_SIZE };
  },
});
