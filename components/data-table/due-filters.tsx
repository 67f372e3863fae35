import { TEST_KIND_WORDS, TEST_KINDS } from "@/lib/domain/agreements/words";
import type { Search } from "./address";
import { FilterSelect, SearchBar } from "./paged-table";

const KINDS = TEST_KINDS.map((value) => ({ value, label: TEST_KIND_WORDS[value] }));
const DAYS = [14, 30, 60, 90, 180].map((days) => ({ value: String(days), label: `within ${days} days` }));
const JOBS = [
  { value: "none", label: "Not made yet" },
  { value: "made", label: "Made" },
];
const same = (words: readonly string[]) => words.map((value) => ({ value, label: value }));

type Props = { path: string; search: Search; states: readonly string[]; cities: readonly string[] };

/** Keeps the tab and the site that the list was opened for. */
export function DueFilters({ path, search, states, cities }: Props) {
  const kept = (["when", "site"] as const).flatMap((name) => {
    const value = search[name];
    return typeof value === "string" ? [{ name, value }] : [];
  });
  return (
    <SearchBar path={path} q={String(search.q ?? "")} label="Site, city or customer" sort={search.sort}>
      {kept.map((field) => (
        <input key={field.name} type="hidden" {...field} />
      ))}
      <FilterSelect name="kind" label="Kind of test" search={search} options={KINDS} all="Every kind" />
      <FilterSelect name="state" label="State" search={search} options={same(states)} all="Every state" />
      <FilterSelect name="city" label="City" search={search} options={same(cities)} all="Every city" />
      <FilterSelect name="days" label="Latest date" search={search} options={DAYS} all="Any" />
      <FilterSelect name="job" label="Job" search={search} options={JOBS} all="Made or not" />
    </SearchBar>
  );
}
