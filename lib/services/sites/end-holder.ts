import { eq } from "drizzle-orm";
import { siteHolders } from "@/db/schema/sites";
import { addDays, startOfDate } from "@/lib/domain/shared/zone";
import { EndHolderInput } from "@/lib/domain/sites/schemas";
import { AppError, notFound } from "@/lib/errors";
import { command } from "@/lib/services/command";
import { siteById } from "./internal";

export const endHolder = command({
  name: "site.end-holder",
  needs: "site:write",
  input: EndHolderInput,
  async run({ tx }, { holderId, toDate }) {
    const [before] = await tx.select().from(siteHolders).where(eq(siteHolders.id, holderId)).for("update");
    if (!before) throw notFound("holder");
    if (toDate < before.fromDate) {
      throw new AppError("invalid", "Some entries need another look", {
        toDate: ["The last date lies before the first"],
      });
    }
    const site = await siteById(tx, before.siteId);
    const endsAt = startOfDate(addDays(toDate, 1), site.zone);
    await tx.update(siteHolders).set({ toDate, endsAt }).where(eq(siteHolders.id, holderId));
    return { result: null, audit: { entity: "site", entityId: before.siteId, before, after: { holderId, toDate } } };
  },
});
