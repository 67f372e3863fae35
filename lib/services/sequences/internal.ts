import { and, asc, desc, eq } from "drizzle-orm";
import type { Tx } from "@/db/client";
import { members } from "@/db/schema/people";
import { matrixCells, matrixVersions } from "@/db/schema/systems";
import type { CellRow, MatrixVersion } from "@/lib/domain/sequences/matrix";
import { cellsOf } from "@/lib/domain/sequences/matrix";
import { notFound } from "@/lib/errors";

export const versionsOf = (tx: Tx, systemId: string) =>
  tx
    .select({
      number: matrixVersions.number,
      note: matrixVersions.note,
      at: matrixVersions.createdAt,
      author: members.name,
    })
    .from(matrixVersions)
    .innerJoin(members, and(eq(members.companyId, matrixVersions.companyId), eq(members.id, matrixVersions.createdBy)))
    .where(eq(matrixVersions.systemId, systemId))
    .orderBy(desc(matrixVersions.number));

export const cellRows = (tx: Tx, systemId: string): Promise<(CellRow & { id: string })[]> =>
  tx
    .select({
      id: matrixCells.id,
      zoneId: matrixCells.zoneId,
      pointId: matrixCells.pointId,
      groupId: matrixCells.groupId,
      signal: matrixCells.signal,
      source: matrixCells.source,
      delaySeconds: matrixCells.delaySeconds,
      addedIn: matrixCells.addedIn,
      removedIn: matrixCells.removedIn,
    })
    .from(matrixCells)
    .where(eq(matrixCells.systemId, systemId))
    .orderBy(asc(matrixCells.addedIn), asc(matrixCells.id));

/** The version asked for, or the newest; none where there is no matrix. */
export async function matrixOf(tx: Tx, systemId: string, number: number | null): Promise<MatrixVersion | null> {
  const versions = await versionsOf(tx, systemId);
  const version = number === null ? versions[0] : versions.find((one) => one.number === number);
  if (!version) {
    if (number === null) return null;
    throw notFound("version");
  }
  return { ...version, cells: cellsOf(version.number, await cellRows(tx, systemId)) };
}
