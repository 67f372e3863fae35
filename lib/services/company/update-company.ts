import { companies } from "@/db/schema/company";
import { CompanyInput } from "@/lib/domain/company/schemas";
import { notFound } from "@/lib/errors";
import { command } from "@/lib/services/command";

export const updateCompany = command({
  name: "company.update",
  needs: "company:write",
  input: CompanyInput,
  async run({ tx, who }, company) {
    const [before] = await tx.select().from(companies);
    if (!before) throw notFound("company");
    await tx.update(companies).set(company);
    return {
      result: null,
      audit: { entity: "company", entityId: who.companyId, before, after: company },
    };
  },
});
