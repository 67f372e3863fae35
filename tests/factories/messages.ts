import { v7 as uuidv7 } from "uuid";
import { asActor } from "@/db/door";
import { outbox } from "@/db/schema/messages";
import { NOW, worker } from "./company";

/** A delivery that was given up, as the worker leaves it. */
export async function deadLetter(companyId: string): Promise<string> {
  const id = uuidv7();
  await asActor(
    worker(companyId),
    (tx) =>
      tx.insert(outbox).values({
        companyId,
        id,
        event: "message.written",
        payload: { messageId: uuidv7() },
        attempts: 8,
        deadAt: NOW,
        lastError: "refused",
      }),
    "write",
  );
  return id;
}
