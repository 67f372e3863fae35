import Link from "next/link";
import { cn } from "@/components/ui/cn";

type Tab = { href: string; label: string; count?: number; here: boolean };

/** One list cut by one question, each part with its count. */
export function CountTabs({ label, tabs }: { label: string; tabs: readonly Tab[] }) {
  return (
    <nav aria-label={label} data-print="off">
      <ul className="flex flex-wrap gap-x-1 border-b border-line">
        {tabs.map(({ href, label: words, count, here }) => (
          <li key={words}>
            <Link
              href={href}
              aria-current={here ? "page" : undefined}
              className={cn(
                "inline-flex min-h-10 items-center gap-2 border-b-3 border-transparent px-3 font-semibold whitespace-nowrap text-muted hover:text-text",
                "aria-[current=page]:border-settled aria-[current=page]:text-text pointer-coarse:min-h-12",
              )}
            >
              {words}
              {count !== undefined && <span className="figures text-sm">{count}</span>}
            </Link>
          </li>
        ))}
      </ul>
    </nav>
  );
}
