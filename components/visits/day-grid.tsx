"use client";

import { useCallback, useEffect, useLayoutEffect, useRef, useState } from "react";
import { toast } from "sonner";
import { Button } from "@/components/ui/button";
import { Select } from "@/components/ui/input";
import { type Places, type Sheet, type SheetVisit, timeOf } from "@/lib/queries/visits";
import type { Spot } from "./booking-panel";
import { DayCell } from "./day-cell";
import { PlaceNote } from "./place-note";
import { placeAt } from "./place-state";
import { usePhone } from "./use-phone";
import { WindowMark } from "./window-mark";

const ROW_MS = 30 * 60_000;
const FIRST_CLOCK = "06:00";

type Cursor = { row: number; column: number };

type Props = {
  sheet: Sheet;
  /** Where what is in the hand can go. */
  places: Places | undefined;
  /** The visit that is in the hand. */
  lifted: string | undefined;
  onPlace: (spot: Spot) => void;
  onOpen: (visit: SheetVisit) => void;
  onPutBack: (() => void) | undefined;
};

/** One column a person, half an hour a row. A grid as the ARIA authoring practices have it: one tab stop, arrows inside. */
export function DayGrid({ sheet, places, lifted, onPlace, onOpen, onPutBack }: Props) {
  const phone = usePhone();
  const [person, setPerson] = useState(sheet.technicians[0]?.id ?? "");
  const [cursor, setCursor] = useState<Cursor>({ row: rowOf(sheet, FIRST_CLOCK), column: 0 });
  const [noted, setNoted] = useState<HTMLElement | null>(null);
  const grid = useRef<HTMLDivElement>(null);
  const people = phone ? sheet.technicians.filter(({ id }) => id === person) : sheet.technicians;
  const standing = sheet.visits.filter((visit) => !visit.canceledAt);
  const instantOf = useCallback((row: number) => timeOf(sheet.rows[row]?.at ?? ""), [sheet.rows]);
  const cell = (at: Cursor) =>
    grid.current?.querySelector<HTMLElement>(`[data-row="${at.row}"][data-column="${at.column}"]`);

  useLayoutEffect(() => {
    const box = grid.current;
    const first = box?.querySelector<HTMLElement>(`[data-clock="${FIRST_CLOCK}"]`);
    if (box && first) box.scrollTop = first.offsetTop - 80;
  }, []);

  // A thing just taken up: the cursor goes to the first place where it can stand.
  const inHand = places !== undefined;
  const firstFree = useRef<() => void>(() => {});
  firstFree.current = () => {
    const opening = rowOf(sheet, FIRST_CLOCK);
    const to = firstFreePlace(sheet, people, places, opening) ?? { row: opening, column: 0 };
    setCursor(to);
    requestAnimationFrame(() => cell(to)?.focus());
  };
  useEffect(() => {
    if (inHand) firstFree.current();
    else setNoted(null);
  }, [inHand]);

  const choose = useCallback(
    (row: number, column: number) => {
      const lead = people[column];
      const at = instantOf(row);
      const place = places && placeAt(columnOf(places, lead?.id), at, ROW_MS);
      if (!places || !lead || !place) return;
      const start = places.starts.find((one) => timeOf(one.at) === at);
      if (place.state === "shut" || !start) toast.error("It cannot go there", { description: place.words });
      else onPlace({ lead: lead.id, startsLocal: start.local, liveBlocks: start.liveBlocks });
    },
    [people, places, instantOf, onPlace],
  );

  const onKeyDown = (event: React.KeyboardEvent) => {
    const { row, column } = cursor;
    const last = { row: sheet.rows.length - 1, column: people.length - 1 };
    if (event.key === "Escape" && onPutBack) return onPutBack();
    if (event.key === "Enter" || event.key === " ") {
      event.preventDefault();
      if (places) return choose(row, column);
      const visit = standing.find((one) => coversRow(one, people[column]?.id, instantOf(row)));
      return visit ? onOpen(visit) : undefined;
    }
    const moves: Record<string, Cursor> = {
      ArrowDown: { row: row + 1, column },
      ArrowUp: { row: row - 1, column },
      ArrowRight: { row, column: column + 1 },
      ArrowLeft: { row, column: column - 1 },
      PageDown: { row: row + 4, column },
      PageUp: { row: row - 4, column },
      Home: { row, column: 0 },
      End: { row, column: last.column },
    };
    const wish = moves[event.key];
    if (!wish) return;
    event.preventDefault();
    const clamp = (value: number, most: number) => Math.min(most, Math.max(0, value));
    const to = { row: clamp(wish.row, last.row), column: clamp(wish.column, last.column) };
    setCursor(to);
    cell(to)?.focus();
  };

  const step = (by: number) => {
    const i = sheet.technicians.findIndex(({ id }) => id === person);
    const next = sheet.technicians[(i + by + sheet.technicians.length) % sheet.technicians.length];
    if (next) setPerson(next.id);
  };

  return (
    <div className="grid gap-2">
      {phone && (
        <div className="flex items-center gap-2">
          <Button onClick={() => step(-1)} aria-label="Person before">
            ‹
          </Button>
          <Select
            aria-label="Whose day"
            value={person}
            onChange={(event) => setPerson(event.target.value)}
            className="grow"
          >
            {sheet.technicians.map(({ id, name }) => (
              <option key={id} value={id}>
                {name}
              </option>
            ))}
          </Select>
          <Button onClick={() => step(1)} aria-label="Person after">
            ›
          </Button>
        </div>
      )}
      <div
        ref={grid}
        className="relative max-h-[75dvh] overflow-auto rounded-md border border-line bg-surface"
        onPointerLeave={() => setNoted(null)}
      >
        <table
          // biome-ignore lint/a11y/noNoninteractiveElementToInteractiveRole: the pattern's own role for a table to walk in
          role="grid"
          aria-label="Visits by technician and time"
          className="w-full border-separate border-spacing-0"
          onKeyDown={onKeyDown}
        >
          <thead>
            <tr>
              <th className="sticky top-0 left-0 z-30 w-20 border-b border-line bg-surface px-2 py-1 text-left text-sm font-normal">
                Time
              </th>
              {people.map(({ id, name }) => (
                <th
                  key={id}
                  className="sticky top-0 z-20 min-w-44 border-b border-l border-line bg-surface px-2 py-1 text-left"
                >
                  {name}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {sheet.rows.map(({ at, clock }, row) => (
              <tr key={timeOf(at)} data-clock={clock} className="h-8">
                <WindowMark clock={clock} at={timeOf(at)} windows={places?.windows} />
                {people.map(({ id, name }, column) => (
                  <DayCell
                    key={id}
                    {...{ row, column, clock, name }}
                    at={timeOf(at)}
                    current={cursor.row === row && cursor.column === column}
                    place={places ? placeAt(columnOf(places, id), timeOf(at), ROW_MS) : null}
                    visits={standing.filter((visit) => beginsIn(visit, id, timeOf(at), row === 0))}
                    covered={standing.find((visit) => coversRow(visit, id, timeOf(at)))}
                    lifted={lifted}
                    onCursor={setCursor}
                    onChoose={choose}
                    onNote={setNoted}
                    onOpen={onOpen}
                  />
                ))}
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      {places && <PlaceNote at={noted} />}
    </div>
  );
}

const rowOf = (sheet: Sheet, clock: string): number =>
  Math.max(
    0,
    sheet.rows.findIndex((row) => row.clock === clock),
  );

/** The first person who can go, at the first time from the row on; else at any time. */
function firstFreePlace(sheet: Sheet, people: Sheet["technicians"], places: Places | undefined, from: number) {
  for (const least of [from, 0]) {
    for (const [column, { id }] of people.entries()) {
      const own = columnOf(places, id);
      const row = sheet.rows.findIndex(({ at }, i) => i >= least && placeAt(own, timeOf(at), ROW_MS)?.state === "free");
      if (row >= 0) return { row, column };
    }
  }
  return undefined;
}

const columnOf = (places: Places | undefined, memberId: string | undefined) =>
  places?.columns.find((column) => column.memberId === memberId);

const goes = (visit: SheetVisit, memberId: string | undefined) => visit.crew.some((one) => one.memberId === memberId);

/** A visit is drawn in the row in which it begins; one from the day before, in the first. */
const beginsIn = (visit: SheetVisit, memberId: string, at: number, firstRow: boolean): boolean => {
  const begins = timeOf(visit.startsAt);
  return goes(visit, memberId) && begins < at + ROW_MS && (begins >= at || (firstRow && timeOf(visit.endsAt) > at));
};

const coversRow = (visit: SheetVisit, memberId: string | undefined, at: number): boolean =>
  goes(visit, memberId) && timeOf(visit.startsAt) < at + ROW_MS && timeOf(visit.endsAt) > at;
