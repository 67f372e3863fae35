import { and, asc, count, desc, eq, ilike } from "drizzle-orm";
import { auditEntries } from "@/db/schema/audit";
import { members } from "@/db/schema/people";
import { query } from "@/lib/services/command";
import { containing, offsetOf, PageInput, sortInput } from "@/lib/services/paging";

export const listAudit = query({
  name: "audit.list",
  needs: "audit:read",
  input: PageInput.extend({ sort: sortInput(["at"]) }),
  async run({ tx }, { page, pageSize, q, sort }) {
    const order = sort === "at" ? asc : desc;
    const where = q ? ilike(auditEntries.command, containing(q)) : undefined;
    const rows = await tx
      .select({ entry: auditEntries, person: members.name })
      .from(auditEntries)
      .leftJoin(members, and(eq(members.companyId, auditEntries.companyId), eq(members.id, auditEntries.memberId)))
      .where(where)
      .orderBy(order(auditEntries.at), order(auditEntries.id))
      .limit(pageSize)
      .offset(offsetOf(page, pageSize));
    const [all] = await tx.select({ total: count() }).from(auditEntries).where(where);
    return { rows, total: all?.total ?? 0, page, pageSize };
  },
});
