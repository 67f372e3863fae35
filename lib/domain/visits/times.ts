import { dateWords, type LocalTime } from "../shared/zone";
import { clockOf } from "./clock";

/** For people: `Tue, Dec 1, 2026, 07:00 to 11:00`, with the second date where it is another. */
export function spanWords({ startsLocal, endsLocal }: { startsLocal: LocalTime; endsLocal: LocalTime }): string {
  const [from, to] = [startsLocal.slice(0, 10), endsLocal.slice(0, 10)];
  const end = from === to ? clockOf(endsLocal) : `${dateWords(to)}, ${clockOf(endsLocal)}`;
  return `${dateWords(from)}, ${clockOf(startsLocal)} to ${end}`;
}
