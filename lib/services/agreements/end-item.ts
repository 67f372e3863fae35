import { eq } from "drizzle-orm";
import { agreementItems } from "@/db/schema/agreements";
import { ItemRef } from "@/lib/domain/agreements/schemas";
import { command } from "@/lib/services/command";
import { itemToChange } from "./internal";

/** No further job is made for it; what is booked stays booked. */
export const endItem = command({
  name: "agreement.end-item",
  needs: "agreement:write",
  input: ItemRef,
  async run({ tx, now }, { itemId }) {
    const before = await itemToChange(tx, itemId);
    await tx.update(agreementItems).set({ endedAt: now }).where(eq(agreementItems.id, itemId));
    return {
      result: null,
      audit: { entity: "agreement", entityId: before.agreementId, before, after: { itemId, endedAt: now } },
    };
  },
});
