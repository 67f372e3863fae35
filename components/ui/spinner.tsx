import { LoaderCircle } from "lucide-react";
import { cn } from "./cn";

/** With a label it speaks for itself; without one the words beside it do. */
export function Spinner({ label, className }: { label?: string; className?: string }) {
  return (
    <span data-slot="spinner" role={label ? "status" : undefined} className="inline-flex items-center gap-2">
      <LoaderCircle aria-hidden className={cn("size-4 animate-spin", className)} />
      {label}
    </span>
  );
}
