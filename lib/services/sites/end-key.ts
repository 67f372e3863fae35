import { siteKeys } from "@/db/schema/sites";
import { KeyRef } from "@/lib/domain/sites/schemas";
import { command } from "@/lib/services/command";
import { endEntry } from "@/lib/services/sites/internal";

export const endKey = command({
  name: "site.end-key",
  needs: "site:write",
  input: KeyRef,
  async run({ tx, now }, { keyId }) {
    const siteId = await endEntry(tx, siteKeys, keyId, now, "key");
    return { result: null, audit: { entity: "site", entityId: siteId, after: { keyId, endedAt: now } } };
  },
});
