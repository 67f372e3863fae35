import { and, eq, getTableColumns, inArray, isNull, max } from "drizzle-orm";
import type { PgTable } from "drizzle-orm/pg-core";
import type { Tx } from "@/db/client";
import { proofs } from "@/db/schema/proofs";
import { sites } from "@/db/schema/sites";
import {
  columnMatches,
  equipment,
  matrixCells,
  matrixVersions,
  outputGroups,
  outputs,
  points,
  systems,
  zones,
} from "@/db/schema/systems";
import { type KnownParts, type KnownPlaces, provenKey } from "@/lib/domain/imports/known";
import type { Remembered } from "@/lib/domain/imports/match";

/** A table's columns but for those that an import neither reads nor writes. */
function own<T extends PgTable>(table: T) {
  const { companyId: _, createdAt: __, ...columns } = getTableColumns(table);
  return columns as Omit<T["_"]["columns"], "companyId" | "createdAt">;
}

export const rememberedColumns = (tx: Tx): Promise<Remembered[number][]> =>
  tx
    .select({ list: columnMatches.list, heading: columnMatches.heading, column: columnMatches.column })
    .from(columnMatches);

/** All sites and systems: rows may name any of them. */
export async function knownPlaces(tx: Tx): Promise<KnownPlaces> {
  return { sites: await tx.select(own(sites)).from(sites), systems: await tx.select(own(systems)).from(systems) };
}

/** What hangs on the systems that the lists speak of. */
export async function knownParts(tx: Tx, systemIds: string[]): Promise<KnownParts> {
  const newest = await tx
    .select({ systemId: matrixVersions.systemId, number: max(matrixVersions.number) })
    .from(matrixVersions)
    .where(inArray(matrixVersions.systemId, systemIds))
    .groupBy(matrixVersions.systemId);
  return {
    zones: await tx.select(own(zones)).from(zones).where(inArray(zones.systemId, systemIds)),
    groups: await tx.select(own(outputGroups)).from(outputGroups).where(inArray(outputGroups.systemId, systemIds)),
    points: await tx.select(own(points)).from(points).where(inArray(points.systemId, systemIds)),
    outputs: await tx.select(own(outputs)).from(outputs).where(inArray(outputs.systemId, systemIds)),
    equipment: await tx.select(own(equipment)).from(equipment).where(inArray(equipment.systemId, systemIds)),
    cells: await tx
      .select(own(matrixCells))
      .from(matrixCells)
      .where(and(inArray(matrixCells.systemId, systemIds), isNull(matrixCells.removedIn))),
    versions: new Map(newest.map(({ systemId, number }) => [systemId, number ?? 0])),
    proven: await knownProofs(tx, systemIds),
  };
}

async function knownProofs(tx: Tx, systemIds: string[]): Promise<Set<string>> {
  const rows = await tx
    .selectDistinct({
      pointId: proofs.pointId,
      groupId: proofs.groupId,
      equipmentId: proofs.equipmentId,
      on: proofs.provenOn,
    })
    .from(proofs)
    .where(and(inArray(proofs.systemId, systemIds), eq(proofs.outcome, "proven")));
  return new Set(
    rows.flatMap(({ on, ...things }) => Object.values(things).flatMap((id) => (id === null ? [] : provenKey(id, on)))),
  );
}
