import { jobTerms } from "@/db/schema/jobs";
import { JobTermsInput } from "@/lib/domain/jobs/schemas";
import { command } from "@/lib/services/command";
import { jobToChange, termsOf } from "./internal";

/** What the customer answered when asked for a purchase order and a limit. */
export const setTerms = command({
  name: "job.set-terms",
  needs: "job:write",
  input: JobTermsInput,
  async run({ tx, who }, { jobId, purchaseOrder, limit, noneNeeded }) {
    await jobToChange(tx, jobId);
    const before = await termsOf(tx, jobId);
    const after = { purchaseOrder, limitCents: limit, noneNeeded };
    await tx
      .insert(jobTerms)
      .values({ companyId: who.companyId, jobId, ...after })
      .onConflictDoUpdate({ target: [jobTerms.companyId, jobTerms.jobId], set: after });
    return { result: null, audit: { entity: "job", entityId: jobId, before, after } };
  },
});
