import { and, eq, isNull } from "drizzle-orm";
import { siteKeys } from "@/db/schema/sites";
import { HandOverKeyInput } from "@/lib/domain/sites/schemas";
import { notFound } from "@/lib/errors";
import { command } from "@/lib/services/command";

/** Who has it now; who had it before stays in the audit trail. */
export const handOverKey = command({
  name: "site.hand-over-key",
  needs: "site:write",
  input: HandOverKeyInput,
  async run({ tx }, { keyId, keptBy }) {
    const held = and(eq(siteKeys.id, keyId), isNull(siteKeys.endedAt));
    const [key] = await tx.select().from(siteKeys).where(held).for("update");
    if (!key) throw notFound("key");
    await tx.update(siteKeys).set({ keptBy }).where(held);
    return {
      result: null,
      audit: {
        entity: "site",
        entityId: key.siteId,
        before: { keyId, keptBy: key.keptBy },
        after: { keyId, keptBy },
      },
    };
  },
});
