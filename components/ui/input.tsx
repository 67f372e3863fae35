import { ChevronDown } from "lucide-react";
import { cn } from "./cn";

const look =
  "w-full min-h-10 rounded-md border border-field-line bg-surface px-3 py-1.5 text-text placeholder:text-muted hover:border-text disabled:cursor-not-allowed disabled:bg-sunken disabled:text-muted [&[readonly]]:bg-sunken aria-invalid:border-alert aria-invalid:shadow-[inset_0_0_0_1px_var(--ember)] max-sm:text-base pointer-coarse:min-h-12";

export function Input({ className, ...props }: React.ComponentProps<"input">) {
  return <input data-slot="input" className={cn(look, className)} {...props} />;
}

export function Textarea({ className, ...props }: React.ComponentProps<"textarea">) {
  return <textarea data-slot="textarea" className={cn(look, "field-sizing-content min-h-24", className)} {...props} />;
}

/** The platform's own list: on a phone nothing is easier to hit. */
export function Select({ className, ...props }: React.ComponentProps<"select">) {
  return (
    <span data-slot="select" className={cn("relative block", className)}>
      <select className={cn(look, "cursor-pointer appearance-none bg-surface pr-9")} {...props} />
      <ChevronDown
        aria-hidden
        className="pointer-events-none absolute top-1/2 right-3 size-4 -translate-y-1/2 text-muted"
      />
    </span>
  );
}
