import { and, asc, count, desc, eq, exists, ilike, isNull, not, or, type SQL, sql } from "drizzle-orm";
import { z } from "zod";
import type { Tx } from "@/db/client";
import { proofs } from "@/db/schema/proofs";
import { points, zones } from "@/db/schema/systems";
import { rowId } from "@/lib/domain/shared/inputs";
import { POINT_KINDS } from "@/lib/domain/systems/words";
import { query } from "@/lib/services/command";
import { containing, offsetOf, orderBy, PageInput, sortInput } from "@/lib/services/paging";
import { naturally, systemById } from "./internal";
import { lastProofs, tellsOfOne } from "./proofs";

const DEVICES_A_PAGE = 50;

const PointSearch = PageInput.omit({ pageSize: true }).extend({
  systemId: rowId,
  zone: z.uuid().nullish().catch(null).default(null),
  kind: z.enum(POINT_KINDS).nullish().catch(null).default(null),
  proof: z.enum(["never", "failed"]).nullish().catch(null).default(null),
  removed: z.enum(["shown"]).nullish().catch(null).default(null),
  sort: sortInput(["address", "zone", "kind", "label", "proven"]),
});

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
    const columns = {
      address: naturally(points.address),
      zone: naturally(zones.key),
      kind: points.kind,
      label: points.label,
      proven: sql`(${lastProven})`,
    };
    const asWalked = [asc(points.walkOrder), asc(naturally(zones.key)), asc(naturally(points.address)), asc(points.id)];
    const rows = await tx
      .select({ point: points, zone: { id: zones.id, key: zones.key, name: zones.name } })
      .from(points)
      .leftJoin(zones, and(eq(zones.companyId, points.companyId), eq(zones.id, points.zoneId)))
      .where(where)
      .orderBy(...orderBy(search.sort, columns, asWalked))
      .limit(DEVICES_A_PAGE)
      .offset(offsetOf(page, DEVICES_A_PAGE));
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
