import { v7 as uuidv7 } from "uuid";
import { agreementItems } from "@/db/schema/agreements";
import { stepsFrom } from "@/lib/domain/agreements/due-window";
import { AddItemInput } from "@/lib/domain/agreements/schemas";
import { command } from "@/lib/services/command";
import { siteById } from "@/lib/services/sites/internal";
import { agreementToChange, complete, mustNotLieAhead, systemMustBeOfSite } from "./internal";

export const addItem = command({
  name: "agreement.add-item",
  needs: "agreement:write",
  input: AddItemInput,
  async run({ tx, who, now }, { lastDoneOn, price, ...item }) {
    await agreementToChange(tx, item.agreementId);
    await siteById(tx, item.siteId);
    await systemMustBeOfSite(tx, item.siteId, item.systemId);
    const id = uuidv7();
    await tx.insert(agreementItems).values({ ...item, priceCents: price, id, companyId: who.companyId });
    if (lastDoneOn) {
      await mustNotLieAhead(tx, item.siteId, lastDoneOn, now, "lastDoneOn");
      // The occurrence before the first target is what was done then.
      const targetOn = item.anchor === "fixed" ? stepsFrom(item.anchorOn, item.frequency, -1) : lastDoneOn;
      await complete(tx, who, id, { targetOn, doneOn: lastDoneOn });
    }
    return {
      result: { itemId: id },
      audit: {
        entity: "agreement",
        entityId: item.agreementId,
        after: { itemId: id, ...item, priceCents: price, lastDoneOn },
      },
    };
  },
});
