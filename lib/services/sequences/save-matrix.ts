import { eq, inArray, max } from "drizzle-orm";
import { v7 as uuidv7 } from "uuid";
import type { Tx } from "@/db/client";
import { matrixCells, matrixVersions, outputGroups, points, zones } from "@/db/schema/systems";
import { type CellKey, cellKey, cellsOf } from "@/lib/domain/sequences/matrix";
import { SaveMatrixInput } from "@/lib/domain/systems/schemas";
import { AppError, notFound } from "@/lib/errors";
import { command } from "@/lib/services/command";
import { systemById } from "@/lib/services/systems/internal";
import { cellRows } from "./internal";

/** Rows in one statement: PostgreSQL takes 65,535 parameters. */
const ROWS_AT_ONCE = 5000;

/** Appends a version: what it removes ends with the one before, what it adds begins with it. */
export const saveMatrix = command({
  name: "matrix.save",
  needs: "system:write",
  input: SaveMatrixInput,
  async run({ tx, who, now }, { systemId, basedOn, note, removed, added }) {
    if (who.kind !== "person") throw new AppError("forbidden", "Only people write a matrix");
    await systemById(tx, systemId);
    await mustBeNewest(tx, systemId, basedOn);
    if (removed.length + added.length === 0) throw new AppError("invalid", "Nothing has changed");
    const number = basedOn + 1;
    await tx
      .insert(matrixVersions)
      .values({ companyId: who.companyId, systemId, number, note, createdAt: now, createdBy: who.memberId });
    await endCells(tx, systemId, basedOn, removed);
    await mustBeOfSystem(tx, systemId, added);
    for (let i = 0; i < added.length; i += ROWS_AT_ONCE) {
      await tx.insert(matrixCells).values(
        added.slice(i, i + ROWS_AT_ONCE).map((cell) => ({
          ...cell,
          id: uuidv7(),
          companyId: who.companyId,
          systemId,
          addedIn: number,
        })),
      );
    }
    return {
      result: { number },
      audit: {
        entity: "system",
        entityId: systemId,
        after: { number, note, removed: removed.length, added: added.length },
      },
    };
  },
});

/** Two who save at once both find the same newest version; the second's number is then taken. */
async function mustBeNewest(tx: Tx, systemId: string, basedOn: number): Promise<void> {
  const [found] = await tx
    .select({ newest: max(matrixVersions.number) })
    .from(matrixVersions)
    .where(eq(matrixVersions.systemId, systemId));
  if ((found?.newest ?? 0) === basedOn) return;
  throw new AppError("conflict", `Version ${found?.newest} has been saved since. Look at it, then change that one`);
}

async function endCells(tx: Tx, systemId: string, basedOn: number, removed: readonly CellKey[]): Promise<void> {
  if (removed.length === 0) return;
  const rows = await cellRows(tx, systemId);
  const present = new Map(cellsOf(basedOn, rows).map((cell) => [cellKey(cell), cell]));
  const ids = removed.map((cell) => present.get(cellKey(cell))?.id);
  if (!ids.every((id) => id !== undefined)) throw new AppError("conflict", "A cell to remove is not there any more");
  for (let i = 0; i < ids.length; i += ROWS_AT_ONCE) {
    await tx
      .update(matrixCells)
      .set({ removedIn: basedOn + 1 })
      .where(inArray(matrixCells.id, ids.slice(i, i + ROWS_AT_ONCE)));
  }
}

/** Foreign keys say so too; this says it in words that help. */
async function mustBeOfSystem(tx: Tx, systemId: string, cells: readonly CellKey[]): Promise<void> {
  if (cells.length === 0) return;
  const ids = async (table: typeof zones | typeof points | typeof outputGroups) =>
    new Set((await tx.select({ id: table.id }).from(table).where(eq(table.systemId, systemId))).map(({ id }) => id));
  const [zoneIds, pointIds, groupIds] = [await ids(zones), await ids(points), await ids(outputGroups)];
  for (const cell of cells) {
    if (cell.zoneId && !zoneIds.has(cell.zoneId)) throw notFound("zone");
    if (cell.pointId && !pointIds.has(cell.pointId)) throw notFound("device");
    if (!groupIds.has(cell.groupId)) throw notFound("output group");
  }
}
