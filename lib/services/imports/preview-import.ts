import { ImportInput } from "@/lib/domain/imports/schemas";
import type { Preview } from "@/lib/domain/imports/view";
import { query } from "@/lib/services/command";
import { prepare, summary } from "./prepare";

/** So many are told with their place; of more, the number. */
const MOST_FINDINGS = 25_000;

/** What an import would do, with everything that stands against it; changes nothing. */
export const previewImport = query({
  name: "system.preview-import",
  needs: "system:write",
  input: ImportInput,
  async run({ tx, now }, input): Promise<Preview> {
    const prepared = await prepare(tx, now, input);
    return {
      files: prepared.files.map(({ view }) => view),
      summary: summary(prepared),
      findings: prepared.findings.slice(0, MOST_FINDINGS),
      findingCount: prepared.findings.length,
    };
  },
});
