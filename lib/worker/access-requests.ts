import { eq, sql } from "drizzle-orm";
import { database } from "@/db/client";
import { accessRequests } from "@/db/schema/identity";
import type { Context } from "@/lib/services/command";
import { sendPasswordReset } from "@/lib/services/messages/send-password-reset";
import { sendSignInLink } from "@/lib/services/messages/send-sign-in-link";

type Known = { company_id: string; member_id: string };

/**
 * Answers what was asked on the sign-in page. The row goes last: a crash in between sends a second letter, and the
 * newest link withdraws the older one.
 */
export async function answerAccessRequests(clock: () => Date): Promise<void> {
  await database().transaction(async (tx) => {
    const requests = await tx.select().from(accessRequests).limit(10).for("update", { skipLocked: true });
    for (const { id, kind, email, url } of requests) {
      const [known] = await tx.execute<Known>(sql`select * from app.member_of_address(${email})`);
      if (known) {
        const context: Context = { actor: { kind: "worker", companyId: known.company_id }, now: clock() };
        const person = { memberId: known.member_id, email };
        if (kind === "password_reset") await sendPasswordReset(context, person);
        else await sendSignInLink(context, { ...person, url });
      }
      await tx.delete(accessRequests).where(eq(accessRequests.id, id));
    }
  });
}
