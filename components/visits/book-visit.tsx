"use client";

import { useQuery } from "@tanstack/react-query";
import { useRouter } from "next/navigation";
import { useState } from "react";
import { toast } from "sonner";
import { Button } from "@/components/ui/button";
import { Input } from "@/components/ui/input";
import { Label } from "@/components/ui/label";
import { placesQuery, timeOf } from "@/lib/queries/visits";
import { BookingForm } from "./booking-form";
import { standingBy } from "./booking-panel";

/** Books a visit of one job from the job's own page: the first place of the day that nothing stands against is offered. */
export function BookVisit(props: { jobId: string; date: string }) {
  const [open, setOpen] = useState(false);
  if (!open)
    return (
      <Button variant="primary" className="justify-self-start" onClick={() => setOpen(true)}>
        Book a visit
      </Button>
    );
  return <Booking {...props} onClose={() => setOpen(false)} />;
}

function Booking({ jobId, date: first, onClose }: { jobId: string; date: string; onClose: () => void }) {
  const router = useRouter();
  const [date, setDate] = useState(first);
  const { data: places, error } = useQuery(placesQuery({ jobId, date, stepMinutes: 15 }));
  const offers = places?.columns.flatMap(({ memberId, bands }) =>
    bands.filter((band) => band.reasons.length === 0).map((band) => ({ lead: memberId, at: timeOf(band.from) })),
  );
  const best = offers?.sort((a, b) => a.at - b.at).find(({ at }) => at >= dawn(places?.starts[0]?.at));
  const start = places?.starts.find((one) => timeOf(one.at) === best?.at) ?? places?.starts.at(0);
  return (
    <div className="grid max-w-2xl gap-4">
      <div className="w-48">
        <Label htmlFor="book-date">Day</Label>
        <Input
          id="book-date"
          type="date"
          value={date}
          onChange={(event) => event.target.value && setDate(event.target.value)}
        />
      </div>
      {error && <p className="font-semibold text-alert">{error.message}</p>}
      {places && !best && (
        <p role="status">On that day something stands against every place; see below what, or take another day.</p>
      )}
      {places && start && (
        <BookingForm
          key={`${date} ${jobId}`}
          wanted={{ jobId }}
          places={places}
          technicians={places.columns.map(({ memberId, name }) => ({ id: memberId, name }))}
          initial={{
            startsLocal: start.local,
            minutes: places.minutes,
            crew: [best?.lead ?? places.columns[0]?.memberId ?? ""].filter(Boolean),
            liveBlocks: start.liveBlocks.map((block) => ({
              ...block,
              functions: [...block.functions],
              attendees: standingBy(places, block),
            })),
          }}
          onDone={(message) => {
            toast.success(message);
            onClose();
            router.refresh();
          }}
        />
      )}
    </div>
  );
}

const DAWN_MS = 6 * 3_600_000;
/** Nobody is sent out in the small hours unless somebody says so. */
const dawn = (midnight: string | undefined): number => (midnight ? timeOf(midnight) + DAWN_MS : 0);
