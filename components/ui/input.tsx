import { cn } from "./cn";

const look =
  "w-full min-h-10 rounded-md border border-field-line bg-surface px-3 py-2 text-text placeholder:text-muted aria-invalid:border-alert aria-invalid:border-2";

export function Input({ className, ...props }: React.ComponentProps<"input">) {
  return <input data-slot="input" className={cn(look, className)} {...props} />;
}

export function Textarea({ className, ...props }: React.ComponentProps<"textarea">) {
  return <textarea data-slot="textarea" className={cn(look, "min-h-24", className)} {...props} />;
}

/** The platform's own list: on a phone nothing is easier to hit. */
export function Select({ className, ...props }: React.ComponentProps<"select">) {
  return <select data-slot="select" className={cn(look, className)} {...props} />;
}
