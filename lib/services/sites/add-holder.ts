import { v7 as uuidv7 } from "uuid";
import { siteHolders } from "@/db/schema/sites";
import { addDays, startOfDate } from "@/lib/domain/shared/zone";
import { HolderInput } from "@/lib/domain/sites/schemas";
import { command } from "@/lib/services/command";
import { customerToChange } from "@/lib/services/customers/internal";
import { siteById } from "./internal";

export const addHolder = command({
  name: "site.add-holder",
  needs: "site:write",
  input: HolderInput,
  async run({ tx, who }, holder) {
    const site = await siteById(tx, holder.siteId);
    await customerToChange(tx, holder.customerId);
    const id = uuidv7();
    await tx.insert(siteHolders).values({
      ...holder,
      id,
      companyId: who.companyId,
      startsAt: startOfDate(holder.fromDate, site.zone),
      endsAt: holder.toDate ? startOfDate(addDays(holder.toDate, 1), site.zone) : null,
    });
    return { result: { holderId: id }, audit: { entity: "site", entityId: holder.siteId, after: holder } };
  },
});
