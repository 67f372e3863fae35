import { v7 as uuidv7 } from "uuid";
import type { Tx } from "@/db/client";
import { messageSecrets, messages, outbox } from "@/db/schema/messages";
import type { Entered } from "@/lib/auth/actor";
import type { DomainEvent, MailTemplate } from "@/lib/domain/messages/events";

/** What must follow from a verb, promised in the verb's own transaction. Never returns a row: few may read them. */
export async function enqueue(tx: Tx, who: Entered, { event, ...payload }: DomainEvent): Promise<void> {
  await tx.insert(outbox).values({ companyId: who.companyId, event, payload });
}

/** An e-mail to be rendered and sent by the worker. `url`, where it leads, is kept apart and goes once it is sent. */
export async function mail(tx: Tx, who: Entered, to: string, letter: MailTemplate, url: string): Promise<void> {
  const id = uuidv7();
  const { template, ...props } = letter;
  await tx.insert(messages).values({
    companyId: who.companyId,
    id,
    template,
    toAddress: to,
    props,
    messageId: `<${id}@coastdown.example>`,
  });
  await tx.insert(messageSecrets).values({ companyId: who.companyId, messageId: id, url });
  await enqueue(tx, who, { event: "message.written", messageId: id });
}
