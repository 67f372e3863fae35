import { cn } from "./cn";

export function Kbd({ className, ...props }: React.ComponentProps<"kbd">) {
  return (
    <kbd
      data-slot="kbd"
      className={cn("figures rounded border border-field-line bg-ground px-1.5 py-px text-sm text-muted", className)}
      {...props}
    />
  );
}
