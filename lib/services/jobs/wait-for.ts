import { v7 as uuidv7 } from "uuid";
import { jobWaits } from "@/db/schema/jobs";
import { WaitInput } from "@/lib/domain/jobs/schemas";
import { command } from "@/lib/services/command";
import { jobToChange, mustMayBecome } from "./internal";

export const waitFor = command({
  name: "job.wait",
  needs: "job:write",
  input: WaitInput,
  async run({ tx, who, now }, wait) {
    const job = await jobToChange(tx, wait.jobId);
    await mustMayBecome(tx, job, "waiting", now);
    const id = uuidv7();
    await tx.insert(jobWaits).values({ ...wait, id, companyId: who.companyId, since: now });
    return {
      result: { waitId: id },
      audit: { entity: "job", entityId: wait.jobId, after: { waitId: id, ...wait } },
    };
  },
});
