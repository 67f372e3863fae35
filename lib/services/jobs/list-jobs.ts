import { and, asc, count, desc, eq, gt, ilike, isNull, or, sql } from "drizzle-orm";
import { z } from "zod";
import { jobs } from "@/db/schema/jobs";
import { sites } from "@/db/schema/sites";
import { visits } from "@/db/schema/visits";
import { JOB_STATES } from "@/lib/domain/jobs/job-state";
import { JOB_KINDS } from "@/lib/domain/jobs/words";
import { rowId } from "@/lib/domain/shared/inputs";
import { query } from "@/lib/services/command";
import { containing, offsetOf, orderBy, PageInput, sortInput } from "@/lib/services/paging";
import { stateExpression } from "./internal";

const ListJobsInput = PageInput.extend({
  kind: z.enum(JOB_KINDS).nullish().catch(null).default(null),
  state: z.enum(JOB_STATES).nullish().catch(null).default(null),
  site: rowId.nullish().catch(null).default(null),
  sort: sortInput(["number", "state", "title", "kind", "site", "due", "visit"]),
});

export const listJobs = query({
  name: "job.list",
  needs: "job:read",
  input: ListJobsInput,
  async run({ tx, now }, { page, pageSize, q, kind, state, site, sort }) {
    const words = containing(q);
    const number = /^\d{1,9}$/.test(q) ? Number(q) : null;
    const stateNow = stateExpression(now);
    const open = and(isNull(jobs.canceledAt), isNull(jobs.doneOn));
    const where = and(
      state === "canceled" ? undefined : state === null || state === "to_review" ? isNull(jobs.canceledAt) : open,
      state ? eq(stateNow, state) : undefined,
      kind ? eq(jobs.kind, kind) : undefined,
      site ? eq(jobs.siteId, site) : undefined,
      q
        ? or(
            ilike(jobs.title, words),
            ilike(sites.name, words),
            ilike(sites.street, words),
            number === null ? undefined : eq(jobs.number, number),
          )
        : undefined,
    );
    const onSite = and(eq(sites.companyId, jobs.companyId), eq(sites.id, jobs.siteId));
    const nextVisit = sql<string | null>`(${tx
      .select({ startsLocal: visits.startsLocal })
      .from(visits)
      .where(
        and(
          eq(visits.companyId, jobs.companyId),
          eq(visits.jobId, jobs.id),
          isNull(visits.canceledAt),
          gt(visits.endsAt, now),
        ),
      )
      .orderBy(asc(visits.startsAt))
      .limit(1)})`;
    const rows = await tx
      .select({
        id: jobs.id,
        number: jobs.number,
        kind: jobs.kind,
        title: jobs.title,
        urgent: jobs.urgent,
        latestOn: jobs.latestOn,
        createdAt: jobs.createdAt,
        state: stateNow.as("state"),
        nextVisit,
        site: { id: sites.id, name: sites.name, city: sites.city },
      })
      .from(jobs)
      .innerJoin(sites, onSite)
      .where(where)
      .orderBy(
        ...orderBy(
          sort,
          {
            number: jobs.number,
            state: stateNow,
            title: jobs.title,
            kind: jobs.kind,
            site: sites.name,
            due: jobs.latestOn,
            visit: nextVisit,
          },
          [desc(jobs.number)],
        ),
      )
      .limit(pageSize)
      .offset(offsetOf(page, pageSize));
    const [all] = await tx.select({ total: count() }).from(jobs).innerJoin(sites, onSite).where(where);
    return { rows, total: all?.total ?? 0, page, pageSize };
  },
});
