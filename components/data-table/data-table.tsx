import { Download } from "lucide-react";
import { Button } from "@/components/ui/button";
import { EmptyState } from "@/components/ui/card";
import { cn } from "@/components/ui/cn";
import { TextLink } from "@/components/ui/text-link";
import { directionOf, hrefWith, isFiltered, type Search, unfilteredHref } from "./address";
import { type PageOf, Pager } from "./paged-table";
import { SortHead } from "./sort-head";

export type Column<Row> = {
  /** Also the word that the address sorts by. */
  key: string;
  header: string;
  cell: (row: Row) => React.ReactNode;
  sortable?: boolean;
  /** Counts, money and times: mono, tabular; `end` puts them under each other. */
  figures?: boolean;
  end?: boolean;
};

type DataTableProps<Row> = PageOf & {
  /** What the table lists, read out before it. */
  caption: string;
  columns: readonly Column<Row>[];
  rows: readonly Row[];
  rowKey: (row: Row) => string;
  path: string;
  search: Search;
  /** The search bar with its filters. */
  filters?: React.ReactNode;
  exportHref?: string;
  /** Shown while there is nothing at all: what to do next. */
  empty: React.ReactNode;
};

/** One page of a list. Order, filters and place live in the address; on a phone each row is a card. */
export function DataTable<Row>(props: DataTableProps<Row>) {
  const { filters, exportHref, path, search, rows, page, pageSize, total } = props;
  return (
    <div data-slot="data-table" className="grid gap-3">
      <div className="flex flex-wrap items-end justify-between gap-3">
        {filters}
        {exportHref && total > 0 && (
          <Button asChild data-print="off">
            <a href={exportHref} download>
              <Download aria-hidden className="size-4" />
              Export CSV
            </a>
          </Button>
        )}
      </div>
      {rows.length > 0 ? <Rows {...props} /> : <Nothing {...props} />}
      {total > 0 && <Pager {...{ path, search, page, pageSize, total }} />}
    </div>
  );
}

function Nothing<Row>({ total, path, search, empty }: DataTableProps<Row>) {
  if (total > 0) {
    const first = <TextLink href={hrefWith(path, search, { page: null })}>To the first page</TextLink>;
    return <EmptyState title="This page is past the end of the list" action={first} />;
  }
  if (!isFiltered(search)) return empty;
  return (
    <EmptyState
      title="Nothing fits this search"
      action={<TextLink href={unfilteredHref(path, search)}>Show the whole list</TextLink>}
    >
      Take a filter away, or search by another word.
    </EmptyState>
  );
}

const looks = <Row,>({ figures, end }: Column<Row>) => cn(figures && "figures", end && "sm:text-right");

/** The roles are written out: shown as blocks on a phone, a table loses them in some browsers. */
function Rows<Row>({ caption, columns, rows, rowKey, path, search }: DataTableProps<Row>) {
  return (
    <div className="overflow-x-auto sm:rounded-lg sm:border sm:border-line sm:bg-surface">
      {/* biome-ignore-start lint/a11y/noRedundantRoles: see above */}
      <table role="table" className="w-full border-collapse text-left max-sm:block">
        <caption className="sr-only">{caption}</caption>
        <thead role="rowgroup" className="max-sm:block">
          <tr role="row" className="max-sm:flex max-sm:flex-wrap max-sm:gap-x-4 max-sm:pb-2">
            {columns.map((column) => (
              <SortHead key={column.key} {...{ column, path, search }} direction={directionOf(search, column.key)} />
            ))}
          </tr>
        </thead>
        <tbody role="rowgroup" className="max-sm:grid max-sm:gap-2">
          {rows.map((row) => (
            <tr
              key={rowKey(row)}
              role="row"
              className="border-line hover:bg-sunken max-sm:grid max-sm:gap-1 max-sm:rounded-lg max-sm:border max-sm:bg-surface max-sm:p-3 sm:not-last:border-b"
            >
              {columns.map((column) => (
                <td
                  key={column.key}
                  role="cell"
                  data-label={column.header}
                  className={cn(
                    "align-top max-sm:grid max-sm:grid-cols-[6rem_minmax(0,1fr)] max-sm:gap-2 max-sm:before:font-sans max-sm:before:text-sm max-sm:before:text-muted max-sm:before:content-[attr(data-label)] max-sm:has-[>span:empty]:hidden sm:px-3 sm:py-2",
                    looks(column),
                  )}
                >
                  <span>{column.cell(row)}</span>
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
      {/* biome-ignore-end lint/a11y/noRedundantRoles: see above */}
    </div>
  );
}
