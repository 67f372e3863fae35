"use client";

import { useRef } from "react";
import { toast } from "sonner";
import { Dialog, SheetContent } from "@/components/ui/dialog";
import type { LiveBlock } from "@/lib/domain/visits/slot";
import type { Places, Sheet } from "@/lib/queries/visits";
import { BookingForm } from "./booking-form";
import { type TakenUp, titleOf, wantedOf } from "./taken-up";
import { usePhone } from "./use-phone";

/** The place that was chosen for what is in the hand. */
export type Spot = { lead: string; startsLocal: string; liveBlocks: readonly LiveBlock[] };

type Props = {
  taken: TakenUp;
  spot: Spot;
  places: Places;
  technicians: Sheet["technicians"];
  onClose: () => void;
  onDone: () => void;
};

/** Says once more what is about to be promised; Enter books it. */
export function BookingPanel({ taken, spot, places, technicians, onClose, onDone }: Props) {
  const phone = usePhone();
  const book = useRef<HTMLButtonElement>(null);
  const was = taken.visit?.liveBlocks.flatMap((block) => block.attendees) ?? [];
  return (
    <Dialog open onOpenChange={(open) => !open && onClose()}>
      <SheetContent
        side={phone ? "bottom" : "right"}
        title={taken.visit ? "Move the visit" : "Book the visit"}
        description={titleOf(taken)}
        onOpenAutoFocus={(event) => {
          event.preventDefault();
          book.current?.focus();
        }}
      >
        <BookingForm
          wanted={wantedOf(taken)}
          sequence={taken.visit?.sequence}
          places={places}
          technicians={technicians}
          initial={{
            startsLocal: spot.startsLocal,
            minutes: taken.minutes,
            crew: [spot.lead, ...taken.helpers.filter((id) => id !== spot.lead)],
            liveBlocks: spot.liveBlocks.map((block) => ({
              ...block,
              functions: [...block.functions],
              attendees: was.length > 0 ? [...new Set(was)] : standingBy(places, block),
            })),
          }}
          button={book}
          onDone={(message) => {
            toast.success(message);
            onDone();
          }}
        />
      </SheetContent>
    </Dialog>
  );
}

/** Whom the site wants there while these functions operate. */
export const standingBy = ({ standBy }: Places, block: LiveBlock): string[] =>
  standBy.filter(({ functions }) => functions.some((one) => block.functions.includes(one))).map(({ party }) => party);
