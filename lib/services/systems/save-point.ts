import { and, eq } from "drizzle-orm";
import { v7 as uuidv7 } from "uuid";
import { points } from "@/db/schema/systems";
import { PointInput } from "@/lib/domain/systems/schemas";
import { notFound } from "@/lib/errors";
import { command } from "@/lib/services/command";
import { systemById } from "./internal";

/** Adds a device, or changes the one whose id is given. */
export const savePoint = command({
  name: "system.save-point",
  needs: "system:write",
  input: PointInput,
  async run({ tx, who }, { id: known, systemId, ...facts }) {
    await systemById(tx, systemId);
    const id = known ?? uuidv7();
    const own = and(eq(points.id, id), eq(points.systemId, systemId));
    const [before] = known ? await tx.select().from(points).where(own) : [];
    if (known && !before) throw notFound("device");
    if (before) await tx.update(points).set(facts).where(own);
    else await tx.insert(points).values({ ...facts, id, systemId, companyId: who.companyId });
    return {
      result: { pointId: id },
      audit: { entity: "system", entityId: systemId, before, after: { pointId: id, ...facts } },
    };
  },
});
