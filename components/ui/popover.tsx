"use client";

import { Popover as Parts } from "radix-ui";
import { cn } from "./cn";

export const Popover = Parts.Root;
export const PopoverTrigger = Parts.Trigger;

/** Give it an aria-label: it is a dialog to a screen reader. */
export function PopoverContent({ className, ...props }: React.ComponentProps<typeof Parts.Content>) {
  return (
    <Parts.Portal>
      <Parts.Content
        data-slot="popover"
        sideOffset={6}
        collisionPadding={8}
        className={cn("z-50 w-80 max-w-[92vw] rounded-lg border border-line bg-surface p-4 shadow-lg", className)}
        {...props}
      />
    </Parts.Portal>
  );
}
