import { eq } from "drizzle-orm";
import { jobs } from "@/db/schema/jobs";
import { dueWindow } from "@/lib/domain/agreements/due-window";
import { RecordCompletionInput } from "@/lib/domain/agreements/schemas";
import { dateWords } from "@/lib/domain/shared/zone";
import { AppError } from "@/lib/errors";
import { command } from "@/lib/services/command";
import { complete, itemToChange, lastCompletion, mustNotLieAhead, openJobOf, scheduleOf } from "./internal";

/** The item's next occurrence was done on a day; its job, if one was made, is done with it. */
export const recordCompletion = command({
  name: "agreement.record-completion",
  needs: "agreement:write",
  input: RecordCompletionInput,
  async run({ tx, who, now }, { itemId, doneOn }) {
    const item = await itemToChange(tx, itemId);
    await mustNotLieAhead(tx, item.siteId, doneOn, now);
    const last = await lastCompletion(tx, itemId);
    if (last && doneOn <= last.doneOn)
      throw new AppError("invalid", "Some entries need another look", {
        doneOn: [`The one before was done on ${dateWords(last.doneOn)}`],
      });
    const job = await openJobOf(tx, itemId);
    const targetOn = job?.targetOn ?? dueWindow(scheduleOf(item), last).target;
    await complete(tx, who, itemId, { targetOn, doneOn });
    if (job) await tx.update(jobs).set({ doneOn }).where(eq(jobs.id, job.id));
    const after = { itemId, targetOn, doneOn };
    return {
      result: { targetOn },
      audit: [
        { entity: "agreement", entityId: item.agreementId, after },
        ...(job ? [{ entity: "job", entityId: job.id, after }] : []),
      ],
    };
  },
});
