import { and, asc, count, eq, ilike, inArray, isNotNull, isNull, ne, or, type SQL } from "drizzle-orm";
import { z } from "zod";
import { licenses, memberDetails, members } from "@/db/schema/people";
import { query } from "@/lib/services/command";
import { containing, offsetOf, orderBy, PageInput, sortInput } from "@/lib/services/paging";

const SORTS = { name: members.name, role: members.role };

const ListPeopleInput = PageInput.extend({
  show: z.enum(["current", "ended"]).catch("current").default("current"),
  sort: sortInput(["name", "role"]),
});

export const listPeople = query({
  name: "person.list",
  needs: "person:read",
  input: ListPeopleInput,
  async run({ tx }, { page, pageSize, q, show, sort }) {
    const conditions: (SQL | undefined)[] = [
      ne(members.role, "customer"),
      show === "current" ? isNull(members.endedAt) : isNotNull(members.endedAt),
      q ? or(ilike(members.name, containing(q)), ilike(memberDetails.email, containing(q))) : undefined,
    ];
    const where = and(...conditions);
    const onDetails = and(eq(memberDetails.companyId, members.companyId), eq(memberDetails.memberId, members.id));
    const rows = await tx
      .select({
        id: members.id,
        name: members.name,
        role: members.role,
        email: memberDetails.email,
        phone: memberDetails.phone,
        endedAt: members.endedAt,
      })
      .from(members)
      .innerJoin(memberDetails, onDetails)
      .where(where)
      .orderBy(...orderBy(sort, SORTS, [asc(members.name), asc(members.id)]))
      .limit(pageSize)
      .offset(offsetOf(page, pageSize));
    const [all] = await tx.select({ total: count() }).from(members).innerJoin(memberDetails, onDetails).where(where);
    const shown = rows.map((row) => row.id);
    const held = shown.length > 0 ? await tx.select().from(licenses).where(inArray(licenses.memberId, shown)) : [];
    return {
      rows: rows.map((row) => ({ ...row, licenses: held.filter((license) => license.memberId === row.id) })),
      total: all?.total ?? 0,
      page,
      pageSize,
    };
  },
});
