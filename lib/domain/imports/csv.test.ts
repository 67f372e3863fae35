import fc from "fast-check";
import Papa from "papaparse";
import { describe, expect, test } from "vitest";
import { readCsv, textOf, writeCsv } from "./csv";

const bytes = (...values: number[]) => Uint8Array.from(values);
const utf8 = (text: string) => new TextEncoder().encode(text);
const refusal = (content: Uint8Array) => {
  const read = textOf(content);
  return "refused" in read ? read.refused : null;
};
const table = (text: string) => {
  const { headings, records } = readCsv(text);
  return [headings, ...records.map(({ cells }) => cells)];
};

/** The examples of RFC 4180, section 2, rules 1 to 7, with a heading where they have none. */
describe("RFC 4180, section 2", () => {
  test.each([
    ["1: each record on a line of its own", "aaa,bbb,ccc\r\nzzz,yyy,xxx\r\n"],
    ["2: the last record may have no line break", "aaa,bbb,ccc\r\nzzz,yyy,xxx"],
    ["5: fields may stand in double quotes", '"aaa","bbb","ccc"\r\nzzz,yyy,xxx'],
  ])("rule %s", (_, text) => {
    expect(table(text)).toEqual([
      ["aaa", "bbb", "ccc"],
      ["zzz", "yyy", "xxx"],
    ]);
  });

  test("rule 3: a header line names the fields", () => {
    expect(table("field_name,field_name,field_name\r\naaa,bbb,ccc\r\nzzz,yyy,xxx\r\n")[0]).toEqual([
      "field_name",
      "field_name",
      "field_name",
    ]);
  });

  test("rule 4: spaces are part of a field", () => {
    expect(table("a,b,c\r\naaa, bbb ,ccc")[1]).toEqual(["aaa", " bbb ", "ccc"]);
  });

  test("rule 6: line breaks, quotes and commas inside quotes", () => {
    expect(table('a,b,c\r\n"aaa","b \r\nbb","c,cc"\r\nzzz,yyy,xxx').slice(1)).toEqual([
      ["aaa", "b \r\nbb", "c,cc"],
      ["zzz", "yyy", "xxx"],
    ]);
  });

  test("rule 7: a quote inside quotes is written twice", () => {
    expect(table('a,b,c\r\n"aaa","b""bb","ccc"')[1]).toEqual(["aaa", 'b"bb', "ccc"]);
  });
});

describe("what is tolerated", () => {
  test.each([",", ";", "\t", "|"])("cells separated by %j", (separator) => {
    const text = `address${separator}label\r\n1${separator}"Hall, east; attic"`;
    expect(table(text)).toEqual([
      ["address", "label"],
      ["1", "Hall, east; attic"],
    ]);
  });

  test("texts full of semicolons do not change the separator", () => {
    expect(table("address,label\n1,a;b;c\n2,d;e;f")[1]).toEqual(["1", "a;b;c"]);
  });

  test.each(["\n", "\r\n", "\r"])("lines that end with %j", (end) => {
    expect(readCsv(["a,b", "1,2", "", "3,4"].join(end)).records).toEqual([
      { row: 2, cells: ["1", "2"] },
      { row: 4, cells: ["3", "4"] },
    ]);
  });

  test("a byte order mark", () => {
    const read = textOf(utf8("\uFEFFaddress,label\n1,x"));
    expect("text" in read && readCsv(read.text).headings).toEqual(["address", "label"]);
  });
});

describe("what is refused, and how it is mended", () => {
  test.each([
    ["UTF-16, little end first", bytes(0xff, 0xfe, 0x61, 0x00), /UTF-16/],
    ["UTF-16, big end first", bytes(0xfe, 0xff, 0x00, 0x61), /UTF-16/],
    ["UTF-16 without its mark", bytes(0x61, 0x00, 0x62, 0x00), /zero bytes/],
    ["a packed spreadsheet", bytes(0x50, 0x4b, 0x03, 0x04, 0x14), /spreadsheet/],
    ["an old spreadsheet", bytes(0xd0, 0xcf, 0x11, 0xe0, 0xa1), /spreadsheet/],
    ["a PDF", utf8("%PDF-1.7"), /PDF/],
    ["a web page", utf8("\n<!DOCTYPE html><table>"), /web page/],
    ["nothing", utf8(" \r\n"), /nothing/],
    // ISO 8859-1 writes é as one byte that UTF-8 does not know.
    ["another encoding", Uint8Array.from([...utf8("a,b\n1,x\n2,caf"), 0xe9, ...utf8("\n")]), /line 3/],
  ])("%s", (_, content, words) => {
    expect(refusal(content)).toMatch(words);
  });

  test("a quotation mark that never closes, and cells past the headings", () => {
    expect(readCsv('a,b\n1,"2\n').faults).toMatchObject([{ row: 2, message: expect.stringContaining("never closed") }]);
    expect(readCsv("a,b\n1,2,3\n").faults).toMatchObject([{ row: 2, message: expect.stringContaining("more cells") }]);
  });
});

describe("cells that a spreadsheet would run", () => {
  /** The characters by which OWASP's page on CSV injection tells them. */
  const RUN = ["=", "+", "-", "@", "\t", "\r"];

  test.each(RUN)("those that begin with %j are written as text", (sign) => {
    expect(writeCsv(["label"], [[`${sign}1+1`]])).toContain(`"'${sign}1+1"`);
  });

  const cell = fc.oneof(
    fc.string({ unit: "grapheme" }),
    fc.string({ unit: fc.constantFrom(...RUN, "'", '"', ",", ";", "\n", "a", " ") }),
  );
  const row = fc
    .tuple(cell, cell, cell)
    .map((cells) => cells.map((text) => text.replaceAll("\0", "")))
    .filter((cells) => cells.some((text) => text.trim() !== ""));

  test("every table comes back as it was, and nothing in it would run", () => {
    fc.assert(
      fc.property(fc.array(row, { maxLength: 8 }), (rows) => {
        const text = writeCsv(["a", "b", "c"], rows);
        const read = textOf(utf8(text));
        expect("text" in read && table(read.text).slice(1)).toEqual(rows);
      }),
      { numRuns: 500 },
    );
  });

  test("read as a spreadsheet reads it, no cell begins with such a character", () => {
    fc.assert(
      fc.property(fc.array(row, { maxLength: 8 }), (rows) => {
        const { data } = Papa.parse<string[]>(writeCsv(["a", "b", "c"], rows), { delimiter: "," });
        for (const seen of data.flat()) expect(seen).not.toMatch(/^[=+\-@\t\r]/);
      }),
    );
  });
});
