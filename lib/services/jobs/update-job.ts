import { eq } from "drizzle-orm";
import { jobs } from "@/db/schema/jobs";
import { UpdateJobInput } from "@/lib/domain/jobs/schemas";
import { systemMustBeOfSite } from "@/lib/services/agreements/internal";
import { command } from "@/lib/services/command";
import { jobToChange } from "./internal";

export const updateJob = command({
  name: "job.update",
  needs: "job:write",
  input: UpdateJobInput,
  async run({ tx }, { jobId, ...change }) {
    const before = await jobToChange(tx, jobId);
    await systemMustBeOfSite(tx, before.siteId, change.systemId);
    await tx.update(jobs).set(change).where(eq(jobs.id, jobId));
    return { result: null, audit: { entity: "job", entityId: jobId, before, after: change } };
  },
});
