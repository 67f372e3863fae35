import { and, eq, isNull } from "drizzle-orm";
import type { Tx } from "@/db/client";
import { companies } from "@/db/schema/company";
import { memberDetails, members } from "@/db/schema/people";
import { attendances } from "@/db/schema/windows";
import { bandsOf, startsOf } from "@/lib/domain/planning/bands";
import { costOf, type Errand } from "@/lib/domain/planning/cost";
import { addDays, startOfDate } from "@/lib/domain/shared/zone";
import { crewReasons } from "@/lib/domain/visits/crew-reasons";
import { proposedLiveBlocks } from "@/lib/domain/visits/live-blocks";
import { PlacesInput } from "@/lib/domain/visits/schemas";
import { siteReasons, windowsBetween } from "@/lib/domain/visits/site-reasons";
import { LEAD_IS_LICENSED, spanFrom } from "@/lib/domain/visits/slot";
import { notFound } from "@/lib/errors";
import { query } from "@/lib/services/command";
import { contactsOfSites } from "@/lib/services/sites/site-contacts";
import { busyBetween, slotFacts } from "@/lib/services/visits/slot-facts";
import { wantedVisit } from "@/lib/services/visits/wanted";

const DAY_MS = 86_400_000;

/**
 * Every start still ahead at which a visit could be put on a day (or a few), for every technician as its lead, gathered into bands
 * that say what it costs there or why not. What the site says is reckoned once for each start, not for each person.
 */
export const getPlaces = query({
  name: "visit.places",
  needs: "visit:write",
  input: PlacesInput,
  async run({ tx, now }, { jobId, visitId, date, days, helpers, stepMinutes, liveMinutes, ...wish }) {
    const { job, visit, site } = await wantedVisit(tx, { jobId, visitId });
    const [company] = await tx.select({ zone: companies.zone }).from(companies);
    if (!company) throw notFound("company");
    const minutes =
      wish.minutes ?? (visit ? (visit.endsAt.getTime() - visit.startsAt.getTime()) / 60_000 : job.visitMinutes);
    const functions = visit ? visit.liveBlocks.flatMap((block) => block.functions) : job.functions;
    const due = { earliest: job.earliestOn, latest: job.latestOn };
    const span = {
      startsAt: startOfDate(date, company.zone),
      endsAt: startOfDate(addDays(date, days), company.zone),
    };
    const around = {
      startsAt: new Date(span.startsAt.getTime() - DAY_MS),
      endsAt: new Date(span.endsAt.getTime() + DAY_MS),
    };
    const people = await technicians(tx);
    const ids = people.map(({ id }) => id);
    const except = visitId ? [visitId] : [];
    const facts = await slotFacts(tx, { site, memberIds: ids, span: around, except, now });
    const errands: Errand[] = await busyBetween(tx, ids, around, except);
    const windows = windowsBetween(facts.windows, around, site.zone);
    const starts = startsOf(span, stepMinutes, site.zone)
      .filter(({ at }) => at >= now)
      .map((start) => {
        const liveBlocks = proposedLiveBlocks({ minutes, functions, liveMinutes }, start.at, windows);
        const place = spanFrom(start.at, minutes);
        return {
          ...start,
          liveBlocks,
          span: place,
          reasons: siteReasons({ minutes, liveBlocks, due }, place, site.zone, { ...facts, windows }),
        };
      });
    const columns = people.map((lead) => {
      const crew = [lead.id, ...helpers.filter((id) => id !== lead.id)].map((memberId, i) => ({
        memberId,
        lead: i === 0,
      }));
      const own = errands.filter((errand) => errand.memberId === lead.id);
      const judged = starts.map((start) => ({
        ...start,
        reasons: [
          ...crewReasons(
            { crewSize: job.crewSize, licenses: LEAD_IS_LICENSED },
            { crew, zone: site.zone },
            start.span,
            facts,
          ),
          ...start.reasons,
        ],
        cost: costOf({ span: start.span, site, home: lead, errands: own, zone: company.zone, latest: due.latest }),
      }));
      return { memberId: lead.id, name: lead.name, bands: bandsOf(judged) };
    });
    return {
      site: { name: site.name, zone: site.zone },
      minutes,
      functions,
      crewSize: job.crewSize,
      stepMinutes,
      starts: starts.map(({ at, local, liveBlocks }) => ({ at, local, liveBlocks })),
      windows: windows.spans.filter((open) => open.functions.some((one) => functions.includes(one))),
      columns,
      standBy: await standBy(tx, site.id),
      contacts: (await contactsOfSites(tx, [site.id], now)).map(({ id, name, email, phone }) => ({
        id,
        name,
        email,
        phone,
      })),
    };
  },
});

/** Who must stand by at the site while given functions operate. */
const standBy = (tx: Tx, siteId: string) =>
  tx
    .select({ party: attendances.party, functions: attendances.functions })
    .from(attendances)
    .where(and(eq(attendances.siteId, siteId), isNull(attendances.endedAt)))
    .orderBy(attendances.party);

/** Everybody who goes out, with home for the first way of the day. */
const technicians = (tx: Tx) =>
  tx
    .select({
      id: members.id,
      name: members.name,
      latitude: memberDetails.homeLatitude,
      longitude: memberDetails.homeLongitude,
    })
    .from(members)
    .innerJoin(
      memberDetails,
      and(eq(memberDetails.companyId, members.companyId), eq(memberDetails.memberId, members.id)),
    )
    .where(and(eq(members.role, "technician"), isNull(members.endedAt)))
    .orderBy(members.name);
