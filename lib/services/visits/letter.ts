import { and, asc, eq, isNull } from "drizzle-orm";
import type { Tx } from "@/db/client";
import { companies } from "@/db/schema/company";
import { jobs } from "@/db/schema/jobs";
import { members } from "@/db/schema/people";
import { sites } from "@/db/schema/sites";
import { liveBlocks, visitCrew, visits } from "@/db/schema/visits";
import type { VisitLetter } from "@/lib/domain/visits/letter";
import { notFound } from "@/lib/errors";

/** What every letter about a visit says, to whomever it goes. */
export async function letterOf(tx: Tx, visitId: string, now: Date): Promise<Omit<VisitLetter, "contactName">> {
  const [row] = await tx
    .select({ visit: visits, site: sites, title: jobs.title, company: companies })
    .from(visits)
    .innerJoin(sites, and(eq(sites.companyId, visits.companyId), eq(sites.id, visits.siteId)))
    .innerJoin(jobs, and(eq(jobs.companyId, visits.companyId), eq(jobs.id, visits.jobId)))
    .innerJoin(companies, eq(companies.companyId, visits.companyId))
    .where(eq(visits.id, visitId));
  if (!row) throw notFound("visit");
  const { visit, site, title, company } = row;
  const blocks = await tx.select().from(liveBlocks).where(eq(liveBlocks.visitId, visitId)).orderBy(liveBlocks.startsAt);
  const crew = await tx
    .select({ name: members.name })
    .from(visitCrew)
    .innerJoin(members, and(eq(members.companyId, visitCrew.companyId), eq(members.id, visitCrew.memberId)))
    .where(and(eq(visitCrew.visitId, visitId), isNull(visitCrew.releasedAt)))
    .orderBy(asc(members.name));
  return {
    companyName: company.name,
    companyPhone: company.phone,
    site: { name: site.name, address: `${site.street}, ${site.city}, ${site.state} ${site.postalCode}` },
    title,
    crew: crew.map(({ name }) => name),
    startsLocal: visit.startsLocal,
    endsLocal: visit.endsLocal,
    liveBlocks: blocks.map(({ functions, startsLocal, endsLocal, attendees }) => ({
      functions,
      startsLocal,
      endsLocal,
      attendees,
    })),
    calendar: {
      uid: visit.id,
      sequence: visit.sequence,
      startsAt: visit.startsAt.toISOString(),
      endsAt: visit.endsAt.toISOString(),
      writtenAt: now.toISOString(),
    },
  };
}
