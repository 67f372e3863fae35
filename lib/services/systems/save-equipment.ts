import { and, eq } from "drizzle-orm";
import { v7 as uuidv7 } from "uuid";
import { equipment } from "@/db/schema/systems";
import { EquipmentInput } from "@/lib/domain/systems/schemas";
import { notFound } from "@/lib/errors";
import { command } from "@/lib/services/command";
import { systemById } from "./internal";

/** Adds a piece of equipment, or changes the one whose id is given. */
export const saveEquipment = command({
  name: "system.save-equipment",
  needs: "system:write",
  input: EquipmentInput,
  async run({ tx, who }, { id: known, systemId, ...facts }) {
    await systemById(tx, systemId);
    const id = known ?? uuidv7();
    const own = and(eq(equipment.id, id), eq(equipment.systemId, systemId));
    const [before] = known ? await tx.select().from(equipment).where(own) : [];
    if (known && !before) throw notFound("equipment");
    if (before) await tx.update(equipment).set(facts).where(own);
    else await tx.insert(equipment).values({ ...facts, id, systemId, companyId: who.companyId });
    return {
      result: { equipmentId: id },
      audit: { entity: "system", entityId: systemId, before, after: { equipmentId: id, ...facts } },
    };
  },
});
