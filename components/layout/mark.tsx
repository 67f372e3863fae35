/** The mark: what a fan's speed does after its power is cut. */
export function Mark({ className }: { className?: string }) {
  return (
    <svg viewBox="0 0 32 32" className={className} aria-hidden="true" fill="none" stroke="currentColor">
      <path d="M4 4v24h24" strokeWidth="2" opacity="0.45" />
      <path d="M4 6c3 13 9 19.5 23 20.5" strokeWidth="3" strokeLinecap="round" className="text-settled" />
    </svg>
  );
}
