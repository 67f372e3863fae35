import { ChevronRight } from "lucide-react";
import Link from "next/link";

export type Crumb = { label: string; href: string };

/** The pages above this one; the page itself is the heading below. */
export function Breadcrumb({ trail }: { trail: readonly Crumb[] }) {
  return (
    <nav aria-label="Breadcrumb" data-slot="breadcrumb" data-print="off">
      <ol className="flex flex-wrap items-center gap-x-1 text-sm">
        {trail.map(({ label, href }) => (
          <li key={href} className="flex items-center gap-x-1">
            <Link
              href={href}
              className="inline-flex min-h-6 items-center text-muted underline-offset-4 hover:underline"
            >
              {label}
            </Link>
            <ChevronRight aria-hidden className="size-3.5 text-muted" />
          </li>
        ))}
      </ol>
    </nav>
  );
}
