import { eq } from "drizzle-orm";
import type { Tx } from "@/db/client";
import { contacts, customerNotes, customers } from "@/db/schema/customers";
import type { Entered } from "@/lib/auth/actor";
import { notFound } from "@/lib/errors";

export async function customerToChange(tx: Tx, customerId: string) {
  const [customer] = await tx.select().from(customers).where(eq(customers.id, customerId)).for("update");
  if (!customer) throw notFound("customer");
  return customer;
}

export async function contactToChange(tx: Tx, contactId: string) {
  const [contact] = await tx.select().from(contacts).where(eq(contacts.id, contactId)).for("update");
  if (!contact) throw notFound("contact");
  return contact;
}

export async function setNote(tx: Tx, who: Entered, customerId: string, note: string | null): Promise<void> {
  if (note === null) {
    await tx.delete(customerNotes).where(eq(customerNotes.customerId, customerId));
    return;
  }
  await tx
    .insert(customerNotes)
    .values({ companyId: who.companyId, customerId, note })
    .onConflictDoUpdate({ target: [customerNotes.companyId, customerNotes.customerId], set: { note } });
}
