import Link from "next/link";
import { Button } from "@/components/ui/button";
import { Input } from "@/components/ui/input";

type Search = Record<string, string | string[] | undefined>;

export function hrefWith(path: string, search: Search, change: Record<string, string | null>): string {
  const params = new URLSearchParams();
  for (const [key, value] of Object.entries({ ...search, ...change })) {
    if (typeof value === "string" && value !== "") params.set(key, value);
  }
  const text = params.toString();
  return text ? `${path}?${text}` : path;
}

/** Filters live in the address, so a list can be sent to a colleague. */
export function SearchBar({
  path,
  q,
  label,
  children,
}: {
  path: string;
  q?: string;
  label: string;
  children?: React.ReactNode;
}) {
  return (
    <form action={path} method="get" className="flex flex-wrap items-end gap-2" data-print="off">
      <label className="grid gap-1" htmlFor="list-search">
        <span className="text-sm text-muted">{label}</span>
        <Input id="list-search" type="search" name="q" defaultValue={q} className="w-64 max-w-full" />
      </label>
      {children}
      <Button type="submit">Search</Button>
    </form>
  );
}

type PagerProps = { path: string; search: Search; page: number; pageSize: number; total: number };

export function Pager({ path, search, page, pageSize, total }: PagerProps) {
  const last = Math.max(1, Math.ceil(total / pageSize));
  const link = (to: number, word: string) =>
    to >= 1 && to <= last ? (
      <Button asChild size="small">
        <Link href={hrefWith(path, search, { page: to === 1 ? null : String(to) })}>{word}</Link>
      </Button>
    ) : (
      <Button size="small" disabled>
        {word}
      </Button>
    );
  return (
    <nav aria-label="Pages" className="flex flex-wrap items-center gap-3" data-print="off">
      {link(page - 1, "Previous")}
      <span className="figures text-sm">
        {page} of {last} · {total} in all
      </span>
      {link(page + 1, "Next")}
    </nav>
  );
}
