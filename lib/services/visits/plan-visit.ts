import { v7 as uuidv7 } from "uuid";
import { visits } from "@/db/schema/visits";
import { PlanVisitInput } from "@/lib/domain/visits/schemas";
import { slotReasons } from "@/lib/domain/visits/slot-reasons";
import { command } from "@/lib/services/command";
import { siteById } from "@/lib/services/sites/internal";
import { askContacts } from "./asks";
import { keepOverrides, mustStand } from "./judge";
import { jobToBook, lockCrew, placeOf, spanOf, timesOf, wantedOf, writePlacing } from "./placing";
import { slotFacts } from "./slot-facts";

export const planVisit = command({
  name: "visit.plan",
  needs: "visit:write",
  input: PlanVisitInput,
  async run({ tx, who, now }, { jobId, overrides, ask, ...placing }) {
    const job = await jobToBook(tx, jobId);
    const site = await siteById(tx, job.siteId);
    const { zone } = site;
    await lockCrew(tx, who, placing.crew);
    const facts = await slotFacts(tx, { site, memberIds: placing.crew, span: spanOf(placing, zone), now });
    const visitId = uuidv7();
    const judged = { visitId, reasons: slotReasons(wantedOf(placing, job), placeOf(placing, zone), facts), overrides };
    mustStand(who, [judged]);
    const visit = { id: visitId, companyId: who.companyId, jobId, siteId: site.id, zone, ...timesOf(placing, zone) };
    await tx.insert(visits).values(visit);
    await writePlacing(tx, who, visit, placing);
    await keepOverrides(tx, who, [judged]);
    if (ask.length > 0) await askContacts(tx, who, visitId, ask, now);
    return {
      result: { visitId },
      audit: { entity: "visit", entityId: visitId, after: { jobId, ...placing, overrides, ask } },
    };
  },
});
