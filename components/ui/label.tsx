import { cn } from "./cn";

export function Label({ className, ...props }: React.ComponentProps<"label">) {
  // biome-ignore lint/a11y/noLabelWithoutControl: the caller passes htmlFor
  return <label data-slot="label" className={cn("font-semibold", className)} {...props} />;
}
