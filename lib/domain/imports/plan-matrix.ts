import { cellKey, type MatrixCell } from "@/lib/domain/sequences/matrix";
import type { GroupRow, KnownParts, PointRow, ZoneRow } from "./known";
import type { Means } from "./plan-parts";
import { type Places, within } from "./plan-places";
import { findingAt, rowsOf } from "./plan-table";
import type { ListRow, Part } from "./rows";

/** A system's next version: the cells that end with the one before, and those that begin with it. */
export type MatrixPlan = {
  systemId: string;
  number: number;
  ended: { id: string }[];
  added: (MatrixCell & { id: string })[];
  /** Of the added, those that stand where one ends. */
  replaced: number;
  kept: number;
};

type Inputs = {
  zones: ReadonlyMap<string, ZoneRow>;
  points: ReadonlyMap<string, PointRow>;
  groups: ReadonlyMap<string, GroupRow>;
};

/** The list is the whole matrix of each system that it names. */
export function planMatrix(
  parts: readonly Part[],
  { systemOf }: Places,
  known: KnownParts,
  inputs: Inputs,
  means: Means,
) {
  const bySystem = new Map<string, Map<string, MatrixCell & { row: number }>>();
  for (const { row } of rowsOf(parts, "matrix")) {
    const systemId = systemOf("matrix", row)?.id;
    if (!systemId) continue;
    const cells = bySystem.get(systemId) ?? new Map();
    bySystem.set(systemId, cells);
    const cell = cellOf(systemId, row, inputs, means.say);
    if (!cell) continue;
    const twin = cells.get(cellKey(cell));
    if (twin)
      means.say(findingAt("matrix", row, "group", `This cell stands in row ${twin.row} already`, row.values.group));
    else cells.set(cellKey(cell), { ...cell, row: row.row });
  }
  return [...bySystem].map(([systemId, cells]) => versionOf(systemId, cells, known, means.newId));
}

function cellOf(
  systemId: string,
  row: ListRow<"matrix">,
  { zones, points, groups }: Inputs,
  say: Means["say"],
): MatrixCell | null {
  const { zone, address, group, signal, source, delaySeconds } = row.values;
  const find = (rows: ReadonlyMap<string, { id: string }>, column: "zone" | "address" | "group", what: string) => {
    const key = row.values[column];
    if (typeof key !== "string") return null;
    const found = rows.get(within(systemId, key));
    if (!found) say(findingAt("matrix", row, column, `There is no such ${what} in this system`, key));
    return found?.id ?? null;
  };
  if (zone === null && address === null)
    say(findingAt("matrix", row, "zone", "Name the input: a zone or the address of a point", null));
  if (zone && address)
    say(findingAt("matrix", row, "address", "One input a row: a zone or a point, not both", address));
  const zoneId = find(zones, "zone", "zone");
  const pointId = find(points, "address", "point");
  const groupId = find(groups, "group", "output group");
  if (!groupId || group === undefined || (zoneId === null) === (pointId === null)) return null;
  return { zoneId, pointId, groupId, signal, source, delaySeconds };
}

function versionOf(
  systemId: string,
  wanted: ReadonlyMap<string, MatrixCell & { row: number }>,
  known: KnownParts,
  newId: () => string,
): MatrixPlan {
  const inForce = known.cells.filter((cell) => cell.systemId === systemId);
  const same = (a: MatrixCell, b: MatrixCell | undefined) =>
    b !== undefined && a.source === b.source && a.delaySeconds === b.delaySeconds;
  const ended = inForce.filter((cell) => !same(cell, wanted.get(cellKey(cell))));
  const present = new Map(inForce.map((cell) => [cellKey(cell), cell]));
  const added = [...wanted]
    .filter(([key, cell]) => !same(cell, present.get(key)))
    .map(([, { row: _, ...cell }]) => ({ ...cell, id: newId() }));
  return {
    systemId,
    number: (known.versions.get(systemId) ?? 0) + 1,
    ended: ended.map(({ id }) => ({ id })),
    added,
    replaced: added.filter((cell) => present.has(cellKey(cell))).length,
    kept: inForce.length - ended.length,
  };
}
