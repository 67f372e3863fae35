import { companies } from "@/db/schema/company";
import { FoundCompanyInput } from "@/lib/domain/company/schemas";
import { command } from "@/lib/services/command";
import { addMember, userForAddress } from "./internal";
import { sendInvitation } from "./invitation";

/** Once per company, from the operator's command line: no web page founds companies. */
export const foundCompany = command({
  name: "company.found",
  needs: "company:found",
  input: FoundCompanyInput,
  async run({ tx, who, now }, { companyId: _, ownerName, ownerEmail, ...company }) {
    await tx.insert(companies).values({ ...company, companyId: who.companyId });
    const userId = await userForAddress(tx, ownerEmail, ownerName);
    const memberId = await addMember(tx, who, {
      userId,
      role: "owner",
      name: ownerName,
      email: ownerEmail,
      phone: null,
    });
    await sendInvitation(tx, who, { memberId, name: ownerName, email: ownerEmail, role: "owner" }, now);
    return {
      result: { companyId: who.companyId, memberId, userId },
      audit: { entity: "company", entityId: who.companyId, after: company },
    };
  },
});
