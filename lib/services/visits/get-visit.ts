import { and, asc, desc, eq } from "drizzle-orm";
import { z } from "zod";
import { members } from "@/db/schema/people";
import { visitAsks, visitOverrides, visits } from "@/db/schema/visits";
import { rowId } from "@/lib/domain/shared/inputs";
import { notFound } from "@/lib/errors";
import { query } from "@/lib/services/command";
import { contactsOfSites } from "@/lib/services/sites/site-contacts";
import { visitsWhere } from "./internal";

/** One visit with everything that was agreed, asked, answered and gone past. */
export const getVisit = query({
  name: "visit.get",
  needs: "visit:read",
  input: z.object({ visitId: rowId }),
  async run({ tx, now }, { visitId }) {
    const [visit] = await visitsWhere(tx, eq(visits.id, visitId));
    if (!visit) throw notFound("visit");
    const asks = await tx
      .select({
        id: visitAsks.id,
        sequence: visitAsks.sequence,
        contactId: visitAsks.contactId,
        name: visitAsks.name,
        email: visitAsks.email,
        askedAt: visitAsks.askedAt,
        answer: visitAsks.answer,
        answeredAt: visitAsks.answeredAt,
        channel: visitAsks.channel,
        permitNumber: visitAsks.permitNumber,
        note: visitAsks.note,
        recordedBy: members.name,
      })
      .from(visitAsks)
      .leftJoin(members, and(eq(members.companyId, visitAsks.companyId), eq(members.id, visitAsks.recordedBy)))
      .where(eq(visitAsks.visitId, visitId))
      .orderBy(desc(visitAsks.sequence), asc(visitAsks.name));
    const overrides = await tx
      .select({
        id: visitOverrides.id,
        words: visitOverrides.words,
        note: visitOverrides.note,
        at: visitOverrides.createdAt,
        by: members.name,
      })
      .from(visitOverrides)
      .innerJoin(
        members,
        and(eq(members.companyId, visitOverrides.companyId), eq(members.id, visitOverrides.createdBy)),
      )
      .where(eq(visitOverrides.visitId, visitId))
      .orderBy(asc(visitOverrides.createdAt));
    return { ...visit, asks, overrides, contacts: await contactsOfSites(tx, [visit.site.id], now) };
  },
});
