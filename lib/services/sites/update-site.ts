import { eq } from "drizzle-orm";
import { sites } from "@/db/schema/sites";
import { UpdateSiteInput } from "@/lib/domain/sites/schemas";
import { command } from "@/lib/services/command";
import { setAccessNote, siteById } from "./internal";

export const updateSite = command({
  name: "site.update",
  needs: "site:write",
  input: UpdateSiteInput,
  async run({ tx, who }, { siteId, accessNote, ...site }) {
    const before = await siteById(tx, siteId);
    await tx.update(sites).set(site).where(eq(sites.id, siteId));
    await setAccessNote(tx, who, siteId, accessNote);
    return { result: null, audit: { entity: "site", entityId: siteId, before, after: site } };
  },
});
