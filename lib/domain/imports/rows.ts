import { readCsv, textOf } from "./csv";
import { columnsOf, type ListName, type RowOf } from "./lists";
import { type Chosen, type Match, matchColumns, missingColumns, type Remembered, recognizeList } from "./match";

/** Something that stops the import, where it stands in the person's own file. Row 1 holds the headings. */
export type Finding = {
  file: string;
  list: ListName | null;
  row: number | null;
  column: string | null;
  message: string;
  value: string | null;
};

export type GivenFile = { name: string; content: Uint8Array | string; list?: ListName | null; columns?: Chosen };

/** A row of a list. One that has findings of its own still stands in for its key, so that others may refer to it. */
export type ListRow<L extends ListName> = { file: string; row: number; values: RowOf<L> };
export type Part<L extends ListName = ListName> = {
  list: L;
  file: string;
  present: ReadonlySet<string>;
  rows: ListRow<L>[];
};

export type FileView = {
  name: string;
  /** None where it cannot be told, or where the person leaves the file out. */
  list: ListName | null;
  rows: number;
  columns: (Match & { example: string })[];
  missing: string[];
  refused: string | null;
};

export type ReadFile = { view: FileView; part: Part | null; findings: Finding[] };

/** One file: what it is, what its headings mean, its rows, and everything that is wrong with them. */
export function readFile(file: GivenFile, remembered: Remembered): ReadFile {
  const { name } = file;
  const read = textOf(typeof file.content === "string" ? new TextEncoder().encode(file.content) : file.content);
  if ("refused" in read) return unread(name, null, read.refused);
  const sheet = readCsv(read.text);
  const list = file.list === undefined ? recognizeList(name, sheet.headings, remembered) : file.list;
  if (list === null)
    return unread(
      name,
      sheet.records.length,
      file.list === null ? null : "Which list this is cannot be told. Choose it",
    );
  const matches = matchColumns(list, sheet.headings, remembered, file.columns ?? {});
  const missing = missingColumns(list, matches);
  const example = (i: number) => sheet.records.find(({ cells }) => cells[i])?.cells[i] ?? "";
  const columns = matches.map((match, i) => ({ ...match, example: example(i) }));
  const view = { name, list, rows: sheet.records.length, columns, missing, refused: null };
  const say = (row: number | null, column: string | null, message: string, value: string | null = null) => ({
    file: name,
    list,
    row,
    column,
    message,
    value,
  });
  const findings = [
    ...sheet.faults.map(({ row, message }) => say(row, null, message)),
    ...missing.map((heading) => say(1, heading, `The column “${heading}” is missing`)),
  ];
  if (missing.length > 0) return { view, part: null, findings };
  const rows = sheet.records.map(({ row, cells }) => {
    const { values, faults } = parseRow(list, matches, cells);
    findings.push(...faults.map(({ heading, message, value }) => say(row, heading, message, value)));
    return { file: name, row, values };
  });
  const present = new Set(matches.flatMap(({ column }) => column ?? []));
  return { view, part: { list, file: name, present, rows }, findings };
}

function unread(name: string, rows: number | null, message: string | null): ReadFile {
  const view = { name, list: null, rows: rows ?? 0, columns: [], missing: [], refused: rows === null ? message : null };
  const finding = { file: name, list: null, row: null, column: null, value: null };
  return { view, part: null, findings: message === null ? [] : [{ ...finding, message }] };
}

function parseRow(list: ListName, matches: readonly Match[], cells: readonly string[]) {
  const place = new Map(matches.flatMap(({ column }, i) => (column === null ? [] : [[column, i] as const])));
  const faults: { heading: string; message: string; value: string | null }[] = [];
  const entries = Object.entries(columnsOf(list)).map(([name, { heading, schema }]) => {
    const i = place.get(name);
    const cell = i === undefined || cells[i]?.trim() === "" ? undefined : cells[i];
    const parsed = schema.safeParse(cell);
    if (parsed.success) return [name, parsed.data];
    faults.push({ heading, message: parsed.error.issues[0]?.message ?? "That does not fit", value: cell ?? null });
    return [name, undefined];
  });
  // What lacks values here has findings, and nothing with findings is ever written.
  return { values: Object.fromEntries(entries) as RowOf<ListName>, faults };
}
