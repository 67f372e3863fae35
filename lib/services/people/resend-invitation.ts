import { eq } from "drizzle-orm";
import { memberDetails } from "@/db/schema/people";
import { MemberRef } from "@/lib/domain/people/schemas";
import { AppError, notFound } from "@/lib/errors";
import { command } from "@/lib/services/command";
import { memberToChange } from "./internal";
import { sendInvitation } from "./invitation";

export const resendInvitation = command({
  name: "person.resend-invitation",
  needs: "person:write",
  input: MemberRef,
  async run({ tx, who, now }, { memberId }) {
    const member = await memberToChange(tx, memberId);
    if (member.endedAt) throw new AppError("blocked", "This person's access has ended");
    const [details] = await tx.select().from(memberDetails).where(eq(memberDetails.memberId, memberId));
    if (!details) throw notFound("person");
    await sendInvitation(tx, who, { memberId, name: member.name, email: details.email, role: member.role }, now);
    return { result: null, audit: { entity: "person", entityId: memberId } };
  },
});
