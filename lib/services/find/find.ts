import { and, asc, desc, eq, gte, ilike, inArray, isNull, lt, ne, or, sql } from "drizzle-orm";
import { z } from "zod";
import type { Tx } from "@/db/client";
import { contacts, customers } from "@/db/schema/customers";
import { jobs } from "@/db/schema/jobs";
import { members } from "@/db/schema/people";
import { sites } from "@/db/schema/sites";
import { visits } from "@/db/schema/visits";
import { query } from "@/lib/services/command";
import { containing } from "@/lib/services/paging";
import { contactsOfSites } from "@/lib/services/sites/site-contacts";

const MOST = 8;

/** One search over what the actor may see; the door decides which rows that is. */
export const find = query({
  name: "find.all",
  needs: "find:read",
  input: z.object({ q: z.string().trim().max(100) }),
  async run({ tx, now }, { q }) {
    if (q.length < 2) return { sites: [], customers: [], contacts: [], jobs: [], people: [] };
    const words = containing(q);
    const digits = q.replace(/\D/g, "");
    return {
      sites: await foundSites(tx, words, now),
      customers: await tx
        .select({ id: customers.id, name: customers.name, phone: customers.phone })
        .from(customers)
        .where(ilike(customers.name, words))
        .orderBy(customers.name)
        .limit(MOST),
      contacts: await tx
        .select({ id: contacts.id, name: contacts.name, phone: contacts.phone, customerId: contacts.customerId })
        .from(contacts)
        .where(
          and(
            isNull(contacts.endedAt),
            or(
              ilike(contacts.name, words),
              ilike(contacts.email, words),
              // A caller's number is typed in any form.
              digits.length >= 4
                ? sql`regexp_replace(${contacts.phone}, '\\D', '', 'g') like ${`%${digits}%`}`
                : undefined,
            ),
          ),
        )
        .orderBy(contacts.name)
        .limit(MOST),
      jobs: await tx
        .select({ id: jobs.id, number: jobs.number, title: jobs.title, siteId: jobs.siteId })
        .from(jobs)
        .where(or(ilike(jobs.title, words), digits ? eq(sql`${jobs.number}::text`, digits) : undefined))
        .orderBy(desc(jobs.number))
        .limit(MOST),
      people: await tx
        .select({ id: members.id, name: members.name, role: members.role })
        .from(members)
        .where(and(ilike(members.name, words), ne(members.role, "customer"), isNull(members.endedAt)))
        .orderBy(members.name)
        .limit(MOST),
    };
  },
});

async function foundSites(tx: Tx, words: string, now: Date) {
  const found = await tx
    .select({ id: sites.id, name: sites.name, street: sites.street, city: sites.city, state: sites.state })
    .from(sites)
    .where(or(ilike(sites.name, words), ilike(sites.street, words), ilike(sites.city, words)))
    .orderBy(sites.name)
    .limit(MOST);
  if (found.length === 0) return [];
  const ids = found.map((site) => site.id);
  const timed = { siteId: visits.siteId, startsLocal: visits.startsLocal };
  const standing = and(inArray(visits.siteId, ids), isNull(visits.canceledAt));
  const last = await tx
    .selectDistinctOn([visits.siteId], timed)
    .from(visits)
    .where(and(standing, lt(visits.startsAt, now)))
    .orderBy(visits.siteId, desc(visits.startsAt));
  const next = await tx
    .selectDistinctOn([visits.siteId], timed)
    .from(visits)
    .where(and(standing, gte(visits.startsAt, now)))
    .orderBy(visits.siteId, asc(visits.startsAt));
  const people = await contactsOfSites(tx, ids, now);
  return found.map((site) => ({
    ...site,
    lastVisit: last.find((visit) => visit.siteId === site.id)?.startsLocal ?? null,
    nextVisit: next.find((visit) => visit.siteId === site.id)?.startsLocal ?? null,
    contacts: people.filter((person) => person.siteId === site.id).slice(0, 3),
  }));
}
