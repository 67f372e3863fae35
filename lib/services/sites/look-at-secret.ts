import { and, eq, isNull } from "drizzle-orm";
import { siteSecrets } from "@/db/schema/sites";
import { unseal } from "@/lib/auth/secrets";
import { SecretRef } from "@/lib/domain/sites/schemas";
import { notFound } from "@/lib/errors";
import { command } from "@/lib/services/command";

/** A command, though it changes nothing: no look without its entry in the audit trail. */
export const lookAtSecret = command({
  name: "secret.look",
  needs: "secret:look",
  input: SecretRef,
  async run({ tx, who }, { secretId }) {
    const [secret] = await tx
      .select()
      .from(siteSecrets)
      .where(and(eq(siteSecrets.id, secretId), isNull(siteSecrets.endedAt)));
    if (!secret) throw notFound("code");
    const { kind, label, siteId, sealed } = secret;
    return {
      result: { code: unseal(sealed, { companyId: who.companyId, secretId }) },
      audit: { entity: "site", entityId: siteId, after: { secretId, kind, label } },
    };
  },
});
