import { siteDocuments } from "@/db/schema/sites";
import { DocumentRef } from "@/lib/domain/sites/schemas";
import { command } from "@/lib/services/command";
import { endEntry } from "@/lib/services/sites/internal";

export const endDocument = command({
  name: "site.end-document",
  needs: "site:write",
  input: DocumentRef,
  async run({ tx, now }, { documentId }) {
    const siteId = await endEntry(tx, siteDocuments, documentId, now, "document");
    return { result: null, audit: { entity: "site", entityId: siteId, after: { documentId, endedAt: now } } };
  },
});
