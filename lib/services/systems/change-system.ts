import { eq } from "drizzle-orm";
import { systems } from "@/db/schema/systems";
import { ChangeSystemInput } from "@/lib/domain/systems/schemas";
import { command } from "@/lib/services/command";
import { systemById } from "./internal";

export const changeSystem = command({
  name: "system.change",
  needs: "system:write",
  input: ChangeSystemInput,
  async run({ tx }, { systemId, ...facts }) {
    const before = await systemById(tx, systemId);
    await tx.update(systems).set(facts).where(eq(systems.id, systemId));
    return { result: null, audit: { entity: "system", entityId: systemId, before, after: facts } };
  },
});
