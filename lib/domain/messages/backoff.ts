/** After this many failed attempts people have to look. */
export const MOST_ATTEMPTS = 8;

const FIRST_SECONDS = 5;
const LONGEST_SECONDS = 3600;

/** Seconds until the next attempt, doubling from 5 s to an hour; null when there have been enough. */
export function secondsUntilRetry(attempts: number): number | null {
  if (attempts >= MOST_ATTEMPTS) return null;
  return Math.min(LONGEST_SECONDS, FIRST_SECONDS * 2 ** Math.max(0, attempts - 1));
}
