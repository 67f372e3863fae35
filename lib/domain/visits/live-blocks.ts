import type { SystemFunction } from "@/lib/domain/systems/words";
import type { OpenTimes } from "./site-reasons";
import { type LiveBlock, spanFrom, within } from "./slot";

export const LIVE_STEP_MINUTES = 15;
/** How long functions operate where nobody has said it. */
export const LIVE_MINUTES = 60;

/** Functions that the same windows allow can operate together; others need a block of their own. */
function groups(functions: readonly SystemFunction[], { spans }: OpenTimes): SystemFunction[][] {
  const byWindows = new Map<string, SystemFunction[]>();
  for (const one of functions) {
    const key = spans.map((open) => (open.functions.includes(one) ? "1" : "0")).join("");
    byWindows.set(key, [...(byWindows.get(key) ?? []), one]);
  }
  return [...byWindows.values()];
}

/** Live blocks for a visit that starts then, each at the first time within the visit that a window allows. */
export function proposedLiveBlocks(
  visit: { minutes: number; functions: readonly SystemFunction[]; liveMinutes?: number },
  startsAt: Date,
  windows: OpenTimes,
): LiveBlock[] {
  const minutes = Math.min(visit.liveMinutes ?? LIVE_MINUTES, visit.minutes);
  return groups(visit.functions, windows).map((functions) => {
    const fits = (offsetMinutes: number) => {
      const live = spanFrom(new Date(startsAt.getTime() + offsetMinutes * 60_000), minutes);
      return functions.every((one) => windows.spans.some((open) => open.functions.includes(one) && within(live, open)));
    };
    const steps = Math.floor((visit.minutes - minutes) / LIVE_STEP_MINUTES);
    const offsets = Array.from({ length: steps + 1 }, (_, i) => i * LIVE_STEP_MINUTES);
    return { offsetMinutes: offsets.find(fits) ?? 0, minutes, functions };
  });
}
