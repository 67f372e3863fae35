"use client";

import { cn } from "@/components/ui/cn";
import { JOB_KIND_WORDS } from "@/lib/domain/jobs/words";
import { clockOf } from "@/lib/domain/visits/clock";
import { type SheetVisit, timeOf } from "@/lib/queries/visits";

const ROW_REM = 2;
const REM_PER_MS = ROW_REM / (30 * 60_000);

type Props = { visit: SheetVisit; rowAt: number; faded: boolean; lifted: boolean; onOpen: () => void };

/** A glyph and a word for what the building said. */
export function answerWords(asks: SheetVisit["asks"]): string | null {
  if (asks.length === 0) return null;
  if (asks.some((ask) => ask.answer === "declined")) return "✕ declined";
  if (asks.some((ask) => ask.answer === "acknowledged")) return "✓ acknowledged";
  return "… asked";
}

/** A visit as long as it takes, its live blocks striped at its edge. */
export function VisitBlock({ visit, rowAt, faded, lifted, onOpen }: Props) {
  const starts = Math.max(timeOf(visit.startsAt), rowAt);
  const top = (starts - rowAt) * REM_PER_MS;
  const height = (timeOf(visit.endsAt) - starts) * REM_PER_MS;
  const answer = answerWords(visit.asks);
  return (
    <button
      type="button"
      tabIndex={-1}
      onClick={(event) => {
        if (faded) return;
        event.stopPropagation();
        onOpen();
      }}
      style={{ top: `${top}rem`, height: `${height}rem` }}
      className={cn(
        "absolute inset-x-1 z-[4] flex cursor-pointer flex-col items-start overflow-hidden rounded-md border border-line border-l-4 border-l-settled bg-surface px-2 py-0.5 text-left text-sm leading-tight shadow-sm hover:border-text",
        answer?.includes("declined") && "border-l-alert",
        faded && "pointer-events-none opacity-60",
        lifted && "border-dashed",
      )}
    >
      <span className="figures block">
        {clockOf(visit.startsLocal)}–{clockOf(visit.endsLocal)}
      </span>
      <span className="block font-semibold">{visit.site.name}</span>
      <span className="block">
        {JOB_KIND_WORDS[visit.job.kind]} <span className="figures">{visit.job.number}</span>
      </span>
      {visit.crew.length > 1 && (
        <span className="block text-muted">{visit.crew.map((one) => one.name.split(" ")[0]).join(" + ")}</span>
      )}
      {answer && <span className={cn("block", answer.includes("declined") && "text-alert")}>{answer}</span>}
      {visit.liveBlocks.map((block) => (
        <span
          key={block.startsLocal + block.functions.join()}
          title={`Live ${clockOf(block.startsLocal)} to ${clockOf(block.endsLocal)}`}
          className="absolute right-0 w-1.5 rounded-l bg-soon"
          style={{
            top: `${(timeOf(block.startsAt) - starts) * REM_PER_MS}rem`,
            height: `${(timeOf(block.endsAt) - timeOf(block.startsAt)) * REM_PER_MS}rem`,
          }}
        />
      ))}
    </button>
  );
}
