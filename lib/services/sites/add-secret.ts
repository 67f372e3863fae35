import { v7 as uuidv7 } from "uuid";
import { siteSecrets } from "@/db/schema/sites";
import { seal } from "@/lib/auth/secrets";
import { SecretInput } from "@/lib/domain/sites/schemas";
import { command } from "@/lib/services/command";
import { siteById } from "./internal";

export const addSecret = command({
  name: "secret.add",
  needs: "secret:write",
  input: SecretInput,
  async run({ tx, who }, { secret, ...named }) {
    await siteById(tx, named.siteId);
    const id = uuidv7();
    const sealed = seal(secret, { companyId: who.companyId, secretId: id });
    await tx.insert(siteSecrets).values({ ...named, sealed, id, companyId: who.companyId });
    return {
      result: { secretId: id },
      audit: { entity: "site", entityId: named.siteId, after: { secretId: id, kind: named.kind, label: named.label } },
    };
  },
});
