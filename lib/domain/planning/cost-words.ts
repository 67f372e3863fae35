import { minutesWords } from "../visits/minutes-words";
import type { SlotCost } from "./cost";

/** What a place costs, short enough to stand in its band. */
export function costWords({ travel, tight, overtimeMinutes, daysLate }: SlotCost): string {
  return [
    travel ? `about ${travel.minutes} min from ${travel.from}` : "way unknown",
    tight && "the way takes longer than the gap",
    overtimeMinutes > 0 && `${minutesWords(overtimeMinutes)} over 8 h`,
    daysLate > 0 && `${daysLate} days past due`,
  ]
    .filter(Boolean)
    .join(", ");
}
