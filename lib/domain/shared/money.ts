import { z } from "zod";

/** Whole cents; a number beyond that is no amount of ours. */
export type Cents = number;

const DOLLARS = /^\$?\s*(\d{1,3}(?:,\d{3})+|\d+)(?:\.(\d{1,2}))?$/;
const MOST_CENTS = 99_999_999_99;

/** `$1,234.5` is 123450. Read digit by digit: no fraction of a cent is ever made. Null for what is not an amount. */
export function centsOf(dollars: string): Cents | null {
  const found = DOLLARS.exec(dollars.trim());
  if (!found) return null;
  const [, whole = "", part = ""] = found;
  const cents = Number(whole.replaceAll(",", "")) * 100 + Number(part.padEnd(2, "0"));
  return cents <= MOST_CENTS ? cents : null;
}

/** `1,234.50`, as it is typed. */
export function dollarsOf(cents: Cents): string {
  const [whole, part] = [Math.trunc(cents / 100), Math.abs(cents % 100)];
  return `${String(whole).replace(/\B(?=(\d{3})+$)/g, ",")}.${String(part).padStart(2, "0")}`;
}

export const moneyWords = (cents: Cents): string => `$${dollarsOf(cents)}`;

/** Typed as dollars, kept as cents. */
export const dollars = z.string({ error: "Give an amount" }).transform((text, context) => {
  const cents = centsOf(text);
  if (cents !== null) return cents;
  context.addIssue({ code: "custom", message: "An amount in dollars, like 1,250.00" });
  return z.NEVER;
});

export const optionalDollars = z.preprocess(
  (value) => (typeof value === "string" && value.trim() === "" ? null : value),
  dollars.nullish().default(null),
);
