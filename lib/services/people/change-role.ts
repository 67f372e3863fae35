import { eq } from "drizzle-orm";
import { members } from "@/db/schema/people";
import { ChangeRoleInput } from "@/lib/domain/people/schemas";
import { AppError } from "@/lib/errors";
import { command } from "@/lib/services/command";
import { memberToChange, mustKeepAnOwner } from "./internal";

export const changeRole = command({
  name: "person.change-role",
  needs: "person:write",
  input: ChangeRoleInput,
  async run({ tx }, { memberId, role }) {
    const before = await memberToChange(tx, memberId);
    if (before.role === "customer") throw new AppError("blocked", "A customer's contact cannot become staff");
    await tx.update(members).set({ role }).where(eq(members.id, memberId));
    await mustKeepAnOwner(tx);
    return {
      result: null,
      audit: { entity: "person", entityId: memberId, before: { role: before.role }, after: { role } },
    };
  },
});
