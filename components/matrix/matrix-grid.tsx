// biome-ignore-all lint/a11y/useSemanticElements: most rows are not drawn, which a table element cannot tell
"use client";

import { defaultRangeExtractor, useVirtualizer } from "@tanstack/react-virtual";
import { useEffect, useRef } from "react";
import { type MatrixCell as Cell, cellKey } from "@/lib/domain/sequences/matrix";
import type { OutputGroup } from "@/lib/domain/systems/device-list";
import { MatrixCell } from "./matrix-cell";
import type { PairProof } from "./matrix-facts";
import { MatrixHead, RowHead } from "./matrix-head";
import { type MatrixRow, placeOf } from "./rows";
import { type Place, useGridKeys } from "./use-grid-keys";

const ROW_PX = 40;
const HEAD_PX = 64;
const ROWS_A_PAGE = 10;

type Props = {
  rows: readonly MatrixRow[];
  groups: readonly OutputGroup[];
  cells: ReadonlyMap<string, Cell[]>;
  proofs: ReadonlyMap<string, PairProof>;
  unsaved: ReadonlySet<string>;
  editable: boolean;
  onPress: (row: MatrixRow, group: OutputGroup) => void;
  onOpen: (zoneId: string) => void;
  onUndo: () => void;
};

/** An ARIA grid of which only the rows in sight are drawn; the row with the focus always is. */
export function MatrixGrid({ rows, groups, cells, proofs, unsaved, editable, onPress, onOpen, onUndo }: Props) {
  const box = useRef<HTMLDivElement>(null);
  const wanted = useRef<Place>(null);
  const press = ({ row, column }: Place) => {
    const [line, group] = [rows[row], groups[column - 1]];
    if (!line) return;
    if (group) onPress(line, group);
    else if (line.kind === "zone") onOpen(line.id);
  };
  const { active, setActive, onKey } = useGridKeys({
    rows: rows.length,
    columns: groups.length + 1,
    page: ROWS_A_PAGE,
    onPress: press,
    onUndo,
  });
  const virtual = useVirtualizer({
    count: rows.length,
    getScrollElement: () => box.current,
    estimateSize: () => ROW_PX,
    overscan: 8,
    paddingStart: HEAD_PX,
    scrollPaddingStart: HEAD_PX,
    rangeExtractor: (range) => [...new Set([active.row, ...defaultRangeExtractor(range)])].sort((a, b) => a - b),
  });
  // A cell far away is drawn first, then takes the focus.
  useEffect(() => {
    const place = wanted.current;
    const cell = place && box.current?.querySelector<HTMLElement>(`[data-place="${place.row}:${place.column}"]`);
    if (!cell) return;
    wanted.current = null;
    cell.focus();
  });
  const go = (place: Place) => {
    wanted.current = place;
    virtual.scrollToIndex(place.row);
  };
  return (
    <div
      ref={box}
      role="grid"
      aria-label="Input and output matrix"
      aria-rowcount={rows.length + 1}
      aria-colcount={groups.length + 1}
      aria-readonly={!editable}
      className="relative max-h-[70dvh] overflow-auto scroll-pt-16 scroll-pl-40 rounded-lg border border-line bg-surface sm:scroll-pl-72"
      onKeyDown={(event) => {
        const place = onKey(event);
        if (place) go(place);
      }}
      // However the focus came: a screen reader's own keys move it too.
      onFocus={(event) => {
        const [row, column] = placeUnder(event.target);
        if (row !== undefined && column !== undefined) setActive({ row, column });
      }}
      onClick={(event) => {
        const [row, column] = placeUnder(event.target);
        if (row === undefined || column === undefined) return;
        press({ row, column });
      }}
    >
      <MatrixHead groups={groups} />
      <div className="w-max" style={{ height: virtual.getTotalSize() - HEAD_PX }}>
        {virtual.getVirtualItems().map(({ index, start }) => {
          const row = rows[index];
          if (!row) return null;
          return (
            // biome-ignore lint/a11y/useFocusableInteractive: its cells take the focus
            <div
              key={row.id}
              role="row"
              aria-rowindex={index + 2}
              className="absolute flex w-max"
              style={{ height: ROW_PX, top: start }}
            >
              <RowHead row={row} index={index} active={active.row === index && active.column === 0} />
              {groups.map((group, i) => (
                <MatrixCell
                  key={group.id}
                  row={index}
                  column={i + 1}
                  input={row.kind === "zone" ? `Zone ${row.key} ${row.label}` : `${row.key} ${row.label}`}
                  group={group.name}
                  cells={cells.get(placeOf(row.id, group.id)) ?? NONE}
                  proof={proofs.get(placeOf(row.id, group.id))}
                  unsaved={signalsOf(cells.get(placeOf(row.id, group.id)) ?? NONE, unsaved)}
                  active={active.row === index && active.column === i + 1}
                  editable={editable}
                />
              ))}
            </div>
          );
        })}
      </div>
    </div>
  );
}

const NONE: Cell[] = [];

const signalsOf = (cells: readonly Cell[], unsaved: ReadonlySet<string>): string =>
  cells
    .filter((cell) => unsaved.has(cellKey(cell)))
    .map(({ signal }) => signal)
    .join();

function placeUnder(target: EventTarget): number[] {
  const cell = target instanceof Element ? target.closest<HTMLElement>("[data-place]") : null;
  return cell?.dataset.place?.split(":").map(Number) ?? [];
}
