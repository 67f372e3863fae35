import { z } from "zod";

/** One column of a list: what its heading is, what stands there, and what else people call it. */
export type Column<S extends z.ZodType = z.ZodType> = {
  heading: string;
  note: string;
  schema: S;
  /** A list without it is refused. */
  required?: true;
  /** Other headings that mean the same, lower case. */
  also?: readonly string[];
};

type More = Pick<Column, "required" | "also">;

export const column = <S extends z.ZodType>(heading: string, schema: S, note: string, more: More = {}): Column<S> => ({
  heading,
  schema,
  note,
  ...more,
});

const plain = (text: string) =>
  text
    .trim()
    .toLowerCase()
    .replace(/[\s_-]+/g, " ");

/** A word of a closed list, as it is stored or as the screens say it; an empty cell means `otherwise`. */
export function choice<K extends string>(values: readonly [K, ...K[]], words: Record<K, string>, otherwise?: K) {
  const meant = new Map(values.flatMap((value) => [value, words[value]].map((text) => [plain(text), value] as const)));
  const known = (cell: unknown) => (cell === undefined ? otherwise : (meant.get(plain(String(cell))) ?? cell));
  const error = ({ input }: { input?: unknown }) =>
    input === undefined ? "That is missing" : `Not one of: ${values.join(", ")}`;
  return z.preprocess(known, z.enum(values, { error }));
}

const asIso = (text: unknown) => {
  const parts = typeof text === "string" ? /^(\d{1,2})\/(\d{1,2})\/(\d{4})$/.exec(text.trim()) : null;
  if (!parts) return text;
  const [, month = "", day = "", year] = parts;
  return `${year}-${month.padStart(2, "0")}-${day.padStart(2, "0")}`;
};

/** `2026-03-31`, or `3/31/2026` as US spreadsheets save it. */
export const dateCell = z.preprocess(
  asIso,
  z.iso.date("That is not a date, like 2026-03-31 or 3/31/2026").nullish().default(null),
);

/** A whole number in bounds; an empty cell means zero. */
export const count = (least: number, most: number) =>
  z.coerce
    .number({ error: "That is not a number" })
    .int("Whole numbers only")
    .min(least, `Not below ${least}`)
    .max(most, `Not above ${most}`)
    .default(0);
