import { and, eq, isNull } from "drizzle-orm";
import { z } from "zod";
import { companies } from "@/db/schema/company";
import { members } from "@/db/schema/people";
import { calendarDateText } from "@/lib/domain/shared/inputs";
import { addDays, calendarDate, startOfDate } from "@/lib/domain/shared/zone";
import { notFound } from "@/lib/errors";
import { query } from "@/lib/services/command";
import { visitsBetween } from "./internal";

/** One day of all crews, in the company's zone. */
export const getRunSheet = query({
  name: "visit.run-sheet",
  needs: "visit:read",
  input: z.object({ date: calendarDateText.nullish().catch(null).default(null) }),
  async run({ tx, now }, input) {
    const [company] = await tx.select({ zone: companies.zone }).from(companies);
    if (!company) throw notFound("company");
    const today = calendarDate(now, company.zone);
    const date = input.date ?? today;
    const technicians = await tx
      .select({ id: members.id, name: members.name })
      .from(members)
      .where(and(eq(members.role, "technician"), isNull(members.endedAt)))
      .orderBy(members.name);
    const from = startOfDate(date, company.zone);
    const to = startOfDate(addDays(date, 1), company.zone);
    return { date, today, zone: company.zone, technicians, visits: await visitsBetween(tx, from, to) };
  },
});
