import { and, count, desc, eq, ilike, isNull, or } from "drizzle-orm";
import { z } from "zod";
import { jobs } from "@/db/schema/jobs";
import { sites } from "@/db/schema/sites";
import { JOB_KINDS } from "@/lib/domain/jobs/words";
import { query } from "@/lib/services/command";
import { containing, offsetOf, orderBy, PageInput, sortInput } from "@/lib/services/paging";

const SORTS = { number: jobs.number, kind: jobs.kind, title: jobs.title, site: sites.name };

const ListJobsInput = PageInput.extend({
  kind: z.enum(JOB_KINDS).nullish().catch(null).default(null),
  sort: sortInput(["number", "kind", "title", "site"]),
});

export const listJobs = query({
  name: "job.list",
  needs: "job:read",
  input: ListJobsInput,
  async run({ tx }, { page, pageSize, q, kind, sort }) {
    const words = containing(q);
    const where = and(
      isNull(jobs.canceledAt),
      q ? or(ilike(jobs.title, words), ilike(sites.name, words)) : undefined,
      kind ? eq(jobs.kind, kind) : undefined,
    );
    const onSite = and(eq(sites.companyId, jobs.companyId), eq(sites.id, jobs.siteId));
    const rows = await tx
      .select({
        id: jobs.id,
        number: jobs.number,
        kind: jobs.kind,
        title: jobs.title,
        createdAt: jobs.createdAt,
        site: { id: sites.id, name: sites.name, city: sites.city },
      })
      .from(jobs)
      .innerJoin(sites, onSite)
      .where(where)
      .orderBy(...orderBy(sort, SORTS, [desc(jobs.number)]))
      .limit(pageSize)
      .offset(offsetOf(page, pageSize));
    const [all] = await tx.select({ total: count() }).from(jobs).innerJoin(sites, onSite).where(where);
    return { rows, total: all?.total ?? 0, page, pageSize };
  },
});
