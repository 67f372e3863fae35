import { type LocalTime, toInstant, toLocalTime, type Zone } from "../shared/zone";
import type { SlotReason, Span } from "../visits/slot";
import type { SlotCost } from "./cost";

export type Start = { at: Date; local: LocalTime };

/**
 * Starts at even steps through a span. A wall clock reading that occurs twice means its first occurrence, so the second
 * cannot be promised to anybody and is left out.
 */
export function startsOf({ startsAt, endsAt }: Span, stepMinutes: number, zone: Zone): Start[] {
  const starts: Start[] = [];
  for (let at = startsAt.getTime(); at < endsAt.getTime(); at += stepMinutes * 60_000) {
    const start = { at: new Date(at), local: toLocalTime(new Date(at), zone) };
    if (toInstant(start.local, zone).getTime() === at) starts.push(start);
  }
  return starts;
}

/** Starts one after another of which the same is to be said; `from` and `to` are the first and the last of them. */
export type Band = { from: Date; to: Date; reasons: SlotReason[]; cost: SlotCost };

export function bandsOf(judged: readonly (Start & { reasons: SlotReason[]; cost: SlotCost })[]): Band[] {
  const bands: Band[] = [];
  let key = "";
  for (const { at, reasons, cost } of judged) {
    const own = JSON.stringify([reasons, cost]);
    const last = bands.at(-1);
    if (last && own === key) last.to = at;
    else bands.push({ from: at, to: at, reasons, cost });
    key = own;
  }
  return bands;
}
