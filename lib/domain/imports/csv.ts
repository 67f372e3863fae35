import Papa from "papaparse";

export type Cell = string | number | null;
/** What a file says: its records with their place in the sheet, or why it cannot be read. */
export type Sheet = {
  delimiter: string;
  headings: string[];
  records: { row: number; cells: string[] }[];
  faults: Fault[];
};
type Fault = { row: number; message: string };

const DELIMITERS = [",", ";", "\t", "|"] as const;
const RESAVE = "Open it in the spreadsheet and save it as CSV UTF-8";

const startsWith = (bytes: Uint8Array, magic: readonly number[]) => magic.every((byte, i) => bytes[i] === byte);

/** Files that are something else, by how they begin. */
const NOT_CSV: readonly (readonly [magic: readonly number[], message: string])[] = [
  [[0x50, 0x4b, 0x03, 0x04], `This is a spreadsheet or a packed file, not CSV. ${RESAVE}`],
  [[0xd0, 0xcf, 0x11, 0xe0], `This is an old spreadsheet file, not CSV. ${RESAVE}`],
  [[0x25, 0x50, 0x44, 0x46], "This is a PDF, not CSV. Ask for the list as CSV"],
  [[0xff, 0xfe], `This file is in UTF-16 (“Unicode text”). ${RESAVE}`],
  [[0xfe, 0xff], `This file is in UTF-16 (“Unicode text”). ${RESAVE}`],
];

/** The text of a file, or why it is none. A byte order mark is tolerated. */
export function textOf(bytes: Uint8Array): { text: string } | { refused: string } {
  const other = NOT_CSV.find(([magic]) => startsWith(bytes, magic));
  if (other) return { refused: other[1] };
  if (bytes.includes(0)) return { refused: `This file holds zero bytes: it is not text in UTF-8. ${RESAVE}` };
  let text: string;
  try {
    text = new TextDecoder("utf-8", { fatal: true }).decode(bytes);
  } catch {
    const lenient = new TextDecoder("utf-8").decode(bytes);
    const row = lenient.slice(0, lenient.indexOf("\uFFFD")).split(/\r\n|\n|\r/).length;
    return { refused: `This file is not in UTF-8: line ${row} has a character in another encoding. ${RESAVE}` };
  }
  if (/^\s*<(!doctype|html|\?xml|table|head)/i.test(text)) return { refused: "This is a web page, not CSV" };
  if (text.trim() === "") return { refused: "There is nothing in this file" };
  return { text };
}

/**
 * By the headings, which have no reason to hold separators: the library's guess counts cells of the first rows and is
 * misled by texts with semicolons.
 */
function delimiterOf(text: string): string {
  const headings = /^(?:"[^"]*"|[^"\r\n])*/.exec(text)?.[0].replace(/"[^"]*"/g, "") ?? "";
  const times = (delimiter: string) => headings.split(delimiter).length;
  return DELIMITERS.reduce((best, one) => (times(one) > times(best) ? one : best));
}

/** What a spreadsheet would run instead of showing, and what would be taken for it on the way back. */
const RUNS = /^'*[=+\-@\t\r]/;
const NEUTRALIZED = /^''*[=+\-@\t\r]/;
const restored = (cell: string) => (NEUTRALIZED.test(cell) ? cell.slice(1) : cell);

const FAULTS: Record<string, string> = {
  MissingQuotes: "A quotation mark is opened and never closed",
  InvalidQuotes: "A quotation mark stands inside a cell; write it twice",
};

/** RFC 4180, with any of the usual separators and line ends. */
export function readCsv(text: string): Sheet {
  const delimiter = delimiterOf(text);
  const { data, errors } = Papa.parse<string[]>(text, { delimiter, header: false });
  const [first = [], ...rest] = data;
  const headings = first.map((cell) => restored(cell).trim());
  const faults = errors.flatMap(({ code, row }) => {
    const message = FAULTS[code];
    return message ? [{ row: (row ?? 0) + 1, message }] : [];
  });
  const records = rest
    .map((cells, i) => ({ row: i + 2, cells: cells.map(restored) }))
    .filter(({ cells }) => cells.some((cell) => cell.trim() !== ""));
  for (const { row, cells } of records)
    if (cells.slice(headings.length).some((cell) => cell.trim() !== ""))
      faults.push({ row, message: "This row has more cells than there are headings" });
  return { delimiter, headings, records, faults };
}

/** RFC 4180 in UTF-8 with the mark by which spreadsheets know it; cells that they would run are made text. */
export const writeCsv = (headings: readonly string[], rows: readonly (readonly Cell[])[]): string =>
  `\uFEFF${Papa.unparse([[...headings], ...rows.map((row) => row.map((cell) => cell ?? ""))], { escapeFormulae: RUNS })}\r\n`;
