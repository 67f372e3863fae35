import { ContactRef } from "@/lib/domain/customers/schemas";
import { AppError } from "@/lib/errors";
import { command } from "@/lib/services/command";
import { addMember, userForAddress } from "@/lib/services/people/internal";
import { sendInvitation } from "@/lib/services/people/invitation";
import { contactToChange } from "./internal";

/** Gives a customer's contact a sign-in of their own. */
export const inviteContact = command({
  name: "person.invite-contact",
  needs: "person:write",
  input: ContactRef,
  async run({ tx, who, now }, { contactId }) {
    const contact = await contactToChange(tx, contactId);
    if (!contact.email) throw new AppError("blocked", "This contact has no e-mail address");
    if (contact.endedAt) throw new AppError("blocked", "This contact has ended");
    const person = { name: contact.name, email: contact.email, role: "customer" as const };
    const userId = await userForAddress(tx, person.email, person.name);
    const memberId = await addMember(tx, who, { ...person, userId, contactId, phone: contact.phone });
    await sendInvitation(tx, who, { ...person, memberId }, now);
    return { result: { memberId }, audit: { entity: "person", entityId: memberId, after: { ...person, contactId } } };
  },
});
