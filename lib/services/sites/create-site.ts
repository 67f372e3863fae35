import { v7 as uuidv7 } from "uuid";
import { sites } from "@/db/schema/sites";
import { SiteInput } from "@/lib/domain/sites/schemas";
import { command } from "@/lib/services/command";
import { setAccessNote } from "./internal";

export const createSite = command({
  name: "site.create",
  needs: "site:write",
  input: SiteInput,
  async run({ tx, who }, { accessNote, ...site }) {
    const id = uuidv7();
    await tx.insert(sites).values({ ...site, id, companyId: who.companyId });
    if (accessNote) await setAccessNote(tx, who, id, accessNote);
    return { result: { siteId: id }, audit: { entity: "site", entityId: id, after: site } };
  },
});
