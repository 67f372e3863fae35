import { and, eq, isNull } from "drizzle-orm";
import { jobs, jobWaits } from "@/db/schema/jobs";
import { RecordDoneInput } from "@/lib/domain/jobs/schemas";
import { complete, mustNotLieAhead } from "@/lib/services/agreements/internal";
import { command } from "@/lib/services/command";
import { jobToChange, mustMayBecome } from "./internal";

/** The office says that the work is done; where it was an occurrence of an agreement, the next one counts from it. */
export const recordDone = command({
  name: "job.record-done",
  needs: "job:write",
  input: RecordDoneInput,
  async run({ tx, who, now }, { jobId, doneOn }) {
    const before = await jobToChange(tx, jobId);
    await mustMayBecome(tx, before, "to_review", now);
    await mustNotLieAhead(tx, before.siteId, doneOn, now);
    await tx.update(jobs).set({ doneOn }).where(eq(jobs.id, jobId));
    await tx
      .update(jobWaits)
      .set({ endedAt: now, endedBy: who.kind === "person" ? who.memberId : null })
      .where(and(eq(jobWaits.jobId, jobId), isNull(jobWaits.endedAt)));
    const { agreementItemId, targetOn } = before;
    if (agreementItemId && targetOn) await complete(tx, who, agreementItemId, { targetOn, doneOn });
    return { result: null, audit: { entity: "job", entityId: jobId, before, after: { doneOn } } };
  },
});
