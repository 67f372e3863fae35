import { and, desc, eq } from "drizzle-orm";
import { companies } from "@/db/schema/company";
import { licenses, memberDetails, members } from "@/db/schema/people";
import { MemberRef } from "@/lib/domain/people/schemas";
import { calendarDate } from "@/lib/domain/shared/zone";
import { notFound } from "@/lib/errors";
import { query } from "@/lib/services/command";

export const getPerson = query({
  name: "person.get",
  needs: "person:read",
  input: MemberRef,
  async run({ tx, now }, { memberId }) {
    const [row] = await tx
      .select({ member: members, details: memberDetails, zone: companies.zone })
      .from(members)
      .innerJoin(companies, eq(companies.companyId, members.companyId))
      .innerJoin(
        memberDetails,
        and(eq(memberDetails.companyId, members.companyId), eq(memberDetails.memberId, members.id)),
      )
      .where(eq(members.id, memberId));
    if (!row) throw notFound("person");
    const held = await tx
      .select()
      .from(licenses)
      .where(eq(licenses.memberId, memberId))
      .orderBy(desc(licenses.expiresOn));
    return { ...row.member, details: row.details, licenses: held, today: calendarDate(now, row.zone) };
  },
});
