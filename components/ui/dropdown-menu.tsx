"use client";

import { Check } from "lucide-react";
import { DropdownMenu as Parts } from "radix-ui";
import { cn } from "./cn";

export const DropdownMenu = Parts.Root;
export const DropdownMenuTrigger = Parts.Trigger;
export const DropdownMenuRadioGroup = Parts.RadioGroup;

const item =
  "flex min-h-10 w-full cursor-pointer items-center gap-2 rounded px-3 text-left outline-none select-none data-disabled:cursor-not-allowed data-disabled:opacity-60 data-highlighted:bg-sunken pointer-coarse:min-h-12";

export function DropdownMenuContent({ className, ...props }: React.ComponentProps<typeof Parts.Content>) {
  return (
    <Parts.Portal>
      <Parts.Content
        data-slot="dropdown-menu"
        sideOffset={6}
        collisionPadding={8}
        className={cn("z-50 min-w-52 rounded-lg border border-line bg-surface p-1 shadow-lg", className)}
        {...props}
      />
    </Parts.Portal>
  );
}

export function DropdownMenuItem({
  className,
  danger,
  ...props
}: React.ComponentProps<typeof Parts.Item> & { danger?: boolean }) {
  return <Parts.Item data-slot="menu-item" className={cn(item, danger && "text-alert", className)} {...props} />;
}

export function DropdownMenuRadioItem({ className, children, ...props }: React.ComponentProps<typeof Parts.RadioItem>) {
  return (
    <Parts.RadioItem data-slot="menu-radio" className={cn(item, className)} {...props}>
      <span className="grid size-4 place-items-center">
        <Parts.ItemIndicator>
          <Check aria-hidden className="size-4" />
        </Parts.ItemIndicator>
      </span>
      {children}
    </Parts.RadioItem>
  );
}

export const DropdownMenuLabel = ({ className, ...props }: React.ComponentProps<typeof Parts.Label>) => (
  <Parts.Label className={cn("px-3 py-1.5 text-sm text-muted", className)} {...props} />
);

export const DropdownMenuSeparator = () => <Parts.Separator className="my-1 h-px bg-line" />;
