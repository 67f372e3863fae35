import { and, eq, isNotNull } from "drizzle-orm";
import { z } from "zod";
import { outbox } from "@/db/schema/messages";
import { rowId } from "@/lib/domain/shared/inputs";
import { notFound } from "@/lib/errors";
import { command } from "@/lib/services/command";

export const retryDeadLetter = command({
  name: "delivery.retry",
  needs: "delivery:retry",
  input: z.object({ outboxId: rowId }),
  async run({ tx, now }, { outboxId }) {
    const [revived] = await tx
      .update(outbox)
      .set({ deadAt: null, attempts: 0, leasedUntil: null, runAfter: now })
      .where(and(eq(outbox.id, outboxId), isNotNull(outbox.deadAt)))
      .returning({ event: outbox.event });
    if (!revived) throw notFound("failed delivery");
    return { result: null, audit: { entity: "delivery", entityId: outboxId, after: revived } };
  },
});
