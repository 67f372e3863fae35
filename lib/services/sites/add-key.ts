import { v7 as uuidv7 } from "uuid";
import { siteKeys } from "@/db/schema/sites";
import { KeyInput } from "@/lib/domain/sites/schemas";
import { command } from "@/lib/services/command";
import { siteById } from "@/lib/services/sites/internal";

export const addKey = command({
  name: "site.add-key",
  needs: "site:write",
  input: KeyInput,
  async run({ tx, who }, key) {
    await siteById(tx, key.siteId);
    const id = uuidv7();
    await tx.insert(siteKeys).values({ ...key, id, companyId: who.companyId });
    return { result: { keyId: id }, audit: { entity: "site", entityId: key.siteId, after: key } };
  },
});
