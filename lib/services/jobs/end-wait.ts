import { eq } from "drizzle-orm";
import { jobWaits } from "@/db/schema/jobs";
import { WaitRef } from "@/lib/domain/jobs/schemas";
import { AppError, notFound } from "@/lib/errors";
import { command } from "@/lib/services/command";

/** The parts came, the door is open, the approval was given. */
export const endWait = command({
  name: "job.end-wait",
  needs: "job:write",
  input: WaitRef,
  async run({ tx, who, now }, { waitId }) {
    const [before] = await tx.select().from(jobWaits).where(eq(jobWaits.id, waitId)).for("update");
    if (!before) throw notFound("wait");
    if (before.endedAt) throw new AppError("conflict", "This wait is over already");
    const endedBy = who.kind === "person" ? who.memberId : null;
    await tx.update(jobWaits).set({ endedAt: now, endedBy }).where(eq(jobWaits.id, waitId));
    return { result: null, audit: { entity: "job", entityId: before.jobId, before, after: { waitId, endedAt: now } } };
  },
});
