import { and, eq, isNull } from "drizzle-orm";
import { z } from "zod";
import { contacts, customerNotes, customers } from "@/db/schema/customers";
import { members } from "@/db/schema/people";
import { siteHolders, sites } from "@/db/schema/sites";
import { rowId } from "@/lib/domain/shared/inputs";
import { notFound } from "@/lib/errors";
import { query } from "@/lib/services/command";

export const getCustomer = query({
  name: "customer.get",
  needs: "customer:read",
  input: z.object({ customerId: rowId }),
  async run({ tx }, { customerId }) {
    const [customer] = await tx.select().from(customers).where(eq(customers.id, customerId));
    if (!customer) throw notFound("customer");
    const [note] = await tx.select().from(customerNotes).where(eq(customerNotes.customerId, customerId));
    const people = await tx
      .select({ contact: contacts, memberId: members.id })
      .from(contacts)
      .leftJoin(
        members,
        and(eq(members.companyId, contacts.companyId), eq(members.contactId, contacts.id), isNull(members.endedAt)),
      )
      .where(eq(contacts.customerId, customerId))
      .orderBy(contacts.name);
    const held = await tx
      .select({ holder: siteHolders, site: { id: sites.id, name: sites.name, street: sites.street, city: sites.city } })
      .from(siteHolders)
      .innerJoin(sites, and(eq(sites.companyId, siteHolders.companyId), eq(sites.id, siteHolders.siteId)))
      .where(eq(siteHolders.customerId, customerId))
      .orderBy(sites.name);
    return { ...customer, note: note?.note ?? null, contacts: people, holdings: held };
  },
});
