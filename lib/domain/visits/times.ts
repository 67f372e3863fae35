import { dateWords, type LocalTime } from "../shared/zone";

export const clockOf = (local: LocalTime): string => local.slice(11);

/** For people: `Tue, Dec 1, 2026, 07:00 to 11:00`, with the second date where it is another. */
export function spanWords({ startsLocal, endsLocal }: { startsLocal: LocalTime; endsLocal: LocalTime }): string {
  const [from, to] = [startsLocal.slice(0, 10), endsLocal.slice(0, 10)];
  const end = from === to ? clockOf(endsLocal) : `${dateWords(to)}, ${clockOf(endsLocal)}`;
  return `${dateWords(from)}, ${clockOf(startsLocal)} to ${end}`;
}

/** `1 h 30 min` */
export function minutesWords(minutes: number): string {
  const [hours, rest] = [Math.floor(minutes / 60), minutes % 60];
  return [hours > 0 && `${hours} h`, (rest > 0 || hours === 0) && `${rest} min`].filter(Boolean).join(" ");
}
