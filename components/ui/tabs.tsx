"use client";

import { Tabs as Parts } from "radix-ui";
import { cn } from "./cn";

/** The look of a tab, also of the links between sibling pages. */
export const tabLook =
  "inline-flex min-h-10 cursor-pointer items-center gap-2 border-b-3 border-transparent px-3 font-semibold whitespace-nowrap text-muted hover:text-text data-[state=active]:border-settled data-[state=active]:text-text aria-[current=page]:border-settled aria-[current=page]:text-text";

export const tabBarLook = "flex gap-1 overflow-x-auto border-b border-line";

export const Tabs = Parts.Root;

export function TabsList({ className, ...props }: React.ComponentProps<typeof Parts.List>) {
  return <Parts.List data-slot="tabs" className={cn(tabBarLook, className)} {...props} />;
}

export function TabsTrigger({ className, ...props }: React.ComponentProps<typeof Parts.Trigger>) {
  return <Parts.Trigger className={cn(tabLook, "-outline-offset-3", className)} {...props} />;
}

export function TabsContent({ className, ...props }: React.ComponentProps<typeof Parts.Content>) {
  return <Parts.Content className={cn("pt-4", className)} {...props} />;
}
