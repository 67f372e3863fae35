import { and, desc, eq, inArray, isNotNull, or, sql } from "drizzle-orm";
import type { Tx } from "@/db/client";
import { proofs } from "@/db/schema/proofs";
import type { Proof } from "@/lib/domain/systems/device-list";

const PROVEN = { point: proofs.pointId, group: proofs.groupId, equipment: proofs.equipmentId } as const;

/**
 * A proof of several things together proves each of them; a failure of several does not tell which one failed, and
 * counts for what was tried alone.
 */
export const tellsOfOne = or(
  eq(proofs.outcome, "proven"),
  sql`num_nonnulls(${proofs.pointId}, ${proofs.groupId}, ${proofs.equipmentId}) = 1`,
);

/** When each point, group or piece of equipment was last seen to work or to fail; those never seen are missing. */
export async function lastProofs(
  tx: Tx,
  systemId: string,
  of: keyof typeof PROVEN,
  ids?: string[],
): Promise<Record<string, Proof>> {
  const column = PROVEN[of];
  if (ids?.length === 0) return {};
  const rows = await tx
    .selectDistinctOn([column], { id: column, on: proofs.provenOn, outcome: proofs.outcome, method: proofs.method })
    .from(proofs)
    .where(and(eq(proofs.systemId, systemId), ids ? inArray(column, ids) : isNotNull(column), tellsOfOne))
    .orderBy(column, desc(proofs.provenOn), desc(proofs.recordedAt));
  return Object.fromEntries(rows.map(({ id, ...proof }) => [id ?? "", proof]));
}

/** The last proof of each pair of input and output group. */
export const pairProofs = (tx: Tx, systemId: string) =>
  tx
    .selectDistinctOn([proofs.pointId, proofs.groupId], {
      pointId: sql<string>`${proofs.pointId}`,
      groupId: sql<string>`${proofs.groupId}`,
      on: proofs.provenOn,
      outcome: proofs.outcome,
    })
    .from(proofs)
    .where(and(eq(proofs.systemId, systemId), isNotNull(proofs.pointId), isNotNull(proofs.groupId)))
    .orderBy(proofs.pointId, proofs.groupId, desc(proofs.provenOn), desc(proofs.recordedAt));
