import { v7 as uuidv7 } from "uuid";
import { agreements } from "@/db/schema/agreements";
import { CreateAgreementInput } from "@/lib/domain/agreements/schemas";
import { command } from "@/lib/services/command";
import { customerToChange } from "@/lib/services/customers/internal";
import { nextNumber } from "@/lib/services/series";

export const createAgreement = command({
  name: "agreement.create",
  needs: "agreement:write",
  input: CreateAgreementInput,
  async run({ tx, who }, agreement) {
    await customerToChange(tx, agreement.customerId);
    const id = uuidv7();
    const number = await nextNumber(tx, who, "agreement");
    await tx.insert(agreements).values({ ...agreement, id, number, companyId: who.companyId });
    return {
      result: { agreementId: id, number },
      audit: { entity: "agreement", entityId: id, after: { ...agreement, number } },
    };
  },
});
