import fc from "fast-check";
import { expect, test } from "vitest";
import { SIGNALS } from "../systems/words";
import { type CellRow, cellKey, cellsOf, difference, type MatrixCell } from "./matrix";

const cell = (change: Partial<CellRow>): CellRow => ({
  zoneId: "z1",
  pointId: null,
  groupId: "fans",
  signal: "alarm",
  source: "approved_sequence",
  delaySeconds: 0,
  addedIn: 1,
  removedIn: null,
  ...change,
});
const NAMES: Record<string, string> = { z1: "zone 1", z2: "zone 2", p7: "1-007", fans: "Fans", horns: "Horns" };
const name = (id: string) => NAMES[id] ?? "?";

test("a cell holds from the version that added it until the one that removed it", () => {
  const rows = [cell({ addedIn: 2, removedIn: 4 })];
  expect([1, 2, 3, 4, 5].map((number) => cellsOf(number, rows).length)).toEqual([0, 1, 1, 0, 0]);
});

test("what changed is said in words", () => {
  const before = [cell({}), cell({ zoneId: "z2" })];
  const after = [
    cell({ source: "panel_program", delaySeconds: 20 }),
    cell({ zoneId: null, pointId: "p7", groupId: "horns", signal: "supervisory", source: "as_found" }),
  ];
  expect(difference(before, after, name)).toEqual([
    "Removed: Alarm of zone 2 operates Fans",
    "Changed: Alarm of zone 1 operates Fans, from approved sequence to panel program after 20 s",
    "Added: Supervisory of 1-007 operates Horns (as found)",
  ]);
  expect(difference(after, after, name)).toEqual([]);
});

const matrix = fc.uniqueArray(
  fc.record<MatrixCell>({
    zoneId: fc.constantFrom("z1", "z2", "z3"),
    pointId: fc.constant(null),
    groupId: fc.constantFrom("fans", "horns"),
    signal: fc.constantFrom(...SIGNALS),
    source: fc.constantFrom("approved_sequence", "panel_program", "as_found"),
    delaySeconds: fc.nat(30),
  }),
  { selector: cellKey },
);

test("saved as removed and added cells, every version reads back as it was", () => {
  fc.assert(
    fc.property(fc.array(matrix, { maxLength: 6 }), (versions) => {
      const rows: CellRow[] = [];
      const same = (a: MatrixCell, b: MatrixCell) => JSON.stringify(a) === JSON.stringify(b);
      const bare = ({ addedIn: _, removedIn: __, ...rest }: CellRow): MatrixCell => rest;
      versions.forEach((cells, i) => {
        for (const row of cellsOf(i, rows)) {
          if (!cells.some((one) => same(one, bare(row)))) row.removedIn = i + 1;
        }
        const kept = cellsOf(i + 1, rows).map(bare);
        for (const one of cells.filter((each) => !kept.some((old) => same(old, each))))
          rows.push({ ...one, addedIn: i + 1, removedIn: null });
      });
      versions.forEach((cells, i) => {
        const read = cellsOf(i + 1, rows).map(bare);
        expect(read.map(cellKey).sort()).toEqual(cells.map(cellKey).sort());
        expect(difference(cells, read, name)).toEqual([]);
      });
    }),
  );
});
