import { and, asc, inArray, isNull } from "drizzle-orm";
import { z } from "zod";
import { companies } from "@/db/schema/company";
import { siteAccess, siteSecrets } from "@/db/schema/sites";
import { addDays, calendarDate, startOfDate } from "@/lib/domain/shared/zone";
import { AppError, notFound } from "@/lib/errors";
import { query } from "@/lib/services/command";
import { contactsOfSites } from "@/lib/services/sites/site-contacts";
import { visitsBetween } from "./internal";

const DAYS_SHOWN = 7;

/** The signed-in technician's own visits, today and the days after, with what is needed to get in. */
export const getFieldDay = query({
  name: "field.day",
  needs: "field:read",
  input: z.object({}),
  async run({ tx, who, now }) {
    if (who.kind !== "person") throw new AppError("forbidden", "Only people have a day");
    const [company] = await tx
      .select({ zone: companies.zone, phone: companies.phone, name: companies.name })
      .from(companies);
    if (!company) throw notFound("company");
    const today = calendarDate(now, company.zone);
    const all = await visitsBetween(
      tx,
      startOfDate(today, company.zone),
      startOfDate(addDays(today, DAYS_SHOWN), company.zone),
    );
    const mine = all.filter((visit) => visit.crew.some((person) => person.memberId === who.memberId));
    const siteIds = [...new Set(mine.map((visit) => visit.site.id))];
    const notes =
      siteIds.length === 0 ? [] : await tx.select().from(siteAccess).where(inArray(siteAccess.siteId, siteIds));
    // Row-level security leaves out every day but this one. Never `sealed`.
    const secrets =
      siteIds.length === 0
        ? []
        : await tx
            .select({ id: siteSecrets.id, siteId: siteSecrets.siteId, label: siteSecrets.label })
            .from(siteSecrets)
            .where(and(inArray(siteSecrets.siteId, siteIds), isNull(siteSecrets.endedAt)))
            .orderBy(asc(siteSecrets.label));
    const people = await contactsOfSites(tx, siteIds, now);
    return {
      company,
      today,
      visits: mine.map((visit) => ({
        ...visit,
        accessNote: notes.find((note) => note.siteId === visit.site.id)?.note ?? null,
        secrets: secrets.filter((secret) => secret.siteId === visit.site.id),
        contacts: people.filter((person) => person.siteId === visit.site.id),
      })),
    };
  },
});
