import { ChevronLeft, ChevronRight } from "lucide-react";
import Link from "next/link";
import { Button } from "./button";

type PaginationProps = {
  page: number;
  last: number;
  hrefOf: (page: number) => string;
  /** Beside the page number: how many there are. */
  children?: React.ReactNode;
};

export function Pagination({ page, last, hrefOf, children }: PaginationProps) {
  const step = (to: number, rel: "prev" | "next", word: React.ReactNode) =>
    to >= 1 && to <= last ? (
      <Button asChild size="small">
        <Link href={hrefOf(to)} rel={rel}>
          {word}
        </Link>
      </Button>
    ) : (
      <Button size="small" disabled>
        {word}
      </Button>
    );
  const previous = (
    <>
      <ChevronLeft aria-hidden className="size-4" />
      Previous
    </>
  );
  const next = (
    <>
      Next
      <ChevronRight aria-hidden className="size-4" />
    </>
  );
  return (
    <nav aria-label="Pages" data-slot="pagination" data-print="off" className="flex flex-wrap items-center gap-3">
      {last > 1 && step(page - 1, "prev", previous)}
      <p className="text-sm text-muted">
        {last > 1 && (
          <>
            Page <span className="figures">{page}</span> of <span className="figures">{last}</span>,{" "}
          </>
        )}
        {children}
      </p>
      {last > 1 && step(page + 1, "next", next)}
    </nav>
  );
}
