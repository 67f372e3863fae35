import { and, desc, eq, ilike, isNull, ne, or, sql } from "drizzle-orm";
import { z } from "zod";
import type { Tx } from "@/db/client";
import { contacts, customers } from "@/db/schema/customers";
import { jobs } from "@/db/schema/jobs";
import { members } from "@/db/schema/people";
import { sites } from "@/db/schema/sites";
import { query } from "@/lib/services/command";
import { containing } from "@/lib/services/paging";
import { BRIEF, siteBriefs } from "./site-briefs";

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
        .select({ id: jobs.id, number: jobs.number, title: jobs.title })
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
    .select(BRIEF)
    .from(sites)
    .where(or(ilike(sites.name, words), ilike(sites.street, words), ilike(sites.city, words)))
    .orderBy(sites.name)
    .limit(MOST);
  return siteBriefs(tx, found, now);
}
