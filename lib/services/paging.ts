import { asc, desc, type SQL, type SQLWrapper } from "drizzle-orm";
import { z } from "zod";

export const PAGE_SIZE = 25;
const LARGEST_PAGE = 1000;

/** What every list takes from the address bar: forgiving, since people type there. */
export const PageInput = z.object({
  page: z.coerce.number().int().min(1).max(100_000).catch(1).default(1),
  pageSize: z.coerce.number().int().min(1).max(LARGEST_PAGE).catch(PAGE_SIZE).default(PAGE_SIZE),
  q: z.string().trim().max(200).catch("").default(""),
});

export const offsetOf = (page: number, pageSize: number = PAGE_SIZE): number => (page - 1) * pageSize;

type Sort<K extends string> = K | `-${K}` | null;

/** What the address may order a list by: `name` rises, `-name` falls. */
export const sortInput = <K extends string>(keys: readonly K[]) =>
  z
    .custom<Sort<K>>((value) => keys.some((key) => value === key || value === `-${key}`))
    .nullish()
    .catch(null)
    .default(null);

/** The chosen order first, then the list's own, so that pages never overlap. */
export function orderBy<K extends string>(
  sort: Sort<K> | undefined,
  columns: Record<K, SQLWrapper>,
  own: SQL[],
): SQL[] {
  if (!sort) return own;
  const column = columns[sort.replace(/^-/, "") as K];
  return [sort.startsWith("-") ? desc(column) : asc(column), ...own];
}

/** A pattern for ILIKE that takes what was typed literally. */
export const containing = (text: string): string => `%${text.replace(/[\\%_]/g, "\\$&")}%`;
