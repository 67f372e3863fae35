import { and, eq } from "drizzle-orm";
import { z } from "zod";
import { companies } from "@/db/schema/company";
import { visitAsks, visits } from "@/db/schema/visits";
import { rowId } from "@/lib/domain/shared/inputs";
import { AppError, notFound } from "@/lib/errors";
import { query } from "@/lib/services/command";
import { visitsWhere } from "./internal";

/** What somebody is asked to agree to: by a signed link, or signed in and named. */
export const getAsked = query({
  name: "visit.asked",
  needs: "visit:answer",
  input: z.object({ askId: rowId.optional() }),
  async run({ tx, who, now }, { askId: named }) {
    const askId = who.kind === "link" ? who.subjectId : named;
    if (!askId) throw new AppError("invalid", "Which visit?", { askId: ["Choose one"] });
    const [row] = await tx
      .select({ ask: visitAsks, company: { name: companies.name, phone: companies.phone } })
      .from(visitAsks)
      .innerJoin(companies, eq(companies.companyId, visitAsks.companyId))
      .where(eq(visitAsks.id, askId));
    if (!row) throw notFound("visit");
    const [visit] = await visitsWhere(tx, and(eq(visits.id, row.ask.visitId)));
    if (!visit) throw notFound("visit");
    const { id, name, sequence, answer, answeredAt, channel, permitNumber, note } = row.ask;
    return {
      company: row.company,
      visit,
      ask: { id, name, answer, answeredAt, channel, permitNumber, note },
      moved: sequence !== visit.sequence,
      over: visit.endsAt <= now,
    };
  },
});
