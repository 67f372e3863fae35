import { and, asc, count, eq, ilike, or, sql } from "drizzle-orm";
import { customers } from "@/db/schema/customers";
import { siteHolders } from "@/db/schema/sites";
import { query } from "@/lib/services/command";
import { containing, offsetOf, orderBy, PageInput, sortInput } from "@/lib/services/paging";

const siteCount = sql<number>`count(distinct ${siteHolders.siteId})::int`;
const SORTS = { name: customers.name, city: customers.billingCity, sites: siteCount };

export const listCustomers = query({
  name: "customer.list",
  needs: "customer:read",
  input: PageInput.extend({ sort: sortInput(["name", "city", "sites"]) }),
  async run({ tx }, { page, pageSize, q, sort }) {
    const where = q ? or(ilike(customers.name, containing(q)), ilike(customers.billingCity, containing(q))) : undefined;
    const rows = await tx
      .select({
        id: customers.id,
        name: customers.name,
        phone: customers.phone,
        billingCity: customers.billingCity,
        billingState: customers.billingState,
        sites: siteCount,
      })
      .from(customers)
      .leftJoin(
        siteHolders,
        and(eq(siteHolders.companyId, customers.companyId), eq(siteHolders.customerId, customers.id)),
      )
      .where(where)
      .groupBy(customers.companyId, customers.id)
      .orderBy(...orderBy(sort, SORTS, [asc(customers.name), asc(customers.id)]))
      .limit(pageSize)
      .offset(offsetOf(page, pageSize));
    const [all] = await tx.select({ total: count() }).from(customers).where(where);
    return { rows, total: all?.total ?? 0, page, pageSize };
  },
});
