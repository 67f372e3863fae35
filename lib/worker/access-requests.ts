import { eq, sql } from "drizzle-orm";
import { database } from "@/db/client";
import { accessRequests } from "@/db/schema/identity";
import { sendPasswordReset } from "@/lib/services/messages/send-password-reset";
import { sendSignInLink } from "@/lib/services/messages/send-sign-in-link";

type Known = { company_id: string; member_id: string };

/** Answers what was asked on the sign-in page. The verb takes the request away as it writes the letter. */
export async function answerAccessRequests(clock: () => Date): Promise<void> {
  const requests = await database().select().from(accessRequests).orderBy(accessRequests.id).limit(10);
  for (const { id, kind, email } of requests) {
    const [known] = await database().execute<Known>(sql`select * from app.member_of_address(${email})`);
    if (!known) {
      await database().delete(accessRequests).where(eq(accessRequests.id, id));
      continue;
    }
    const send = kind === "password_reset" ? sendPasswordReset : sendSignInLink;
    const actor = { kind: "worker", companyId: known.company_id } as const;
    await send({ actor, now: clock() }, { requestId: id, memberId: known.member_id });
  }
}
