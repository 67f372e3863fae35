import { and, count, eq, ilike, or, sql } from "drizzle-orm";
import { customers } from "@/db/schema/customers";
import { siteHolders } from "@/db/schema/sites";
import { query } from "@/lib/services/command";
import { containing, offsetOf, PAGE_SIZE, PageInput } from "@/lib/services/paging";

export const listCustomers = query({
  name: "customer.list",
  needs: "customer:read",
  input: PageInput,
  async run({ tx }, { page, q }) {
    const where = q ? or(ilike(customers.name, containing(q)), ilike(customers.billingCity, containing(q))) : undefined;
    const rows = await tx
      .select({
        id: customers.id,
        name: customers.name,
        phone: customers.phone,
        billingCity: customers.billingCity,
        billingState: customers.billingState,
        sites: sql<number>`count(distinct ${siteHolders.siteId})::int`,
      })
      .from(customers)
      .leftJoin(
        siteHolders,
        and(eq(siteHolders.companyId, customers.companyId), eq(siteHolders.customerId, customers.id)),
      )
      .where(where)
      .groupBy(customers.companyId, customers.id)
      .orderBy(customers.name)
      .limit(PAGE_SIZE)
      .offset(offsetOf(page));
    const [all] = await tx.select({ total: count() }).from(customers).where(where);
    return { rows, total: all?.total ?? 0, page, pageSize: PAGE_SIZE };
  },
});
