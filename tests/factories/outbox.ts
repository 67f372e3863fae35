import { and, eq, sql } from "drizzle-orm";
import { asActor } from "@/db/door";
import { messages, outbox } from "@/db/schema/messages";
import { worker } from "./company";

/** The deliveries of the letters to one address. */
export const deliveriesTo = (companyId: string, email: string) =>
  asActor(
    worker(companyId),
    (tx) =>
      tx
        .select({
          id: outbox.id,
          attempts: outbox.attempts,
          doneAt: outbox.doneAt,
          deadAt: outbox.deadAt,
          leasedUntil: outbox.leasedUntil,
          lastError: outbox.lastError,
          waitSeconds: sql<number>`extract(epoch from ${outbox.runAfter} - now())::float`,
          messageId: messages.messageId,
          sentAt: messages.sentAt,
        })
        .from(outbox)
        .innerJoin(
          messages,
          and(eq(messages.companyId, outbox.companyId), sql`${messages.id}::text = payload->>'messageId'`),
        )
        .where(eq(messages.toAddress, email)),
    "read",
  );

/** As if the wait, or the lease, were over. */
export const timePasses = (companyId: string) =>
  asActor(
    worker(companyId),
    (tx) =>
      tx.execute(
        sql`update outbox set run_after = now(), leased_until = null where done_at is null and dead_at is null`,
      ),
    "write",
  );
