import { Progress as Parts } from "radix-ui";
import { cn } from "./cn";

type ProgressProps = { label: string; value: number; max: number; className?: string };

/** How far long work is: a bar, and the count in words. */
export function Progress({ label, value, max, className }: ProgressProps) {
  const share = max > 0 ? Math.min(1, value / max) : 0;
  return (
    <div data-slot="progress" className={cn("grid gap-1", className)}>
      <div className="flex justify-between gap-3 text-sm">
        <span>{label}</span>
        <span className="figures">
          {value} of {max}
        </span>
      </div>
      <Parts.Root
        aria-label={label}
        value={Math.min(value, max)}
        max={max > 0 ? max : 1}
        className="h-2 overflow-hidden rounded-full bg-line"
      >
        <Parts.Indicator className="h-full rounded-full bg-settled" style={{ width: `${share * 100}%` }} />
      </Parts.Root>
    </div>
  );
}
