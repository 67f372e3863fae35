"use client";

import { cn } from "@/components/ui/cn";
import { FUNCTION_WORDS } from "@/lib/domain/systems/words";
import { type Places, timeOf } from "@/lib/queries/visits";

/** The clock of a row, marked while the site of what is in the hand lets functions operate. */
export function WindowMark({ clock, at, windows = [] }: { clock: string; at: number; windows?: Places["windows"] }) {
  const open = windows.filter(({ startsAt, endsAt }) => timeOf(startsAt) <= at && at < timeOf(endsAt));
  const opens = open.filter(({ startsAt }) => timeOf(startsAt) === at);
  const words = [...new Set(open.flatMap(({ functions }) => functions.map((one) => FUNCTION_WORDS[one])))].join(", ");
  return (
    <th
      scope="row"
      title={open.length > 0 ? `Window: ${words}` : undefined}
      className={cn(
        "figures sticky left-0 z-10 w-20 border-r-4 border-r-transparent bg-surface px-2 text-left align-top text-sm font-normal",
        clock.endsWith(":00") ? "border-t border-t-line" : "text-muted",
        open.length > 0 && "border-r-soon bg-soon-soft",
      )}
    >
      {clock}
      {opens.length > 0 && <span className="block truncate font-sans text-xs leading-none">window</span>}
      {open.length > 0 && <span className="sr-only">, window for {words}</span>}
    </th>
  );
}
