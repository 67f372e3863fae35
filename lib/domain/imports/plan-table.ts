import { columnsOf, type ListName } from "./lists";
import type { Finding, ListRow, Part } from "./rows";

export type Change<R> = { added: R[]; changed: R[]; unchanged: number };
/** What becomes of one table, and every row of it as it will be, by its own key. */
export type Planned<R> = Change<R> & { byKey: ReadonlyMap<string, R> };

/** A row's fields, each with the column that it comes from; `always`: also where the list has no such column. */
export type Fields<R> = { [F in Exclude<keyof R, "id">]?: string };

type Step<L extends ListName, R extends { id: string }> = {
  list: L;
  parts: readonly Part[];
  stored: readonly R[];
  keyOf: (row: Omit<R, "id">) => string;
  /** The column that holds the row's own key. */
  ownKey: string;
  /** None where a parent is missing, which has been said. */
  rowOf: (row: ListRow<L>) => Omit<R, "id"> | null;
  /** Finds what is stored under no key or another one. */
  adopt?: (fresh: Omit<R, "id">, row: ListRow<L>) => R | null;
  /** Fields that an import may change, with their columns. */
  fields: Fields<R>;
  newId: () => string;
  say: (finding: Finding) => void;
};

export const rowsOf = <L extends ListName>(parts: readonly Part[], list: L): { part: Part; row: ListRow<L> }[] =>
  parts
    .filter((part) => part.list === list)
    .flatMap((part) => part.rows.map((row) => ({ part, row: row as ListRow<L> })));

export const findingAt = (
  list: ListName,
  { file, row }: { file: string; row: number },
  column: string,
  message: string,
  value: string | null,
): Finding => ({ file, list, row, column: columnsOf(list)[column]?.heading ?? column, message, value });

/** New, changed or unchanged, by the list's own key; an own key that comes twice is found. */
export function planTable<L extends ListName, R extends { id: string }>(step: Step<L, R>): Planned<R> {
  const byKey = new Map(step.stored.map((row) => [step.keyOf(row), row]));
  const seen = new Map<string, { file: string; row: number }>();
  const plan: Change<R> = { added: [], changed: [], unchanged: 0 };
  for (const { part, row } of rowsOf(step.parts, step.list)) {
    const own = (row.values as Record<string, unknown>)[step.ownKey];
    const fresh = own === undefined ? null : step.rowOf(row);
    if (!fresh) continue;
    const key = step.keyOf(fresh);
    const twin = seen.get(key);
    if (twin) {
      const where = twin.file === row.file ? `row ${twin.row}` : `row ${twin.row} of ${twin.file}`;
      step.say(findingAt(step.list, row, step.ownKey, `This stands in ${where} already`, String(own)));
      continue;
    }
    seen.set(key, row);
    const stored = byKey.get(key) ?? step.adopt?.(fresh, row) ?? null;
    const next = stored ? overlaid(stored, fresh, step.fields, part.present) : ({ ...fresh, id: step.newId() } as R);
    byKey.set(key, next);
    if (!stored) plan.added.push(next);
    else if (next === stored) plan.unchanged += 1;
    else plan.changed.push(next);
  }
  return { ...plan, byKey };
}

/** The stored row with what the list says; a column that the list does not have leaves its field as it is. */
function overlaid<R extends { id: string }>(
  stored: R,
  fresh: Omit<R, "id">,
  fields: Fields<R>,
  present: ReadonlySet<string>,
): R {
  const said = Object.entries(fields).filter(([, column]) => present.has(String(column)) || column === ALWAYS);
  const differs = said.filter(([field]) => fresh[field as keyof typeof fresh] !== stored[field as keyof R]);
  if (differs.length === 0) return stored;
  return { ...stored, ...Object.fromEntries(differs.map(([field]) => [field, fresh[field as keyof typeof fresh]])) };
}

/** In place of a column: counts whether or not the list has it. */
export const ALWAYS = "*";
