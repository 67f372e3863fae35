import { eq, sql } from "drizzle-orm";
import { database } from "@/db/client";
import { asActor } from "@/db/door";
import { outbox } from "@/db/schema/messages";
import { secondsUntilRetry } from "@/lib/domain/messages/backoff";
import { DomainEvent } from "@/lib/domain/messages/events";
import { log } from "@/lib/log";
import { messageWritten } from "./handlers/message-written";

const AT_ONCE = 4;
const LEASE_SECONDS = 120;

type Claimed = { company_id: string; id: string };

/** Does what is due, a few at a time, until nothing is; returns how many rows were taken up. */
export async function runOutbox(clock: () => Date, goOn: () => boolean): Promise<number> {
  let taken = 0;
  while (goOn()) {
    const claimed = await database().execute<Claimed>(
      sql`select * from app.claim_outbox(${AT_ONCE}, make_interval(secs => ${LEASE_SECONDS}))`,
    );
    if (claimed.length === 0) break;
    taken += claimed.length;
    await Promise.all(claimed.map((row) => runRow(row, clock)));
  }
  return taken;
}

/** The handler's effects and `done_at` are one transaction: both happen, or neither. */
async function runRow({ company_id: companyId, id }: Claimed, clock: () => Date): Promise<void> {
  try {
    await asActor(
      { kind: "worker", companyId },
      async (tx) => {
        const [row] = await tx.select().from(outbox).where(eq(outbox.id, id)).for("update");
        if (!row || row.doneAt || row.deadAt) return;
        const event = DomainEvent.parse({ ...(row.payload as object), event: row.event });
        await messageWritten(tx, event, clock());
        await tx.update(outbox).set({ doneAt: clock(), leasedUntil: null, lastError: null }).where(eq(outbox.id, id));
      },
      "write",
    );
  } catch (error) {
    log().warn({ err: error, companyId, outboxId: id }, "a delivery failed");
    await putBack(companyId, id, error, clock());
  }
}

async function putBack(companyId: string, id: string, error: unknown, now: Date): Promise<void> {
  await asActor(
    { kind: "worker", companyId },
    async (tx) => {
      const [row] = await tx.select().from(outbox).where(eq(outbox.id, id)).for("update");
      if (!row) return;
      const seconds = secondsUntilRetry(row.attempts);
      await tx
        .update(outbox)
        .set({
          leasedUntil: null,
          lastError: reason(error),
          runAfter: new Date(now.getTime() + (seconds ?? 0) * 1000),
          deadAt: seconds === null ? now : null,
        })
        .where(eq(outbox.id, id));
    },
    "write",
  );
}

/** Short, and without addresses that let somebody in. */
const reason = (error: unknown): string =>
  (error instanceof Error ? error.message : "unknown").replace(/https?:\S+/g, "[address]").slice(0, 300);
