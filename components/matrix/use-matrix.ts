"use client";

import { useMemo, useState } from "react";
import { type CellKey, cellKey, type MatrixCell } from "@/lib/domain/sequences/matrix";
import type { Pen } from "./matrix-facts";

type Cells = ReadonlyMap<string, MatrixCell>;

const same = (a: MatrixCell | undefined, b: MatrixCell | undefined): boolean =>
  a?.source === b?.source && a?.delaySeconds === b?.delaySeconds;

/** The cells as they are being changed, each step to be undone, and what of them is not saved yet. */
export function useMatrix(saved: readonly MatrixCell[]) {
  const [first] = useState<Cells>(() => new Map(saved.map((cell) => [cellKey(cell), cell])));
  const [steps, setSteps] = useState<readonly Cells[]>([first]);
  const cells = steps.at(-1) ?? first;

  /** Writes the pen into a place; where the same stands already, takes it away. */
  const press = (place: Omit<CellKey, "signal">, pen: Pen) =>
    setSteps((all) => {
      const next = new Map(all.at(-1));
      const cell: MatrixCell = { zoneId: place.zoneId, pointId: place.pointId, groupId: place.groupId, ...pen };
      const key = cellKey(cell);
      if (next.has(key) && same(next.get(key), cell)) next.delete(key);
      else next.set(key, cell);
      return [...all, next];
    });

  const unsaved = useMemo(() => {
    const removed = [...first].filter(([key, cell]) => !same(cells.get(key), cell)).map(([, cell]) => cell);
    const added = [...cells].filter(([key, cell]) => !same(first.get(key), cell)).map(([, cell]) => cell);
    return { removed, added, unsaved: new Set([...removed, ...added].map(cellKey)) };
  }, [first, cells]);
  return {
    cells,
    press,
    undo: () => setSteps((all) => (all.length > 1 ? all.slice(0, -1) : all)),
    discard: () => setSteps([first]),
    mayUndo: steps.length > 1,
    /** As saving wants them: a changed cell is removed and added. */
    ...unsaved,
  };
}
