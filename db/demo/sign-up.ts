import { desc, eq } from "drizzle-orm";
import { asActor } from "@/db/door";
import { messageSecrets, messages } from "@/db/schema/messages";
import type { Actor } from "@/lib/auth/actor";
import { startSession } from "@/lib/auth/sessions";
import { acceptInvitation } from "@/lib/services/people/accept-invitation";
import { DEMO_COMPANY, DEMO_PASSWORD } from "./people";

/** Opens the newest letter to an address, as its reader would, and answers it. */
export async function acceptLetter(email: string, now: Date): Promise<void> {
  const url = await asActor(
    { kind: "worker", companyId: DEMO_COMPANY.companyId },
    async (tx) => {
      const [letter] = await tx
        .select({ url: messageSecrets.url })
        .from(messages)
        .innerJoin(messageSecrets, eq(messageSecrets.messageId, messages.id))
        .where(eq(messages.toAddress, email))
        .orderBy(desc(messages.createdAt), desc(messages.id))
        .limit(1);
      return letter?.url;
    },
    "read",
  );
  const token = url?.split("/").at(-1);
  if (!token) throw new Error(`no invitation went to ${email}`);
  await acceptInvitation({ actor: { kind: "link", token }, now }, { password: DEMO_PASSWORD });
}

export async function signedIn(userId: string, now: Date): Promise<Actor> {
  const sessionId = await startSession(userId, now, "demo data");
  if (!sessionId) throw new Error("the demo person has no company");
  return { kind: "session", sessionId };
}
