"use client";

import { Ellipsis } from "lucide-react";
import { useState } from "react";
import { Dialog, DialogTrigger, SheetContent } from "@/components/ui/dialog";
import { type NavItem, NavLinks } from "./nav-links";

const SHOWN = 4;

/** Under the thumb: the first few pages, and a drawer with all of them. */
export function PhoneNav({ items }: { items: readonly NavItem[] }) {
  const [open, setOpen] = useState(false);
  const all = items.length <= SHOWN + 1;
  return (
    <nav
      aria-label="Main"
      data-print="off"
      className="fixed inset-x-0 bottom-0 z-30 border-t border-line bg-surface pb-[env(safe-area-inset-bottom)] lg:hidden"
    >
      <NavLinks items={all ? items : items.slice(0, SHOWN)} look="bar" className="flex">
        {!all && (
          <li className="min-w-0 flex-1">
            <Dialog open={open} onOpenChange={setOpen}>
              <DialogTrigger className="flex min-h-14 w-full cursor-pointer flex-col items-center justify-center gap-0.5 px-1 text-sm text-muted -outline-offset-2">
                <Ellipsis aria-hidden className="size-5" />
                More
              </DialogTrigger>
              <SheetContent side="bottom" title="All pages">
                <nav aria-label="All pages">
                  <NavLinks items={items} onGo={() => setOpen(false)} className="grid grid-cols-2 gap-1" />
                </nav>
              </SheetContent>
            </Dialog>
          </li>
        )}
      </NavLinks>
    </nav>
  );
}
