import { v7 as uuidv7 } from "uuid";
import { systems } from "@/db/schema/systems";
import { SystemInput } from "@/lib/domain/systems/schemas";
import { command } from "@/lib/services/command";
import { siteById } from "@/lib/services/sites/internal";

export const addSystem = command({
  name: "system.add",
  needs: "system:write",
  input: SystemInput,
  async run({ tx, who }, system) {
    await siteById(tx, system.siteId);
    const id = uuidv7();
    await tx.insert(systems).values({ ...system, id, companyId: who.companyId });
    return { result: { systemId: id }, audit: { entity: "system", entityId: id, after: system } };
  },
});
