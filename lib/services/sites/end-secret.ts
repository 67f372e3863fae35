import { and, eq, isNull } from "drizzle-orm";
import { siteSecrets } from "@/db/schema/sites";
import { SecretRef } from "@/lib/domain/sites/schemas";
import { notFound } from "@/lib/errors";
import { command } from "@/lib/services/command";

/** The code itself goes; that there was one, and until when, stays. */
export const endSecret = command({
  name: "secret.end",
  needs: "secret:write",
  input: SecretRef,
  async run({ tx, now }, { secretId }) {
    const [ended] = await tx
      .update(siteSecrets)
      .set({ endedAt: now, sealed: "" })
      .where(and(eq(siteSecrets.id, secretId), isNull(siteSecrets.endedAt)))
      .returning({ siteId: siteSecrets.siteId });
    if (!ended) throw notFound("code");
    return { result: null, audit: { entity: "site", entityId: ended.siteId, after: { secretId, endedAt: now } } };
  },
});
