import { eq } from "drizzle-orm";
import { contacts } from "@/db/schema/customers";
import { ContactRef } from "@/lib/domain/customers/schemas";
import { AppError } from "@/lib/errors";
import { command } from "@/lib/services/command";
import { contactToChange } from "./internal";

/** Ends what the contact may see at once; what they did stays. */
export const endContact = command({
  name: "contact.end",
  needs: "customer:write",
  input: ContactRef,
  async run({ tx, now }, { contactId }) {
    const before = await contactToChange(tx, contactId);
    if (before.endedAt) throw new AppError("conflict", "This contact has already ended");
    await tx.update(contacts).set({ endedAt: now }).where(eq(contacts.id, contactId));
    return { result: null, audit: { entity: "contact", entityId: contactId, before, after: { endedAt: now } } };
  },
});
