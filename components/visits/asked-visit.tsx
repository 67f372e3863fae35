import { Badge } from "@/components/ui/badge";
import { Callout } from "@/components/ui/card";
import { dateWords } from "@/lib/domain/shared/zone";
import { FUNCTION_WORDS, type SystemFunction } from "@/lib/domain/systems/words";
import { clockOf } from "@/lib/domain/visits/clock";
import { spanWords } from "@/lib/domain/visits/times";
import { ANSWER_WORDS, type Answer, CHANNEL_WORDS, type Channel } from "@/lib/domain/visits/words";

export type AskedVisit = {
  startsLocal: string;
  endsLocal: string;
  startsAt: Date;
  endsAt: Date;
  site: { name: string; street: string; city: string; state: string };
  job: { title: string };
  crew: { memberId: string; name: string; lead: boolean }[];
  liveBlocks: {
    functions: SystemFunction[];
    startsLocal: string;
    endsLocal: string;
    startsAt: Date;
    endsAt: Date;
    attendees: string[];
  }[];
};

const minutesOf = ({ startsAt, endsAt }: { startsAt: Date; endsAt: Date }) =>
  Math.round((endsAt.getTime() - startsAt.getTime()) / 60_000);

/** Everything that a building must know before it says yes. */
export function AskedVisitFacts({ visit }: { visit: AskedVisit }) {
  return (
    <div className="grid gap-3">
      <div>
        <p className="text-lg font-bold">{visit.job.title}</p>
        <p>
          {visit.site.name}, {visit.site.street}, {visit.site.city}, {visit.site.state}
        </p>
        <p className="figures font-semibold">{spanWords(visit)}</p>
        <p className="text-sm text-muted">By the clock at the site.</p>
      </div>
      {visit.liveBlocks.length === 0 && <p>No function operates: no horns sound, and no fan stops.</p>}
      {visit.liveBlocks.map((block) => (
        <div key={block.startsLocal + block.functions.join()} className="rounded-md border border-line p-3">
          <p className="font-semibold">
            What really operates, for <span className="figures">{minutesOf(block)}</span> minutes
          </p>
          <p className="figures">
            {clockOf(block.startsLocal)} to {clockOf(block.endsLocal)}
          </p>
          <ul className="list-disc pl-5">
            {block.functions.map((one) => (
              <li key={one}>{FUNCTION_WORDS[one]}</li>
            ))}
          </ul>
          {block.attendees.length > 0 && <p>Please have standing by: {block.attendees.join(", ")}</p>}
        </div>
      ))}
      {visit.crew.length > 0 && (
        <p>
          Who comes: {visit.crew.map((person) => (person.lead ? `${person.name} (leads)` : person.name)).join(", ")}
        </p>
      )}
    </div>
  );
}

export const VisitCaution = () => (
  <Callout tone="soon" title="Before anything operates">
    <p>
      Occupants and the supervising station are told beforehand, and again when it is over. Local codes and the
      authority having jurisdiction decide what may be done and when; the building decides whether people, patients or
      processes can live without what stops.
    </p>
  </Callout>
);

export type GivenAnswer = {
  name: string;
  answer: Answer | null;
  answeredAt: Date | null;
  channel: Channel | null;
  permitNumber: string | null;
  note: string | null;
};

/** What was answered, for those who come back or print it. */
export function AnswerGiven({ ask, on }: { ask: GivenAnswer; on: string | null }) {
  if (!ask.answer) return null;
  return (
    <div className="grid gap-1 rounded-md border border-line bg-surface p-4" role="status">
      <p className="flex flex-wrap items-center gap-2">
        <Badge tone={ask.answer === "acknowledged" ? "settled" : "alert"}>{ANSWER_WORDS[ask.answer]}</Badge>
        <span>
          {ask.name}
          {ask.channel && `, ${CHANNEL_WORDS[ask.channel]}`}
          {on && `, ${dateWords(on.slice(0, 10))}, ${clockOf(on)}`}
        </span>
      </p>
      {ask.permitNumber && (
        <p>
          Permit number <span className="figures">{ask.permitNumber}</span>
        </p>
      )}
      {ask.note && <p>“{ask.note}”</p>}
    </div>
  );
}
