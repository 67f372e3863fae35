import { and, asc, desc, gte, inArray, isNull, lt } from "drizzle-orm";
import type { Tx } from "@/db/client";
import { agreementItems } from "@/db/schema/agreements";
import { jobs, jobWaits } from "@/db/schema/jobs";
import { sites } from "@/db/schema/sites";
import { systems } from "@/db/schema/systems";
import { visits } from "@/db/schema/visits";
import { TEST_KIND_WORDS } from "@/lib/domain/agreements/words";
import { JOB_STATE_WORDS } from "@/lib/domain/jobs/job-state";
import { WAITS_FOR_WORDS } from "@/lib/domain/jobs/words";
import type { SiteBrief } from "@/lib/domain/shared/found";
import { grouped } from "@/lib/domain/shared/grouped";
import { dueItems } from "@/lib/services/jobs/due-items";
import { stateExpression } from "@/lib/services/jobs/internal";
import { contactsOfSites } from "@/lib/services/sites/site-contacts";

export const BRIEF = { id: sites.id, name: sites.name, street: sites.street, city: sites.city };
type Found = Pick<SiteBrief, keyof typeof BRIEF>;

const MOST_CONTACTS = 3;

/** What whoever picks up the telephone wants to know of each site, asked for all of them together. */
export async function siteBriefs(tx: Tx, found: Found[], now: Date): Promise<SiteBrief[]> {
  if (found.length === 0) return [];
  const ids = found.map((site) => site.id);
  const timed = { siteId: visits.siteId, startsLocal: visits.startsLocal };
  const standing = and(inArray(visits.siteId, ids), isNull(visits.canceledAt));
  const last = await tx
    .selectDistinctOn([visits.siteId], timed)
    .from(visits)
    .where(and(standing, lt(visits.startsAt, now)))
    .orderBy(visits.siteId, desc(visits.startsAt));
  const next = await tx
    .selectDistinctOn([visits.siteId], timed)
    .from(visits)
    .where(and(standing, gte(visits.startsAt, now)))
    .orderBy(visits.siteId, asc(visits.startsAt));
  const people = grouped(await contactsOfSites(tx, ids, now), (person) => person.siteId);
  const panels = grouped(
    await tx
      .select({ id: systems.id, name: systems.name, siteId: systems.siteId })
      .from(systems)
      .where(inArray(systems.siteId, ids))
      .orderBy(systems.name),
    (system) => system.siteId,
  );
  const open = grouped(await openJobs(tx, ids, now), (job) => job.siteId);
  const due = grouped(await dueSoon(tx, ids, now), (item) => item.siteId);
  return found.map((site) => ({
    ...site,
    lastVisit: last.find((visit) => visit.siteId === site.id)?.startsLocal ?? null,
    nextVisit: next.find((visit) => visit.siteId === site.id)?.startsLocal ?? null,
    contacts: (people.get(site.id) ?? []).slice(0, MOST_CONTACTS).map(({ siteId: _, ...person }) => person),
    systems: (panels.get(site.id) ?? []).map(({ siteId: _, ...system }) => system),
    openJobs: (open.get(site.id) ?? []).map(({ siteId: _, ...job }) => job),
    due: (due.get(site.id) ?? []).map(({ siteId: _, ...item }) => item),
  }));
}

async function openJobs(tx: Tx, siteIds: string[], now: Date) {
  const rows = await tx
    .select({
      id: jobs.id,
      number: jobs.number,
      title: jobs.title,
      siteId: jobs.siteId,
      state: stateExpression(now).as("state"),
    })
    .from(jobs)
    .where(and(inArray(jobs.siteId, siteIds), isNull(jobs.canceledAt), isNull(jobs.doneOn)))
    .orderBy(desc(jobs.number));
  const unfinished = rows.filter((job) => job.state !== "to_review");
  if (unfinished.length === 0) return [];
  const waits = await tx
    .select({ jobId: jobWaits.jobId, waitsFor: jobWaits.waitsFor, person: jobWaits.person })
    .from(jobWaits)
    .where(
      and(
        inArray(
          jobWaits.jobId,
          unfinished.map((job) => job.id),
        ),
        isNull(jobWaits.endedAt),
      ),
    );
  const waitsOfJob = grouped(waits, (wait) => wait.jobId);
  return unfinished.map(({ state, ...job }) => ({
    ...job,
    stateWords: JOB_STATE_WORDS[state],
    waits: (waitsOfJob.get(job.id) ?? []).map((wait) => `waits for ${WAITS_FOR_WORDS[wait.waitsFor]}: ${wait.person}`),
  }));
}

/** Overdue, due now or soon, and no job made yet: what could be done on the same drive. */
async function dueSoon(tx: Tx, siteIds: string[], now: Date) {
  const items = await dueItems(tx, now, inArray(agreementItems.siteId, siteIds));
  return items
    .filter((item) => item.state !== "early" && item.job === null)
    .map(({ item, site, window, state }) => ({
      siteId: site.id,
      itemId: item.id,
      words: TEST_KIND_WORDS[item.testKind],
      latest: window.latest,
      overdue: state === "overdue",
    }));
}
