import { historyWords, whoWords } from "@/lib/domain/jobs/history-words";
import { toLocalTime } from "@/lib/domain/shared/zone";

type Entry = { id: string; at: Date; command: string; actorKind: string; person: string | null };

export function JobHistory({ history, zone }: { history: readonly Entry[]; zone: string }) {
  return (
    <ol className="grid gap-1">
      {history.map((entry) => (
        <li key={entry.id} className="grid gap-x-4 sm:grid-cols-[max-content_1fr]">
          <span className="figures text-sm text-muted">{toLocalTime(entry.at, zone).replace("T", " ")}</span>
          <span>
            {historyWords(entry.command)}, <span className="text-muted">{whoWords(entry.person, entry.actorKind)}</span>
          </span>
        </li>
      ))}
    </ol>
  );
}
