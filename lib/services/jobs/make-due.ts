import { eq } from "drizzle-orm";
import { agreementItems } from "@/db/schema/agreements";
import { ItemRef } from "@/lib/domain/agreements/schemas";
import { AppError } from "@/lib/errors";
import { itemToChange } from "@/lib/services/agreements/internal";
import { command } from "@/lib/services/command";
import { dueItems } from "./due-items";
import { madeEntries, makeJobs } from "./make-jobs";

/** One click on the due list. Clicked again, or by two people at once, it answers the same job. */
export const makeDue = command({
  name: "job.make-due",
  needs: "job:write",
  input: ItemRef,
  async run({ tx, who, now }, { itemId }) {
    await itemToChange(tx, itemId);
    const [made] = await makeJobs(tx, who, now, () => true, [itemId]);
    if (made) return { result: { jobId: made.id, number: made.number }, audit: madeEntries([made]) };
    const [item] = await dueItems(tx, now, eq(agreementItems.id, itemId));
    if (!item?.job) throw new AppError("blocked", "The agreement has ended");
    return {
      result: { jobId: item.job.id, number: item.job.number },
      audit: [],
    };
  },
});
