import { and, eq, exists, gt, inArray, isNull, lte, or } from "drizzle-orm";
import type { Tx } from "@/db/client";
import { contacts } from "@/db/schema/customers";
import { contactSites, siteHolders } from "@/db/schema/sites";

/** Whom to call about sites: those who speak for them, on behalf of whoever holds them now. */
export async function contactsOfSites(tx: Tx, siteIds: string[], now: Date) {
  if (siteIds.length === 0) return [];
  const { companyId, siteId, customerId, startsAt, endsAt } = siteHolders;
  const named = tx
    .select()
    .from(contactSites)
    .where(
      and(
        eq(contactSites.companyId, companyId),
        eq(contactSites.contactId, contacts.id),
        eq(contactSites.siteId, siteId),
      ),
    );
  return tx
    .selectDistinct({
      siteId,
      id: contacts.id,
      customerId: contacts.customerId,
      since: contacts.createdAt,
      name: contacts.name,
      title: contacts.title,
      phone: contacts.phone,
      email: contacts.email,
    })
    .from(siteHolders)
    .innerJoin(contacts, and(eq(contacts.companyId, companyId), eq(contacts.customerId, customerId)))
    .where(
      and(
        inArray(siteId, siteIds),
        lte(startsAt, now),
        or(isNull(endsAt), gt(endsAt, now)),
        isNull(contacts.endedAt),
        or(contacts.allSites, exists(named)),
      ),
    )
    .orderBy(contacts.name);
}
