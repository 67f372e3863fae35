"use client";

import { Tooltip as Parts } from "radix-ui";

/** A word of help on hover and on focus. Nothing that a finger could need may stand only here. */
export function Tooltip({ text, children }: { text: string; children: React.ReactElement }) {
  return (
    <Parts.Provider delayDuration={300}>
      <Parts.Root>
        <Parts.Trigger asChild>{children}</Parts.Trigger>
        <Parts.Portal>
          <Parts.Content
            data-slot="tooltip"
            sideOffset={6}
            collisionPadding={8}
            className="z-50 max-w-64 rounded-md bg-text px-3 py-1.5 text-sm text-ground"
          >
            {text}
          </Parts.Content>
        </Parts.Portal>
      </Parts.Root>
    </Parts.Provider>
  );
}
