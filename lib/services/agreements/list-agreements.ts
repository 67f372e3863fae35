import { and, count, desc, eq, gte, ilike, isNull, lt, or, sql } from "drizzle-orm";
import { z } from "zod";
import { agreementItems, agreements } from "@/db/schema/agreements";
import { companies } from "@/db/schema/company";
import { customers } from "@/db/schema/customers";
import { calendarDate } from "@/lib/domain/shared/zone";
import { notFound } from "@/lib/errors";
import { query } from "@/lib/services/command";
import { containing, offsetOf, orderBy, PageInput, sortInput } from "@/lib/services/paging";

const ListAgreementsInput = PageInput.extend({
  standing: z.enum(["now", "ended"]).nullish().catch(null).default(null),
  sort: sortInput(["number", "name", "customer", "tests", "sites", "first", "last"]),
});

const tests = sql<number>`count(${agreementItems.id})::int`;
const sites = sql<number>`count(distinct ${agreementItems.siteId})::int`;
const SORTS = {
  number: agreements.number,
  name: agreements.name,
  customer: customers.name,
  tests,
  sites,
  first: agreements.startsOn,
  last: agreements.endsOn,
};

export const listAgreements = query({
  name: "agreement.list",
  needs: "agreement:read",
  input: ListAgreementsInput,
  async run({ tx, now }, { page, pageSize, q, standing, sort }) {
    const [company] = await tx.select({ zone: companies.zone }).from(companies);
    if (!company) throw notFound("company");
    const today = calendarDate(now, company.zone);
    const words = containing(q);
    const digits = /^\d{1,9}$/.test(q) ? Number(q) : null;
    const where = and(
      q
        ? or(
            ilike(agreements.name, words),
            ilike(customers.name, words),
            digits === null ? undefined : eq(agreements.number, digits),
          )
        : undefined,
      standing === "now" ? or(isNull(agreements.endsOn), gte(agreements.endsOn, today)) : undefined,
      standing === "ended" ? lt(agreements.endsOn, today) : undefined,
    );
    const withCustomer = and(eq(customers.companyId, agreements.companyId), eq(customers.id, agreements.customerId));
    const rows = await tx
      .select({
        id: agreements.id,
        number: agreements.number,
        name: agreements.name,
        startsOn: agreements.startsOn,
        endsOn: agreements.endsOn,
        customer: { id: customers.id, name: customers.name },
        tests,
        sites,
      })
      .from(agreements)
      .innerJoin(customers, withCustomer)
      .leftJoin(
        agreementItems,
        and(
          eq(agreementItems.companyId, agreements.companyId),
          eq(agreementItems.agreementId, agreements.id),
          isNull(agreementItems.endedAt),
        ),
      )
      .where(where)
      .groupBy(agreements.companyId, agreements.id, customers.companyId, customers.id)
      .orderBy(...orderBy(sort, SORTS, [desc(agreements.number)]))
      .limit(pageSize)
      .offset(offsetOf(page, pageSize));
    const [all] = await tx.select({ total: count() }).from(agreements).innerJoin(customers, withCustomer).where(where);
    return { rows, total: all?.total ?? 0, page, pageSize, today };
  },
});
