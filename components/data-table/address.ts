export type Search = Record<string, string | string[] | undefined>;

/** The same list with something changed; null or "" takes a part away. */
export function hrefWith(path: string, search: Search, change: Record<string, string | null>): string {
  const params = new URLSearchParams();
  for (const [name, value] of Object.entries({ ...search, ...change })) {
    for (const one of [value].flat()) if (one) params.append(name, one);
  }
  const text = params.toString();
  return text ? `${path}?${text}` : path;
}

export type Direction = "ascending" | "descending";

/** `sort=name` rises, `sort=-name` falls. */
export function directionOf(search: Search, key: string): Direction | undefined {
  if (search.sort === key) return "ascending";
  return search.sort === `-${key}` ? "descending" : undefined;
}

/** Another order starts again at the first page. */
export const sortHref = (path: string, search: Search, key: string): string =>
  hrefWith(path, search, { sort: directionOf(search, key) === "ascending" ? `-${key}` : key, page: null });

const ORDER_AND_PLACE = ["sort", "page"];

export const isFiltered = (search: Search): boolean =>
  Object.entries(search).some(([name, value]) => !ORDER_AND_PLACE.includes(name) && [value].flat().some(Boolean));

/** Only the order stays; without it, the plain list. */
export const unfilteredHref = (path: string, search: Search): string => hrefWith(path, { sort: search.sort }, {});
