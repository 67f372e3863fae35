import { eq } from "drizzle-orm";
import { agreementItems } from "@/db/schema/agreements";
import { ChangeItemInput } from "@/lib/domain/agreements/schemas";
import { command } from "@/lib/services/command";
import { itemToChange, refreshWindow, systemMustBeOfSite } from "./internal";

export const changeItem = command({
  name: "agreement.change-item",
  needs: "agreement:write",
  input: ChangeItemInput,
  async run({ tx }, { itemId, price, ...change }) {
    const before = await itemToChange(tx, itemId);
    await systemMustBeOfSite(tx, before.siteId, change.systemId);
    const after = { ...change, priceCents: price };
    await tx.update(agreementItems).set(after).where(eq(agreementItems.id, itemId));
    await refreshWindow(tx, { ...before, ...after });
    return {
      result: null,
      audit: { entity: "agreement", entityId: before.agreementId, before, after: { itemId, ...after } },
    };
  },
});
