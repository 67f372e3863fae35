"use client";

import { useQuery } from "@tanstack/react-query";
import Link from "next/link";
import { Badge } from "@/components/ui/badge";
import { Button } from "@/components/ui/button";
import { Dialog, SheetContent } from "@/components/ui/dialog";
import { JOB_KIND_WORDS } from "@/lib/domain/jobs/words";
import { paths } from "@/lib/domain/shared/paths";
import { FUNCTION_WORDS } from "@/lib/domain/systems/words";
import { clockOf } from "@/lib/domain/visits/clock";
import { ANSWER_WORDS, CHANNEL_WORDS } from "@/lib/domain/visits/words";
import { type SheetVisit, timeOf, type VisitDetails, visitQuery } from "@/lib/queries/visits";
import { AskPeople } from "./ask-people";
import { CancelVisit } from "./cancel-visit";
import { RecordAnswer } from "./record-answer";
import { SwapVisits } from "./swap-visits";
import { usePhone } from "./use-phone";

type Props = {
  visit: SheetVisit;
  others: SheetVisit[];
  mayWrite: boolean;
  onClose: () => void;
  onMove: (visit: SheetVisit, minutes: number) => void;
};

/** One booked visit: what was promised to whom, and what can become of it. */
export function VisitPanel({ visit, others, mayWrite, onClose, onMove }: Props) {
  const phone = usePhone();
  const { data: details, error } = useQuery(visitQuery(visit.id));
  const minutes = (timeOf(visit.endsAt) - timeOf(visit.startsAt)) / 60_000;
  return (
    <Dialog open onOpenChange={(open) => !open && onClose()}>
      <SheetContent
        side={phone ? "bottom" : "right"}
        title={visit.site.name}
        description={`${visit.startsLocal.replace("T", " ")} to ${clockOf(visit.endsLocal)}`}
      >
        <p>
          <Link href={paths.job(visit.job.id)} className="underline">
            {JOB_KIND_WORDS[visit.job.kind]} <span className="figures">{visit.job.number}</span>
          </Link>
          : {visit.job.title}
        </p>
        <p>{visit.crew.map((one) => (one.lead ? `${one.name} (leads)` : one.name)).join(", ")}</p>
        {visit.liveBlocks.map((block) => (
          <p key={block.startsLocal + block.functions.join()}>
            Live <span className="figures">{`${clockOf(block.startsLocal)}–${clockOf(block.endsLocal)}`}</span>:{" "}
            {block.functions.map((one) => FUNCTION_WORDS[one]).join(", ")}
            {block.attendees.length > 0 && `; standing by: ${block.attendees.join(", ")}`}
          </p>
        ))}
        {error && <p className="font-semibold text-alert">{error.message}</p>}
        {details && <Asks details={details} />}
        {details?.overrides.map((override) => (
          <p key={override.id} className="text-sm">
            Gone past by {override.by}: {override.words}. “{override.note}”
          </p>
        ))}
        {mayWrite && details && (
          <div className="grid gap-3 border-t border-line pt-3">
            <Button variant="primary" onClick={() => onMove({ ...visit, sequence: details.sequence }, minutes)}>
              Move
            </Button>
            <AskPeople visit={details} />
            <RecordAnswer visit={details} />
            <SwapVisits visit={visit} others={others} onDone={onClose} />
            <CancelVisit visit={visit} onDone={onClose} />
          </div>
        )}
      </SheetContent>
    </Dialog>
  );
}

function Asks({ details }: { details: VisitDetails }) {
  const now = details.asks.filter((ask) => ask.sequence === details.sequence);
  if (now.length === 0) return <p className="text-muted">Nobody has been asked to agree yet.</p>;
  return (
    <ul className="grid gap-2">
      {now.map((ask) => (
        <li key={ask.id} className="grid gap-0.5">
          <span className="flex flex-wrap items-center gap-2">
            {ask.answer ? (
              <Badge tone={ask.answer === "acknowledged" ? "settled" : "alert"}>{ANSWER_WORDS[ask.answer]}</Badge>
            ) : (
              <Badge tone="soon">{ask.email ? "Asked, no answer yet" : "To be called"}</Badge>
            )}
            {ask.name}
          </span>
          {ask.answer && (
            <span className="text-sm text-muted">
              {ask.channel && CHANNEL_WORDS[ask.channel]}
              {ask.recordedBy && `, written down by ${ask.recordedBy}`}
              {ask.permitNumber && `, permit ${ask.permitNumber}`}
              {ask.note && `. “${ask.note}”`}
            </span>
          )}
        </li>
      ))}
    </ul>
  );
}
