"use client";

import { cn } from "@/components/ui/cn";
import type { SheetVisit } from "@/lib/queries/visits";
import { PLACE_WORDS, type PlaceAt } from "./place-state";
import { VisitBlock } from "./visit-block";

type Props = {
  row: number;
  column: number;
  clock: string;
  name: string;
  at: number;
  current: boolean;
  place: PlaceAt | null;
  /** Those that begin here. */
  visits: SheetVisit[];
  covered: SheetVisit | undefined;
  lifted: string | undefined;
  onCursor: (at: { row: number; column: number }) => void;
  onChoose: (row: number, column: number) => void;
  onNote: (cell: HTMLElement | null) => void;
  onOpen: (visit: SheetVisit) => void;
};

const LOOK = {
  free: "bg-settled-soft border-l-settled cursor-pointer",
  override: "bg-soon-soft border-l-soon cursor-pointer",
  shut: "bg-sunken border-l-line cursor-not-allowed",
} as const;

export function DayCell({ row, column, clock, name, at, current, place, visits, covered, lifted, ...on }: Props) {
  const said = place && PLACE_WORDS[place.state];
  const here = covered ? `, ${covered.site.name}` : "";
  return (
    // biome-ignore lint/a11y/useKeyWithClickEvents: the grid hears the keys of all its cells
    <td
      tabIndex={current ? 0 : -1}
      aria-label={said ? `${clock}, ${name}: ${said.word}, ${place.words}` : `${clock}, ${name}${here}`}
      data-row={row}
      data-column={column}
      data-place={place?.state}
      data-glyph={said?.glyph}
      data-state={said?.word}
      data-words={place?.words}
      className={cn(
        "relative min-w-44 border-l-4 p-0 border-l-transparent focus-visible:z-10 focus-visible:-outline-offset-2",
        clock.endsWith(":00") && "border-t border-t-line",
        place && LOOK[place.state],
      )}
      onFocus={(event) => {
        on.onCursor({ row, column });
        on.onNote(event.currentTarget);
      }}
      onPointerEnter={(event) => on.onNote(event.currentTarget)}
      onClick={() => on.onChoose(row, column)}
    >
      {place?.first && (
        <span className="pointer-events-none absolute inset-x-1 top-0 z-[5] truncate text-xs leading-8">
          {said?.glyph} {place.words}
        </span>
      )}
      {visits.map((visit) => (
        <VisitBlock
          key={visit.id}
          visit={visit}
          rowAt={at}
          faded={place !== null}
          lifted={visit.id === lifted}
          onOpen={() => on.onOpen(visit)}
        />
      ))}
    </td>
  );
}
