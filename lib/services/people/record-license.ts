import { v7 as uuidv7 } from "uuid";
import { licenses } from "@/db/schema/people";
import { LicenseInput } from "@/lib/domain/people/schemas";
import { command } from "@/lib/services/command";
import { memberToChange } from "./internal";

export const recordLicense = command({
  name: "person.record-license",
  needs: "person:write",
  input: LicenseInput,
  async run({ tx, who }, license) {
    await memberToChange(tx, license.memberId);
    const id = uuidv7();
    await tx.insert(licenses).values({ ...license, id, companyId: who.companyId });
    return { result: { licenseId: id }, audit: { entity: "person", entityId: license.memberId, after: license } };
  },
});
