import { eq } from "drizzle-orm";
import { agreements } from "@/db/schema/agreements";
import { EndAgreementInput } from "@/lib/domain/agreements/schemas";
import { AppError } from "@/lib/errors";
import { command } from "@/lib/services/command";
import { agreementToChange } from "./internal";

export const endAgreement = command({
  name: "agreement.end",
  needs: "agreement:write",
  input: EndAgreementInput,
  async run({ tx }, { agreementId, endsOn }) {
    const before = await agreementToChange(tx, agreementId);
    if (endsOn < before.startsOn)
      throw new AppError("invalid", "Some entries need another look", {
        endsOn: ["The last day lies before the first"],
      });
    await tx.update(agreements).set({ endsOn }).where(eq(agreements.id, agreementId));
    return { result: null, audit: { entity: "agreement", entityId: agreementId, before, after: { endsOn } } };
  },
});
