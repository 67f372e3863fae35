import { z } from "zod";

export const PAGE_SIZE = 25;

/** What every list takes from the address bar: forgiving, since people type there. */
export const PageInput = z.object({
  page: z.coerce.number().int().min(1).max(100_000).catch(1).default(1),
  q: z.string().trim().max(200).catch("").default(""),
});

export const offsetOf = (page: number): number => (page - 1) * PAGE_SIZE;

/** A pattern for ILIKE that takes what was typed literally. */
export const containing = (text: string): string => `%${text.replace(/[\\%_]/g, "\\$&")}%`;
