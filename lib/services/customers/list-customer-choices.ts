import { asc } from "drizzle-orm";
import { z } from "zod";
import { customers } from "@/db/schema/customers";
import { query } from "@/lib/services/command";

/** All customers by name, to choose one from. */
export const listCustomerChoices = query({
  name: "customer.choices",
  needs: "customer:read",
  input: z.object({}),
  run: ({ tx }) => tx.select({ id: customers.id, name: customers.name }).from(customers).orderBy(asc(customers.name)),
});
