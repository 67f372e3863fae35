import { EXPECTATION_SOURCE_WORDS, type ExpectationSource, SIGNAL_WORDS, type Signal } from "../systems/words";

/** One input, a zone or a single device, and the output group that it operates, for one kind of signal. */
export type CellKey = { zoneId: string | null; pointId: string | null; groupId: string; signal: Signal };

export type MatrixCell = CellKey & {
  /** Where the expectation comes from. */
  source: ExpectationSource;
  delaySeconds: number;
};

/** A cell as it is kept: it holds from version `addedIn` until just before `removedIn`. */
export type CellRow = MatrixCell & { addedIn: number; removedIn: number | null };

export type MatrixVersion = {
  number: number;
  note: string;
  author: string;
  at: Date;
  cells: readonly MatrixCell[];
};

/** Tells one cell from every other of the same version. */
export const cellKey = ({ zoneId, pointId, groupId, signal }: CellKey): string =>
  `${zoneId ?? ""}/${pointId ?? ""}/${groupId}/${signal}`;

/** The cells that hold in a version. */
export const cellsOf = <R extends CellRow>(number: number, rows: readonly R[]): R[] =>
  rows.filter(({ addedIn, removedIn }) => addedIn <= number && (removedIn === null || removedIn > number));

const delayWords = (seconds: number) => (seconds === 0 ? "" : ` after ${seconds} s`);
const factsWords = ({ source, delaySeconds }: MatrixCell) =>
  `${EXPECTATION_SOURCE_WORDS[source].toLowerCase()}${delayWords(delaySeconds)}`;

/** What became of the cells of `a` in `b`, in words; `nameOf` knows zones, devices and output groups by their ids. */
export function difference(
  a: readonly MatrixCell[],
  b: readonly MatrixCell[],
  nameOf: (id: string) => string,
): string[] {
  const [before, after] = [a, b].map((cells) => new Map(cells.map((cell) => [cellKey(cell), cell])));
  const says = (cell: MatrixCell) =>
    `${SIGNAL_WORDS[cell.signal]} of ${nameOf(cell.zoneId ?? cell.pointId ?? "")} operates ${nameOf(cell.groupId)}`;
  const gone = a.filter((cell) => !after?.has(cellKey(cell))).map((cell) => `Removed: ${says(cell)}`);
  const changed = b.flatMap((cell) => {
    const old = before?.get(cellKey(cell));
    if (!old) return [`Added: ${says(cell)} (${factsWords(cell)})`];
    if (factsWords(old) === factsWords(cell)) return [];
    return [`Changed: ${says(cell)}, from ${factsWords(old)} to ${factsWords(cell)}`];
  });
  return [...gone, ...changed];
}
