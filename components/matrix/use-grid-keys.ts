"use client";

import { useState } from "react";

export type Place = { row: number; column: number };
type Options = { rows: number; columns: number; page: number; onPress: (place: Place) => void; onUndo: () => void };

/** Moves by the keys of the WAI-ARIA grid pattern. */
const MOVES: Record<string, (at: Place, size: Options) => Place> = {
  ArrowUp: ({ row, column }) => ({ row: row - 1, column }),
  ArrowDown: ({ row, column }) => ({ row: row + 1, column }),
  ArrowLeft: ({ row, column }) => ({ row, column: column - 1 }),
  ArrowRight: ({ row, column }) => ({ row, column: column + 1 }),
  PageUp: ({ row, column }, { page }) => ({ row: row - page, column }),
  PageDown: ({ row, column }, { page }) => ({ row: row + page, column }),
  Home: ({ row }) => ({ row, column: 0 }),
  End: ({ row }, { columns }) => ({ row, column: columns - 1 }),
  "Control+Home": () => ({ row: 0, column: 0 }),
  "Control+End": (_, { rows, columns }) => ({ row: rows - 1, column: columns - 1 }),
};

const within = (value: number, count: number) => Math.max(0, Math.min(count - 1, value));

/** One cell of the grid holds the focus; column 0 names the row. */
export function useGridKeys(options: Options) {
  const [asked, setActive] = useState<Place>({ row: 0, column: 1 });
  const inside = ({ row, column }: Place): Place => ({
    row: within(row, options.rows),
    column: within(column, options.columns),
  });
  const active = inside(asked);
  /** Whether the key was for the grid, and where the focus goes by it. */
  const onKey = (event: React.KeyboardEvent): Place | undefined => {
    const control = event.ctrlKey || event.metaKey;
    if (control && event.key === "z") {
      event.preventDefault();
      options.onUndo();
      return active;
    }
    if (event.key === " " || event.key === "Enter") {
      event.preventDefault();
      options.onPress(active);
      return active;
    }
    const move = MOVES[control ? `Control+${event.key}` : event.key];
    if (!move) return undefined;
    event.preventDefault();
    const next = inside(move(active, options));
    setActive(next);
    return next;
  };
  return { active, setActive, onKey };
}
