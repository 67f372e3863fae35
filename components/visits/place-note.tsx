"use client";

import { createPortal } from "react-dom";

const WIDTH = 288;
const GAP = 8;

/** What a place says, beside the pointer's or the cursor's cell. The cell's own name carries the same words. */
export function PlaceNote({ at }: { at: HTMLElement | null }) {
  const words = at?.dataset.words;
  if (!at || !words) return null;
  const box = at.getBoundingClientRect();
  const right = box.right + GAP + WIDTH <= window.innerWidth;
  const left = right ? box.right + GAP : Math.max(GAP, Math.min(box.left, window.innerWidth - WIDTH - GAP));
  const top = right ? box.top : box.bottom + GAP;
  return createPortal(
    <div
      aria-hidden
      className="pointer-events-none fixed z-30 rounded-md border border-line border-l-4 border-l-settled bg-surface px-3 py-2 text-sm shadow-lg"
      style={{ left, top: Math.min(top, window.innerHeight - 120), width: WIDTH }}
    >
      <p className="font-semibold">
        {at.dataset.glyph} {at.dataset.state}
      </p>
      <p>{words}</p>
    </div>,
    document.body,
  );
}
