import { eq } from "drizzle-orm";
import { members } from "@/db/schema/people";
import { MemberRef } from "@/lib/domain/people/schemas";
import { AppError } from "@/lib/errors";
import { command } from "@/lib/services/command";
import { memberToChange } from "./internal";

export const restoreMembership = command({
  name: "person.restore",
  needs: "person:write",
  input: MemberRef,
  async run({ tx }, { memberId }) {
    const before = await memberToChange(tx, memberId);
    if (!before.endedAt) throw new AppError("conflict", "This person has access already");
    await tx.update(members).set({ endedAt: null, endedBy: null }).where(eq(members.id, memberId));
    return { result: null, audit: { entity: "person", entityId: memberId, before, after: { endedAt: null } } };
  },
});
