import { and, asc, count, desc, eq, exists, ilike, isNull, not, or, type SQL, sql } from "drizzle-orm";
import type { Tx } from "@/db/client";
import { proofs } from "@/db/schema/proofs";
import { points, zones } from "@/db/schema/systems";
import { PointSearch } from "@/lib/domain/systems/schemas";
import { query } from "@/lib/services/command";
import { containing } from "@/lib/services/paging";
import { naturally, systemById } from "./internal";
import { lastProofs, tellsOfOne } from "./proofs";

const DEVICES_A_PAGE = 50;

/** The devices of a system, filtered, sorted and by pages. */
export const listPoints = query({
  name: "system.list-points",
  needs: "system:read",
  input: PointSearch,
  async run({ tx }, search) {
    const { systemId, page } = search;
    await systemById(tx, systemId);
    const where = and(
      eq(points.systemId, systemId),
      textFits(search.q),
      search.zone ? eq(points.zoneId, search.zone) : undefined,
      search.kind ? eq(points.kind, search.kind) : undefined,
      search.removed ? undefined : isNull(points.removedOn),
      proofFits(tx, search.proof),
    );
    const lastProven = tx
      .select({ on: sql`max(${proofs.provenOn})` })
      .from(proofs)
      .where(and(eq(proofs.companyId, points.companyId), eq(proofs.pointId, points.id), eq(proofs.outcome, "proven")));
    const keys: Record<typeof search.sort, SQL[]> = {
      walk: [sql`${points.walkOrder}`, naturally(zones.key), naturally(points.address)],
      address: [naturally(points.address)],
      zone: [naturally(zones.key), naturally(points.address)],
      kind: [sql`${points.kind}`, naturally(points.address)],
      label: [sql`${points.label}`],
      proven: [sql`(${lastProven})`, naturally(points.address)],
    };
    const way = search.way === "down" ? desc : asc;
    const rows = await tx
      .select({ point: points, zone: { id: zones.id, key: zones.key, name: zones.name } })
      .from(points)
      .leftJoin(zones, and(eq(zones.companyId, points.companyId), eq(zones.id, points.zoneId)))
      .where(where)
      .orderBy(...keys[search.sort].map((key) => way(key)), points.id)
      .limit(DEVICES_A_PAGE)
      .offset((page - 1) * DEVICES_A_PAGE);
    const [all] = await tx.select({ total: count() }).from(points).where(where);
    const ids = rows.map(({ point }) => point.id);
    return {
      rows,
      proofs: await lastProofs(tx, systemId, "point", ids),
      zones: await tx
        .select({ id: zones.id, key: zones.key, name: zones.name })
        .from(zones)
        .where(eq(zones.systemId, systemId))
        .orderBy(naturally(zones.key)),
      total: all?.total ?? 0,
      page,
      pageSize: DEVICES_A_PAGE,
    };
  },
});

function textFits(q: string): SQL | undefined {
  if (!q) return undefined;
  const words = containing(q);
  return or(ilike(points.address, words), ilike(points.label, words), ilike(points.location, words));
}

/** Never proven, whatever failed; or what its last proof says. */
function proofFits(tx: Tx, proof: "never" | "failed" | null): SQL | undefined {
  if (!proof) return undefined;
  const ofPoint = and(eq(proofs.companyId, points.companyId), eq(proofs.pointId, points.id));
  if (proof === "never") {
    return not(
      exists(
        tx
          .select()
          .from(proofs)
          .where(and(ofPoint, eq(proofs.outcome, "proven"))),
      ),
    );
  }
  const last = tx
    .select({ outcome: proofs.outcome })
    .from(proofs)
    .where(and(ofPoint, tellsOfOne))
    .orderBy(desc(proofs.provenOn), desc(proofs.recordedAt))
    .limit(1);
  return sql`(${last}) = 'failed'`;
}
