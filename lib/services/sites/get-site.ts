import { and, asc, desc, eq } from "drizzle-orm";
import { z } from "zod";
import { customers } from "@/db/schema/customers";
import { jobs } from "@/db/schema/jobs";
import { siteAccess, siteHolders } from "@/db/schema/sites";
import { visits } from "@/db/schema/visits";
import { rowId } from "@/lib/domain/shared/inputs";
import { query } from "@/lib/services/command";
import { siteById } from "./internal";
import { contactsOfSites } from "./site-contacts";

export const getSite = query({
  name: "site.get",
  needs: "site:read",
  input: z.object({ siteId: rowId }),
  async run({ tx, now }, { siteId }) {
    const site = await siteById(tx, siteId);
    const [access] = await tx.select().from(siteAccess).where(eq(siteAccess.siteId, siteId));
    const holders = await tx
      .select({ holder: siteHolders, customer: { id: customers.id, name: customers.name, phone: customers.phone } })
      .from(siteHolders)
      .innerJoin(
        customers,
        and(eq(customers.companyId, siteHolders.companyId), eq(customers.id, siteHolders.customerId)),
      )
      .where(eq(siteHolders.siteId, siteId))
      .orderBy(asc(siteHolders.capacity), desc(siteHolders.fromDate));
    const history = await tx
      .select({ visit: visits, job: { id: jobs.id, number: jobs.number, title: jobs.title, kind: jobs.kind } })
      .from(visits)
      .innerJoin(jobs, and(eq(jobs.companyId, visits.companyId), eq(jobs.id, visits.jobId)))
      .where(eq(visits.siteId, siteId))
      .orderBy(desc(visits.startsAt))
      .limit(20);
    return {
      ...site,
      accessNote: access?.note ?? null,
      holders,
      contacts: await contactsOfSites(tx, [siteId], now),
      visits: history,
    };
  },
});
