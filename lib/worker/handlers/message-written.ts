import { eq } from "drizzle-orm";
import type { Tx } from "@/db/client";
import { messageSecrets, messages } from "@/db/schema/messages";
import { renderMail } from "@/emails/render";
import { sendMail } from "@/lib/adapters/mail/send-mail";
import { MailTemplate } from "@/lib/domain/messages/events";
import { env } from "@/lib/env";
import { calendarOf } from "./visit-calendar";

/** Sends once; a crash between the server's acceptance and our commit repeats it under the same Message-ID. */
export async function messageWritten(tx: Tx, { messageId }: { messageId: string }, now: Date): Promise<void> {
  const [message] = await tx.select().from(messages).where(eq(messages.id, messageId)).for("update");
  if (!message || message.sentAt) return;
  const [secret] = await tx.select().from(messageSecrets).where(eq(messageSecrets.messageId, messageId));
  const letter = MailTemplate.parse({ ...(message.props as object), template: message.template });
  const rendered = await renderMail(letter, new URL(secret?.url ?? "/", env().APP_URL).toString());
  const calendar = calendarOf(letter);
  await sendMail({ ...rendered, to: message.toAddress, messageId: message.messageId, calendar });
  await tx.update(messages).set({ sentAt: now }).where(eq(messages.id, messageId));
  await tx.delete(messageSecrets).where(eq(messageSecrets.messageId, messageId));
}
