import { v7 as uuidv7 } from "uuid";
import { siteDocuments } from "@/db/schema/sites";
import { DocumentInput } from "@/lib/domain/sites/schemas";
import { command } from "@/lib/services/command";
import { siteById } from "@/lib/services/sites/internal";

export const addDocument = command({
  name: "site.add-document",
  needs: "site:write",
  input: DocumentInput,
  async run({ tx, who }, document) {
    await siteById(tx, document.siteId);
    const id = uuidv7();
    await tx.insert(siteDocuments).values({ ...document, id, companyId: who.companyId });
    return { result: { documentId: id }, audit: { entity: "site", entityId: document.siteId, after: document } };
  },
});
