import { and, eq, isNull } from "drizzle-orm";
import { sessions } from "@/db/schema/identity";
import { members } from "@/db/schema/people";
import { MemberRef } from "@/lib/domain/people/schemas";
import { AppError } from "@/lib/errors";
import { command } from "@/lib/services/command";
import { withdrawLinks } from "@/lib/services/links";
import { memberToChange, mustKeepAnOwner } from "./internal";

/** Takes effect at the person's next click: the door looks the membership up each time. */
export const endMembership = command({
  name: "person.end",
  needs: "person:write",
  input: MemberRef,
  async run({ tx, who, now }, { memberId }) {
    const before = await memberToChange(tx, memberId);
    if (before.endedAt) throw new AppError("conflict", "This person's access has already ended");
    const endedBy = who.kind === "person" ? who.memberId : null;
    await tx.update(members).set({ endedAt: now, endedBy }).where(eq(members.id, memberId));
    await mustKeepAnOwner(tx);
    await withdrawLinks(tx, [memberId], "invitation:accept", now);
    if (before.userId) {
      await tx
        .update(sessions)
        .set({ endedAt: now })
        .where(
          and(eq(sessions.userId, before.userId), eq(sessions.companyId, who.companyId), isNull(sessions.endedAt)),
        );
    }
    return { result: null, audit: { entity: "person", entityId: memberId, before, after: { endedAt: now } } };
  },
});
