import { coastPath } from "./coast-path";

const CURVE = coastPath({ left: 5.5, top: 4, width: 22.5, height: 22.5 }, 3.4);

/** The mark: what a fan's speed does after its power is cut. */
export function Mark({ className }: { className?: string }) {
  return (
    <svg viewBox="0 0 32 32" className={className} aria-hidden="true" fill="none" stroke="currentColor">
      <path d="M3 3v26h26" strokeWidth="1.75" className="text-muted" />
      <path d={CURVE} strokeWidth="3" strokeLinecap="round" className="text-settled" />
    </svg>
  );
}

const WIDE = coastPath({ left: 0, top: 0, width: 100, height: 96 }, 4.2);

/** The same curve, faint and wide, as the ground of a calm page. */
export function CoastBackdrop({ className }: { className?: string }) {
  return (
    <svg viewBox="0 0 100 100" preserveAspectRatio="none" className={className} aria-hidden="true" fill="none">
      <path d={`${WIDE}V100H0Z`} className="fill-sunken" />
      <path d={WIDE} className="stroke-line" strokeWidth="2" vectorEffect="non-scaling-stroke" />
    </svg>
  );
}
