"use client";

import { Search } from "lucide-react";
import { Dialog } from "radix-ui";
import { useEffect, useState } from "react";
import { Button } from "@/components/ui/button";
import { FindPanel } from "./find-panel";
import { isTyping } from "./is-typing";

/** One search from anywhere: `/` or Ctrl+K. */
export function FindButton() {
  const [open, setOpen] = useState(false);
  useEffect(() => {
    const onKey = (event: KeyboardEvent) => {
      const chord = (event.ctrlKey || event.metaKey) && event.key.toLowerCase() === "k";
      if (!chord && (event.key !== "/" || isTyping(event.target))) return;
      event.preventDefault();
      setOpen(true);
    };
    window.addEventListener("keydown", onKey);
    return () => window.removeEventListener("keydown", onKey);
  }, []);
  return (
    <Dialog.Root open={open} onOpenChange={setOpen}>
      <Dialog.Trigger asChild>
        <Button>
          <Search aria-hidden className="size-4" />
          Find
          <kbd className="figures rounded border border-line px-1 text-sm text-muted max-sm:hidden">/</kbd>
        </Button>
      </Dialog.Trigger>
      <Dialog.Portal>
        <Dialog.Overlay className="fixed inset-0 z-40 bg-text/40" />
        <Dialog.Content
          aria-describedby={undefined}
          className="fixed inset-x-3 top-[8vh] z-50 mx-auto grid max-h-[84vh] max-w-2xl grid-rows-[auto_1fr] gap-3 rounded-lg border border-line bg-surface p-4"
        >
          <Dialog.Title className="sr-only">Find</Dialog.Title>
          <FindPanel onGo={() => setOpen(false)} />
        </Dialog.Content>
      </Dialog.Portal>
    </Dialog.Root>
  );
}
