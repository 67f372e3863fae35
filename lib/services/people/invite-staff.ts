import { InviteStaffInput } from "@/lib/domain/people/schemas";
import { command } from "@/lib/services/command";
import { addMember, userForAddress } from "./internal";
import { sendInvitation } from "./invitation";

export const inviteStaff = command({
  name: "person.invite",
  needs: "person:write",
  input: InviteStaffInput,
  async run({ tx, who, now }, person) {
    const userId = await userForAddress(tx, person.email, person.name);
    const memberId = await addMember(tx, who, { ...person, userId });
    await sendInvitation(tx, who, { ...person, memberId }, now);
    return { result: { memberId }, audit: { entity: "person", entityId: memberId, after: person } };
  },
});
