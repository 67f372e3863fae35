import { and, count, desc, eq, ilike, isNotNull, or, sql } from "drizzle-orm";
import { messages, outbox } from "@/db/schema/messages";
import { query } from "@/lib/services/command";
import { containing, offsetOf, orderBy, PageInput, sortInput } from "@/lib/services/paging";

const SORTS = { what: sql`coalesce(${messages.template}, ${outbox.event})`, to: messages.toAddress, at: outbox.deadAt };

/** What was given up, and to whom it should have gone where it was a letter. */
export const listDeadLetters = query({
  name: "delivery.list-dead",
  needs: "delivery:read",
  input: PageInput.extend({ sort: sortInput(["what", "to", "at"]) }),
  async run({ tx }, { page, pageSize, q, sort }) {
    const words = containing(q);
    const where = and(
      isNotNull(outbox.deadAt),
      q ? or(ilike(messages.toAddress, words), ilike(outbox.lastError, words)) : undefined,
    );
    const ofEvent = and(
      eq(messages.companyId, outbox.companyId),
      eq(messages.id, sql`(${outbox.payload} ->> 'messageId')::uuid`),
    );
    const rows = await tx
      .select({
        id: outbox.id,
        what: sql<string>`coalesce(${messages.template}, ${outbox.event})`,
        to: messages.toAddress,
        at: outbox.deadAt,
        attempts: outbox.attempts,
        lastError: outbox.lastError,
      })
      .from(outbox)
      .leftJoin(messages, ofEvent)
      .where(where)
      .orderBy(...orderBy(sort, SORTS, [desc(outbox.deadAt), desc(outbox.id)]))
      .limit(pageSize)
      .offset(offsetOf(page, pageSize));
    const [all] = await tx.select({ total: count() }).from(outbox).leftJoin(messages, ofEvent).where(where);
    return { rows, total: all?.total ?? 0, page, pageSize };
  },
});
