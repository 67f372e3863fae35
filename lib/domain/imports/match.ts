import { columnsOf, LIST_NAMES, LISTS, type ListName } from "./lists";

/** How a heading came to its column; `none` where it has none. */
export type How = "chosen" | "exact" | "remembered" | "similar" | "none";
export type Match = { heading: string; column: string | null; how: How };
/** A company's own headings and the columns they were matched to; an empty column: left out on purpose. */
export type Remembered = readonly { list: string; heading: string; column: string }[];
/** What the person at the screen decided, by the place of the heading; null: left out. */
export type Chosen = Readonly<Record<number, string | null>>;

export const plainHeading = (heading: string): string =>
  heading
    .toLowerCase()
    .replace(/[^\p{L}\p{N}]+/gu, " ")
    .trim();

/** Each heading with its column: as chosen, then exact, then as remembered, then by similar words. No column twice. */
export function matchColumns(
  list: ListName,
  headings: readonly string[],
  remembered: Remembered,
  chosen: Chosen,
): Match[] {
  const columns = columnsOf(list);
  const matches: Match[] = headings.map((heading) => ({ heading, column: null, how: "none" }));
  const settled = new Set<number>();
  const taken = new Set<string>();
  const settle = (i: number, column: string | null | undefined, how: How) => {
    const match = matches[i];
    if (!match || settled.has(i) || column === undefined) return;
    if (column !== null && (taken.has(column) || !(column in columns))) return;
    settled.add(i);
    if (column !== null) taken.add(column);
    Object.assign(match, { column, how });
  };
  const memory = new Map(remembered.filter((one) => one.list === list).map((one) => [one.heading, one.column || null]));
  for (const [i, column] of Object.entries(chosen)) settle(Number(i), column, "chosen");
  const rounds: readonly (readonly [How, (heading: string) => string | null | undefined])[] = [
    ["exact", (heading) => columnBy(list, (one) => plainHeading(one.heading) === heading)],
    ["remembered", (heading) => memory.get(heading)],
    ["similar", (heading) => columnBy(list, (one) => one.also?.includes(heading) ?? false)],
    ["similar", (heading) => columnBy(list, (one) => isNearly(plainHeading(one.heading), heading))],
  ];
  for (const [how, find] of rounds)
    for (const [i, heading] of headings.entries()) if (heading !== "") settle(i, find(plainHeading(heading)), how);
  return matches;
}

function columnBy(list: ListName, fits: (column: { heading: string; also?: readonly string[] }) => boolean) {
  return Object.entries(columnsOf(list)).find(([, column]) => fits(column))?.[0];
}

/** One letter off, in words long enough that this means the same: `adress`, `locations`. */
function isNearly(a: string, b: string): boolean {
  if (Math.min(a.length, b.length) < 4 || Math.abs(a.length - b.length) > 1) return false;
  let same = 0;
  while (same < Math.min(a.length, b.length) && a[same] === b[same]) same++;
  const rest = (text: string, skipped: number) => text.slice(same + skipped);
  if (a.length === b.length) return rest(a, 1) === rest(b, 1) || rest(a, 0) === swapped(rest(b, 0));
  return a.length > b.length ? rest(a, 1) === rest(b, 0) : rest(a, 0) === rest(b, 1);
}

const swapped = (text: string) => `${text[1] ?? ""}${text[0] ?? ""}${text.slice(2)}`;

/** What a list is called in file names, most telling first. */
const FILE_WORDS: readonly (readonly [RegExp, ListName])[] = [
  [/matrix|cause|effect/i, "matrix"],
  [/output.?groups?|groups?/i, "output_groups"],
  [/outputs?|relays?|circuits?/i, "outputs"],
  [/equipment|fans|dampers|units/i, "equipment"],
  [/points?|devices?|detectors?/i, "points"],
  [/zones?/i, "zones"],
  [/systems?|panels?/i, "systems"],
  [/sites?|buildings?/i, "sites"],
];

/** Which list a file is, by its headings first and its name second; none where nothing speaks for one. */
export function recognizeList(fileName: string, headings: readonly string[], remembered: Remembered): ListName | null {
  const named = FILE_WORDS.find(([word]) => word.test(fileName))?.[1];
  const scored = LIST_NAMES.map((list) => ({
    list,
    score: scoreOf(list, headings, remembered) + (list === named ? 4 : 0),
  }));
  const best = scored.reduce((a, b) => (b.score > a.score ? b : a));
  return best.score > 0 ? best.list : null;
}

/** Required columns that are there speak for a list, missing ones against it. */
function scoreOf(list: ListName, headings: readonly string[], remembered: Remembered): number {
  const matches = matchColumns(list, headings, remembered, {});
  const found = new Set(matches.flatMap(({ column }) => column ?? []));
  const missing = missingColumns(list, matches).length;
  const weight = { exact: 2, remembered: 2, chosen: 2, similar: 1, none: 0 } as const;
  const points = matches.reduce((sum, { how }) => sum + weight[how], 0);
  return found.size === 0 ? 0 : points - missing * 4;
}

/** Headings of required columns that no heading of the file stands for. */
export function missingColumns(list: ListName, matches: readonly Match[]): string[] {
  const found = new Set(matches.map(({ column }) => column));
  return Object.entries(LISTS[list].columns as ReturnType<typeof columnsOf>)
    .filter(([name, column]) => column.required && !found.has(name))
    .map(([, column]) => column.heading);
}
