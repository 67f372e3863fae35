import { eq } from "drizzle-orm";
import { agreements } from "@/db/schema/agreements";
import { UpdateAgreementInput } from "@/lib/domain/agreements/schemas";
import { command } from "@/lib/services/command";
import { agreementToChange } from "./internal";

export const updateAgreement = command({
  name: "agreement.update",
  needs: "agreement:write",
  input: UpdateAgreementInput,
  async run({ tx }, { agreementId, ...agreement }) {
    const before = await agreementToChange(tx, agreementId);
    await tx.update(agreements).set(agreement).where(eq(agreements.id, agreementId));
    return { result: null, audit: { entity: "agreement", entityId: agreementId, before, after: agreement } };
  },
});
