import { eq } from "drizzle-orm";
import { passwords, users } from "@/db/schema/identity";
import { members } from "@/db/schema/people";
import { hashPassword } from "@/lib/auth/password";
import { NewPasswordInput } from "@/lib/domain/people/schemas";
import { AppError, notFound } from "@/lib/errors";
import { command } from "@/lib/services/command";
import { spendLink } from "@/lib/services/links";
import { setPassword } from "./internal";

/** Someone who already has a password keeps it: an invitation to another company must not change it. */
export const acceptInvitation = command({
  name: "person.accept-invitation",
  needs: "invitation:accept",
  input: NewPasswordInput,
  async run({ tx, who, now }, { password }) {
    const memberId = await spendLink(tx, who, now);
    const [member] = await tx.select().from(members).where(eq(members.id, memberId));
    if (!member?.userId) throw notFound("invitation");
    if (member.endedAt) throw new AppError("unauthenticated", "This invitation has been withdrawn");
    const [known] = await tx.select().from(passwords).where(eq(passwords.userId, member.userId));
    if (!known) await setPassword(tx, member.userId, await hashPassword(password), now);
    await tx.update(users).set({ emailVerified: now }).where(eq(users.id, member.userId));
    return { result: { keptPassword: Boolean(known) }, audit: { entity: "person", entityId: memberId } };
  },
});
