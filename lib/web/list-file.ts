import "server-only";
import type { NextRequest } from "next/server";
import Papa from "papaparse";
import type { Verb } from "@/lib/services/command";
import { contextOf } from "./context";
import { toProblem } from "./problem";

const ROWS_A_PAGE = 1000;

type Page<Row> = { rows: readonly Row[]; total: number };
type Column<Row> = readonly [heading: string, text: (row: Row) => string | number | null | undefined];

/**
 * A list as a CSV file (RFC 4180), page after page as it is read, with the filters and the order of the address. Cells
 * that a spreadsheet would run are made text; the byte order mark tells spreadsheets that it is UTF-8.
 */
export function listFile<Row>(verb: Verb<Page<Row>>, name: string, columns: readonly Column<Row>[]) {
  return async (request: NextRequest): Promise<Response> => {
    const context = await contextOf();
    const filters = Object.fromEntries(request.nextUrl.searchParams);
    const pageOf = (page: number) => verb(context, { ...filters, page, pageSize: ROWS_A_PAGE });
    let first: Page<Row>;
    try {
      first = await pageOf(1);
    } catch (error) {
      return toProblem(error, context.requestId ?? "");
    }
    const text = (rows: readonly (readonly unknown[])[]) =>
      new TextEncoder().encode(`${Papa.unparse([...rows] as unknown[][], { escapeFormulae: true })}\r\n`);
    const cells = ({ rows }: Page<Row>) => text(rows.map((row) => columns.map(([, cell]) => cell(row) ?? "")));
    const pages = Math.ceil(first.total / ROWS_A_PAGE);
    let page = 1;
    const body = new ReadableStream<Uint8Array>({
      start(file) {
        file.enqueue(new Uint8Array([0xef, 0xbb, 0xbf]));
        file.enqueue(text([columns.map(([heading]) => heading)]));
        if (first.rows.length > 0) file.enqueue(cells(first));
      },
      async pull(file) {
        if (page >= pages) return file.close();
        page += 1;
        file.enqueue(cells(await pageOf(page)));
      },
    });
    return new Response(body, {
      headers: {
        "content-type": "text/csv; charset=utf-8",
        "content-disposition": `attachment; filename="${name}.csv"`,
        "cache-control": "no-store",
      },
    });
  };
}
