import { and, eq } from "drizzle-orm";
import { v7 as uuidv7 } from "uuid";
import { outputGroups } from "@/db/schema/systems";
import { GroupInput } from "@/lib/domain/systems/schemas";
import { notFound } from "@/lib/errors";
import { command } from "@/lib/services/command";
import { systemById } from "./internal";

/** Adds an output group, or changes the one whose id is given. */
export const saveGroup = command({
  name: "system.save-group",
  needs: "system:write",
  input: GroupInput,
  async run({ tx, who }, { id: known, systemId, ...facts }) {
    await systemById(tx, systemId);
    const id = known ?? uuidv7();
    const own = and(eq(outputGroups.id, id), eq(outputGroups.systemId, systemId));
    const [before] = known ? await tx.select().from(outputGroups).where(own) : [];
    if (known && !before) throw notFound("output group");
    if (before) await tx.update(outputGroups).set(facts).where(own);
    else await tx.insert(outputGroups).values({ ...facts, id, systemId, companyId: who.companyId });
    return {
      result: { groupId: id },
      audit: { entity: "system", entityId: systemId, before, after: { groupId: id, ...facts } },
    };
  },
});
