import { Separator as Parts } from "radix-ui";
import { cn } from "./cn";

export function Separator({ className, orientation, ...props }: React.ComponentProps<typeof Parts.Root>) {
  return (
    <Parts.Root
      data-slot="separator"
      orientation={orientation}
      className={cn("bg-line", orientation === "vertical" ? "h-full w-px" : "h-px w-full", className)}
      {...props}
    />
  );
}
