import { z } from "zod";
import { rowId } from "@/lib/domain/shared/inputs";
import { LIST_NAMES } from "./lists";

/** What one import takes: enough for some fifty thousand devices. */
export const LARGEST_IMPORT_BYTES = 8 * 1024 * 1024;
const MOST_FILES = 40;

const ListChoice = z.enum(LIST_NAMES).nullish();
const ColumnChoice = z.record(z.coerce.number().int().min(0), z.string().max(60).nullable());

/** What is decided about each file at the screen: which list it is, and what its headings mean. */
export const FileChoice = z.object({ list: ListChoice, columns: ColumnChoice.optional() });
export type FileChoice = z.infer<typeof FileChoice>;

const ImportFile = FileChoice.extend({
  name: z.string().trim().min(1).max(200),
  content: z.union([z.instanceof(Uint8Array), z.string()]),
});

export const ImportInput = z.object({
  /** The system that rows belong to which name none. */
  systemId: z.preprocess((value) => (value === "" || value === undefined ? null : value), z.union([z.null(), rowId])),
  files: z
    .array(ImportFile)
    .min(1, "Choose a file, or paste a list")
    .max(MOST_FILES, `One import takes up to ${MOST_FILES} files`)
    .refine(
      (files) => files.reduce((sum, { content }) => sum + content.length, 0) <= LARGEST_IMPORT_BYTES,
      "That is more than one import takes: 8 MB. Import it in parts",
    ),
});
