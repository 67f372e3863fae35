import { v7 as uuidv7 } from "uuid";
import { contacts } from "@/db/schema/customers";
import { contactSites } from "@/db/schema/sites";
import { ContactInput } from "@/lib/domain/customers/schemas";
import { command } from "@/lib/services/command";
import { customerToChange } from "./internal";

export const addContact = command({
  name: "contact.add",
  needs: "customer:write",
  input: ContactInput,
  async run({ tx, who }, { siteIds, ...contact }) {
    await customerToChange(tx, contact.customerId);
    const id = uuidv7();
    await tx.insert(contacts).values({ ...contact, id, companyId: who.companyId });
    if (siteIds.length > 0) {
      const { companyId } = who;
      await tx.insert(contactSites).values(siteIds.map((siteId) => ({ companyId, contactId: id, siteId })));
    }
    return { result: { contactId: id }, audit: { entity: "contact", entityId: id, after: { ...contact, siteIds } } };
  },
});
