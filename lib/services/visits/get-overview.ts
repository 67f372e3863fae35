import { and, asc, count, eq, gte, isNotNull, isNull, lt, lte } from "drizzle-orm";
import { z } from "zod";
import { companies } from "@/db/schema/company";
import { outbox } from "@/db/schema/messages";
import { licenses, members } from "@/db/schema/people";
import { visits } from "@/db/schema/visits";
import { LICENSE_WARNING_DAYS, licenseState } from "@/lib/domain/people/license-state";
import { addDays, calendarDate, startOfDate } from "@/lib/domain/shared/zone";
import { notFound } from "@/lib/errors";
import { query } from "@/lib/services/command";

export const getOverview = query({
  name: "company.overview",
  needs: "audit:read",
  input: z.object({}),
  async run({ tx, now }) {
    const [company] = await tx.select({ zone: companies.zone }).from(companies);
    if (!company) throw notFound("company");
    const today = calendarDate(now, company.zone);
    const ending = await tx
      .select({
        memberId: members.id,
        name: members.name,
        kind: licenses.kind,
        jurisdiction: licenses.jurisdiction,
        expiresOn: licenses.expiresOn,
      })
      .from(licenses)
      .innerJoin(members, and(eq(members.companyId, licenses.companyId), eq(members.id, licenses.memberId)))
      .where(and(isNull(members.endedAt), lte(licenses.expiresOn, addDays(today, LICENSE_WARNING_DAYS))))
      .orderBy(asc(licenses.expiresOn));
    const [dead] = await tx.select({ total: count() }).from(outbox).where(isNotNull(outbox.deadAt));
    const [week] = await tx
      .select({ total: count() })
      .from(visits)
      .where(
        and(
          isNull(visits.canceledAt),
          gte(visits.startsAt, startOfDate(today, company.zone)),
          lt(visits.startsAt, startOfDate(addDays(today, 7), company.zone)),
        ),
      );
    return {
      licenses: ending.map((row) => ({ ...row, state: licenseState(row.expiresOn, today) })),
      failedDeliveries: dead?.total ?? 0,
      visitsNextSevenDays: week?.total ?? 0,
    };
  },
});
