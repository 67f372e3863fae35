import { eq } from "drizzle-orm";
import { customers } from "@/db/schema/customers";
import { UpdateCustomerInput } from "@/lib/domain/customers/schemas";
import { command } from "@/lib/services/command";
import { customerToChange, setNote } from "./internal";

export const updateCustomer = command({
  name: "customer.update",
  needs: "customer:write",
  input: UpdateCustomerInput,
  async run({ tx, who }, { customerId, note, ...customer }) {
    const before = await customerToChange(tx, customerId);
    await tx.update(customers).set(customer).where(eq(customers.id, customerId));
    await setNote(tx, who, customerId, note);
    return { result: null, audit: { entity: "customer", entityId: customerId, before, after: customer } };
  },
});
