"use client";

import { useQuery } from "@tanstack/react-query";
import { useRef, useState } from "react";
import { EmptyState } from "@/components/ui/card";
import { placesQuery, type Sheet, type SheetVisit, sheetQuery } from "@/lib/queries/visits";
import { BookingPanel, type Spot } from "./booking-panel";
import { DayGrid } from "./day-grid";
import { type TakenUp, wantedOf } from "./taken-up";
import { TakenUpBar } from "./taken-up-bar";
import { Tray } from "./tray";
import { VisitPanel } from "./visit-panel";

/** A day of all crews: take a job up from the tray, and every place says whether it can go there and what it costs. */
export function RunSheet({ initial, mayWrite }: { initial: Sheet; mayWrite: boolean }) {
  const { data: sheet = initial } = useQuery(sheetQuery(initial.date, initial));
  const [taken, setTaken] = useState<TakenUp | null>(null);
  const [spot, setSpot] = useState<Spot | null>(null);
  const [open, setOpen] = useState<SheetVisit | null>(null);
  const cameFrom = useRef<HTMLElement | null>(null);
  const wish = taken && { ...wantedOf(taken), date: initial.date, helpers: taken.helpers, minutes: taken.minutes };
  const { data: places, error } = useQuery(placesQuery(wish));

  const takeUp = (what: TakenUp) => {
    cameFrom.current = document.activeElement instanceof HTMLElement ? document.activeElement : null;
    setTaken(what);
  };
  const putBack = () => {
    setTaken(null);
    setSpot(null);
    cameFrom.current?.focus();
  };

  if (sheet.technicians.length === 0)
    return <EmptyState title="No technicians yet">Invite them under People; then visits can be booked.</EmptyState>;
  return (
    <div className="grid items-start gap-4 xl:grid-cols-[18rem_1fr]">
      {mayWrite && (
        <Tray
          tray={sheet.tray}
          takenId={taken?.job?.id ?? null}
          onTake={(job) => takeUp({ job, helpers: [], minutes: job.visitMinutes })}
        />
      )}
      <div className="grid min-w-0 gap-3">
        {taken && (
          <TakenUpBar
            taken={taken}
            places={places}
            problem={error?.message}
            technicians={sheet.technicians}
            onChange={setTaken}
            onPutBack={putBack}
          />
        )}
        <DayGrid
          sheet={sheet}
          places={taken ? places : undefined}
          lifted={taken?.visit?.id}
          onPlace={setSpot}
          onOpen={setOpen}
          onPutBack={taken ? putBack : undefined}
        />
      </div>
      {taken && spot && places && (
        <BookingPanel
          taken={taken}
          spot={spot}
          places={places}
          technicians={sheet.technicians}
          onClose={() => setSpot(null)}
          onDone={() => {
            setSpot(null);
            setTaken(null);
          }}
        />
      )}
      {open && (
        <VisitPanel
          visit={open}
          others={sheet.visits.filter((visit) => visit.id !== open.id && !visit.canceledAt)}
          mayWrite={mayWrite}
          onClose={() => setOpen(null)}
          onMove={(visit, minutes) => {
            setOpen(null);
            takeUp({ visit, helpers: visit.crew.filter((one) => !one.lead).map((one) => one.memberId), minutes });
          }}
        />
      )}
    </div>
  );
}
