import { and, eq, gt, inArray, isNull, lt, notInArray } from "drizzle-orm";
import type { Tx } from "@/db/client";
import { licenses, members } from "@/db/schema/people";
import { sites } from "@/db/schema/sites";
import { visitCrew, visits } from "@/db/schema/visits";
import { noTestDates, testWindows } from "@/db/schema/windows";
import type { SlotFacts, Span } from "@/lib/domain/visits/slot";
import { notFound } from "@/lib/errors";

type Asked = {
  site: { id: string; state: string };
  memberIds: readonly string[];
  /** Around everything that is judged. */
  span: Span;
  /** Visits that move, and so stand in nobody's way. */
  except?: readonly string[];
  now: Date;
};

/** Everything that `slotReasons` wants to know, in five reads however many places are judged. */
export async function slotFacts(tx: Tx, { site, memberIds, span, except = [], now }: Asked): Promise<SlotFacts> {
  const ids = [...memberIds];
  const people = await tx
    .select({ id: members.id, name: members.name })
    .from(members)
    .where(and(inArray(members.id, ids), eq(members.role, "technician"), isNull(members.endedAt)));
  if (people.length !== new Set(ids).size) throw notFound("technician");
  return {
    now,
    siteState: site.state,
    names: Object.fromEntries(people.map(({ id, name }) => [id, name])),
    busy: await busyBetween(tx, ids, span, except),
    licenses: await tx
      .select({
        memberId: licenses.memberId,
        kind: licenses.kind,
        jurisdiction: licenses.jurisdiction,
        expiresOn: licenses.expiresOn,
      })
      .from(licenses)
      .where(inArray(licenses.memberId, ids)),
    ...(await siteTimes(tx, site.id)),
  };
}

export async function siteTimes(tx: Tx, siteId: string): Promise<Pick<SlotFacts, "windows" | "noTestDates">> {
  return {
    windows: await tx
      .select()
      .from(testWindows)
      .where(and(eq(testWindows.siteId, siteId), isNull(testWindows.endedAt))),
    noTestDates: await tx
      .select()
      .from(noTestDates)
      .where(and(eq(noTestDates.siteId, siteId), isNull(noTestDates.endedAt))),
  };
}

/** Where people are already, with the place's coordinates for the way from there. */
export function busyBetween(tx: Tx, memberIds: string[], { startsAt, endsAt }: Span, except: readonly string[] = []) {
  return tx
    .select({
      memberId: visitCrew.memberId,
      startsAt: visitCrew.startsAt,
      endsAt: visitCrew.endsAt,
      where: sites.name,
      latitude: sites.latitude,
      longitude: sites.longitude,
    })
    .from(visitCrew)
    .innerJoin(visits, and(eq(visits.companyId, visitCrew.companyId), eq(visits.id, visitCrew.visitId)))
    .innerJoin(sites, and(eq(sites.companyId, visits.companyId), eq(sites.id, visits.siteId)))
    .where(
      and(
        inArray(visitCrew.memberId, memberIds),
        isNull(visitCrew.releasedAt),
        lt(visitCrew.startsAt, endsAt),
        gt(visitCrew.endsAt, startsAt),
        except.length > 0 ? notInArray(visitCrew.visitId, [...except]) : undefined,
      ),
    )
    .orderBy(visitCrew.startsAt);
}
