import { v7 as uuidv7 } from "uuid";
import { jobs } from "@/db/schema/jobs";
import { CreateJobInput } from "@/lib/domain/jobs/schemas";
import { AppError } from "@/lib/errors";
import { systemMustBeOfSite } from "@/lib/services/agreements/internal";
import { command } from "@/lib/services/command";
import { nextNumber } from "@/lib/services/series";
import { siteById } from "@/lib/services/sites/internal";

export const createJob = command({
  name: "job.create",
  needs: "job:write",
  input: CreateJobInput,
  async run({ tx, who }, job) {
    if (who.kind !== "person") throw new AppError("forbidden", "Only people make jobs");
    await siteById(tx, job.siteId);
    await systemMustBeOfSite(tx, job.siteId, job.systemId);
    const id = uuidv7();
    const number = await nextNumber(tx, who, "job");
    await tx.insert(jobs).values({ ...job, id, number, companyId: who.companyId, createdBy: who.memberId });
    return { result: { jobId: id, number }, audit: { entity: "job", entityId: id, after: { ...job, number } } };
  },
});
