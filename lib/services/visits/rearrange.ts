import { eq, inArray } from "drizzle-orm";
import type { Tx } from "@/db/client";
import { jobs } from "@/db/schema/jobs";
import { sites } from "@/db/schema/sites";
import { visits } from "@/db/schema/visits";
import type { Entered } from "@/lib/auth/actor";
import type { OverrideInput } from "@/lib/domain/visits/schemas";
import { slotReasons } from "@/lib/domain/visits/slot-reasons";
import { notFound } from "@/lib/errors";
import { askAgain } from "./asks";
import { keepOverrides, mustStand } from "./judge";
import {
  type Placing,
  placeOf,
  releaseCrew,
  spanOf,
  timesOf,
  type visitsToChange,
  wantedOf,
  writePlacing,
} from "./placing";
import { slotFacts } from "./slot-facts";

type Standing = Awaited<ReturnType<typeof visitsToChange>>[number];
export type Change = Standing & { to: Placing };

/**
 * Puts visits where they are to stand, all at once: none is in the way of another where it stood, each is where it will
 * stand. Whoever was asked is asked again. The crew must be locked.
 */
export async function rearrange(
  tx: Tx,
  who: Entered,
  changes: readonly Change[],
  overrides: readonly OverrideInput[],
  now: Date,
): Promise<void> {
  const ids = changes.map(({ visit }) => visit.id);
  const jobOf = await byId(
    tx
      .select()
      .from(jobs)
      .where(
        inArray(
          jobs.id,
          changes.map(({ visit }) => visit.jobId),
        ),
      ),
  );
  const siteOf = await byId(
    tx
      .select()
      .from(sites)
      .where(
        inArray(
          sites.id,
          changes.map(({ visit }) => visit.siteId),
        ),
      ),
  );
  const judged = [];
  for (const { visit, to } of changes) {
    const site = siteOf(visit.siteId);
    const span = spanOf(to, visit.zone);
    const facts = await slotFacts(tx, { site, memberIds: to.crew, span, except: ids, now });
    const others = changes.filter((other) => other.visit.id !== visit.id);
    const busy = others.flatMap((other) =>
      other.to.crew.map((memberId) => ({
        memberId,
        ...spanOf(other.to, other.visit.zone),
        where: siteOf(other.visit.siteId).name,
      })),
    );
    const reasons = slotReasons(wantedOf(to, jobOf(visit.jobId)), placeOf(to, visit.zone), {
      ...facts,
      busy: [...facts.busy, ...busy],
    });
    judged.push({ visitId: visit.id, reasons, overrides });
  }
  mustStand(who, judged);
  await releaseCrew(tx, ids, now);
  for (const { visit, to } of changes) {
    await tx
      .update(visits)
      .set({ ...timesOf(to, visit.zone), sequence: visit.sequence + 1 })
      .where(eq(visits.id, visit.id));
    await writePlacing(tx, who, visit, to);
    await askAgain(tx, who, visit, now);
  }
  await keepOverrides(tx, who, judged);
}

async function byId<T extends { id: string }>(rows: Promise<T[]>): Promise<(id: string) => T> {
  const map = new Map((await rows).map((row) => [row.id, row]));
  return (id) => {
    const row = map.get(id);
    if (!row) throw notFound("visit");
    return row;
  };
}
