import { eq } from "drizzle-orm";
import type { Tx } from "@/db/client";
import { jobs } from "@/db/schema/jobs";
import { visits } from "@/db/schema/visits";
import { AppError, notFound } from "@/lib/errors";
import { siteById } from "@/lib/services/sites/internal";
import { visitsWhere } from "./internal";

/** What is to be placed: a new visit of a job, or a visit that moves; read, not locked. */
export async function wantedVisit(tx: Tx, { jobId, visitId }: { jobId?: string; visitId?: string }) {
  const [visit] = visitId ? await visitsWhere(tx, eq(visits.id, visitId)) : [];
  if (visitId && !visit) throw notFound("visit");
  if (visit?.canceledAt) throw new AppError("conflict", "This visit is canceled");
  const [job] = await tx
    .select()
    .from(jobs)
    .where(eq(jobs.id, visit?.job.id ?? jobId ?? ""));
  if (!job) throw notFound("job");
  if (job.canceledAt) throw new AppError("blocked", "The job is canceled");
  return { job, visit, site: await siteById(tx, job.siteId) };
}
