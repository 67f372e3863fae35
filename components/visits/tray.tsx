"use client";

import { useRef, useState } from "react";
import { Badge } from "@/components/ui/badge";
import { EmptyState } from "@/components/ui/card";
import { cn } from "@/components/ui/cn";
import { Input } from "@/components/ui/input";
import { JOB_KIND_WORDS, WAITS_FOR_WORDS } from "@/lib/domain/jobs/words";
import { minutesWords } from "@/lib/domain/visits/minutes-words";
import type { Sheet, TrayJob } from "@/lib/queries/visits";

type Props = { tray: Sheet["tray"]; takenId: string | null; onTake: (job: TrayJob) => void };

/** Jobs to book, those first whose time runs out first. One stop of the Tab key; arrows go through the list. */
export function Tray({ tray, takenId, onTake }: Props) {
  const [at, setAt] = useState(0);
  const [q, setQ] = useState("");
  const shown = tray.jobs.filter((job) => wordsOf(job).includes(q.trim().toLowerCase()));
  const list = useRef<HTMLOListElement>(null);
  const go = (event: React.KeyboardEvent, i: number) => {
    const to = { ArrowDown: i + 1, ArrowUp: i - 1, Home: 0, End: shown.length - 1 }[event.key];
    if (to === undefined || !shown[to]) return;
    event.preventDefault();
    setAt(to);
    list.current?.querySelectorAll<HTMLElement>("button")[to]?.focus();
  };
  return (
    <section aria-labelledby="tray" className="grid content-start gap-2 xl:sticky xl:top-18" data-print="off">
      <h2 id="tray" className="text-lg font-bold">
        To book <span className="figures font-normal text-muted">{tray.total}</span>
      </h2>
      <p className="text-sm text-muted">Take one up with a click or Enter, then choose a place. Esc puts it back.</p>
      {tray.jobs.length === 0 && (
        <EmptyState title="Nothing waits to be booked">Jobs appear here as soon as they are made.</EmptyState>
      )}
      {tray.jobs.length > 0 && (
        <Input
          type="search"
          aria-label="Site, number or words of a job"
          placeholder="Site, number or words"
          value={q}
          onChange={(event) => setQ(event.target.value)}
        />
      )}
      {tray.jobs.length > 0 && shown.length === 0 && <p className="text-sm text-muted">No job to book says that.</p>}
      <ol ref={list} className="grid max-h-[40dvh] gap-2 overflow-y-auto p-1 xl:max-h-[70dvh]">
        {shown.map((job, i) => (
          <li key={job.id}>
            <button
              type="button"
              tabIndex={i === Math.min(at, shown.length - 1) ? 0 : -1}
              aria-pressed={takenId === job.id}
              onKeyDown={(event) => go(event, i)}
              onFocus={() => setAt(i)}
              onClick={() => onTake(job)}
              className={cn(
                "grid w-full cursor-pointer gap-1 rounded-md border border-line bg-surface p-2 text-left hover:border-text",
                takenId === job.id && "border-settled bg-settled-soft",
              )}
            >
              <span className="font-semibold">{job.site.name}</span>
              <span className="text-sm">
                {JOB_KIND_WORDS[job.kind]} <span className="figures">{job.number}</span>: {job.title}
              </span>
              <span className="text-sm text-muted">
                {minutesWords(job.visitMinutes)}
                {job.crewSize > 1 && `, ${job.crewSize} people`}
              </span>
              <span className="flex flex-wrap gap-1">
                {job.urgent && <Badge tone="alert">Urgent</Badge>}
                <DueBadge job={job} />
                {job.waitsFor.map((what) => (
                  <Badge key={what} tone="soon">
                    Waits for {WAITS_FOR_WORDS[what]}
                  </Badge>
                ))}
              </span>
            </button>
          </li>
        ))}
      </ol>
      {tray.total > tray.jobs.length && <p className="text-sm text-muted">The first {tray.jobs.length} are shown.</p>}
    </section>
  );
}

const wordsOf = ({ number, title, site }: TrayJob): string =>
  `${number} ${title} ${site.name} ${site.city}`.toLowerCase();

const SOON_DAYS = 14;

function DueBadge({ job: { daysLeft, ends, opens } }: { job: TrayJob }) {
  if (daysLeft === null) return <Badge>No due date</Badge>;
  if (daysLeft < 0) return <Badge tone="alert">{-daysLeft} days past due</Badge>;
  if (opens) return <Badge>Opens {opens}</Badge>;
  const words = daysLeft === 0 ? "Ends today" : daysLeft === 1 ? "1 day left" : `${daysLeft} days left`;
  return (
    <Badge tone={daysLeft <= SOON_DAYS ? "soon" : "neutral"} title={`Due by ${ends}`}>
      {words}
    </Badge>
  );
}
