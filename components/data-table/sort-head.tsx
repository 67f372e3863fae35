import { ArrowDown, ArrowUp, ChevronsUpDown } from "lucide-react";
import Link from "next/link";
import { cn } from "@/components/ui/cn";
import { type Direction, type Search, sortHref } from "./address";

type SortHeadProps = {
  column: { key: string; header: string; sortable?: boolean; end?: boolean };
  path: string;
  search: Search;
  direction?: Direction;
};

const GLYPHS = { ascending: ArrowUp, descending: ArrowDown, none: ChevronsUpDown } as const;

/** A column's head; where it sorts, a link. On a phone only these links stay. */
export function SortHead({ column: { key, header, sortable, end }, path, search, direction }: SortHeadProps) {
  const Glyph = GLYPHS[direction ?? "none"];
  return (
    <th
      // biome-ignore lint/a11y/noRedundantRoles: shown as blocks on a phone, a table loses its roles in some browsers
      role="columnheader"
      scope="col"
      aria-sort={direction}
      className={cn(
        "text-sm font-semibold whitespace-nowrap text-muted sm:border-b sm:border-line sm:px-3 sm:py-2",
        end && "sm:text-right",
        !sortable && "max-sm:sr-only",
      )}
    >
      {sortable ? (
        <Link
          href={sortHref(path, search, key)}
          className={cn(
            "inline-flex min-h-6 items-center gap-1 hover:text-text pointer-coarse:min-h-12",
            direction && "text-text",
          )}
        >
          {header}
          <Glyph aria-hidden className="size-3.5" />
        </Link>
      ) : (
        header
      )}
    </th>
  );
}
