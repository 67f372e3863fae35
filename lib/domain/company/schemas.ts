import { AddressInput, emailAddress, requiredText, rowId, zoneName } from "@/lib/domain/shared/inputs";

export const CompanyInput = AddressInput.extend({
  name: requiredText("Name"),
  phone: requiredText("Telephone", 40),
  zone: zoneName,
});

export const FoundCompanyInput = CompanyInput.extend({
  companyId: rowId,
  ownerName: requiredText("Owner's name"),
  ownerEmail: emailAddress,
});
