import { Search as SearchGlyph } from "lucide-react";
import Form from "next/form";
import { useId } from "react";
import { Button } from "@/components/ui/button";
import { cn } from "@/components/ui/cn";
import { Input, Select } from "@/components/ui/input";
import { Pagination } from "@/components/ui/pagination";
import { hrefWith, type Search } from "./address";

type SearchBarProps = {
  path: string;
  q?: string;
  label: string;
  /** The order to keep while the filters change. */
  sort?: Search["sort"];
  /** FilterSelects. */
  children?: React.ReactNode;
};

/** Filters live in the address, so a list can be sent to a colleague. */
export function SearchBar({ path, q, label, sort, children }: SearchBarProps) {
  const id = useId();
  return (
    <Form action={path} role="search" className="flex flex-wrap items-end gap-2 max-sm:w-full" data-print="off">
      {typeof sort === "string" && <input type="hidden" name="sort" value={sort} />}
      <div className={cn("grid gap-1", children ? "max-sm:w-full" : "max-sm:flex-1")}>
        <label htmlFor={id} className="text-sm text-muted">
          {label}
        </label>
        <Input id={id} key={q} type="search" name="q" defaultValue={q} className="sm:w-64" />
      </div>
      {children}
      <Button type="submit">
        <SearchGlyph aria-hidden className="size-4" />
        Search
      </Button>
    </Form>
  );
}

type FilterProps = {
  name: string;
  label: string;
  search: Search;
  options: readonly { value: string; label: string }[];
  /** The choice that filters nothing. */
  all: string;
};

export function FilterSelect({ name, label, search, options, all }: FilterProps) {
  const id = useId();
  const chosen = typeof search[name] === "string" ? search[name] : "";
  return (
    <div className="grid gap-1 max-sm:grow">
      <label htmlFor={id} className="text-sm text-muted">
        {label}
      </label>
      <Select id={id} key={chosen} name={name} defaultValue={chosen}>
        <option value="">{all}</option>
        {options.map(({ value, label: word }) => (
          <option key={value} value={value}>
            {word}
          </option>
        ))}
      </Select>
    </div>
  );
}

export type PageOf = { page: number; pageSize: number; total: number };

export function Pager({ path, search, page, pageSize, total }: PageOf & { path: string; search: Search }) {
  return (
    <Pagination
      page={page}
      last={Math.max(1, Math.ceil(total / pageSize))}
      hrefOf={(to) => hrefWith(path, search, { page: to === 1 ? null : String(to) })}
    >
      <span className="figures">{total}</span> in all
    </Pagination>
  );
}
