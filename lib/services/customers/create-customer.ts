import { v7 as uuidv7 } from "uuid";
import { customers } from "@/db/schema/customers";
import { CustomerInput } from "@/lib/domain/customers/schemas";
import { command } from "@/lib/services/command";
import { setNote } from "./internal";

export const createCustomer = command({
  name: "customer.create",
  needs: "customer:write",
  input: CustomerInput,
  async run({ tx, who }, { note, ...customer }) {
    const id = uuidv7();
    await tx.insert(customers).values({ ...customer, id, companyId: who.companyId });
    if (note) await setNote(tx, who, id, note);
    return { result: { customerId: id }, audit: { entity: "customer", entityId: id, after: customer } };
  },
});
