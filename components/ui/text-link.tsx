import Link from "next/link";
import { cn } from "./cn";

/** A link among words or in a cell. */
export function TextLink({ className, ...props }: React.ComponentProps<typeof Link>) {
  return (
    <Link
      data-slot="text-link"
      className={cn(
        "font-semibold underline decoration-line decoration-2 underline-offset-4 hover:decoration-text",
        className,
      )}
      {...props}
    />
  );
}
