import { and, eq, isNull } from "drizzle-orm";
import { jobs, jobWaits } from "@/db/schema/jobs";
import { CancelJobInput } from "@/lib/domain/jobs/schemas";
import { command } from "@/lib/services/command";
import { jobToChange, mustMayBecome } from "./internal";

/** Visits are canceled first, each so that its crew and the building hear of it. */
export const cancelJob = command({
  name: "job.cancel",
  needs: "job:write",
  input: CancelJobInput,
  async run({ tx, who, now }, { jobId, reason }) {
    const before = await jobToChange(tx, jobId);
    await mustMayBecome(tx, before, "canceled", now);
    const memberId = who.kind === "person" ? who.memberId : null;
    await tx
      .update(jobs)
      .set({ canceledAt: now, canceledBy: memberId, cancelReason: reason })
      .where(eq(jobs.id, jobId));
    await tx
      .update(jobWaits)
      .set({ endedAt: now, endedBy: memberId })
      .where(and(eq(jobWaits.jobId, jobId), isNull(jobWaits.endedAt)));
    return { result: null, audit: { entity: "job", entityId: jobId, before, after: { canceledAt: now, reason } } };
  },
});
