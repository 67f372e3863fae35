import { and, eq } from "drizzle-orm";
import { v7 as uuidv7 } from "uuid";
import { zones } from "@/db/schema/systems";
import { ZoneInput } from "@/lib/domain/systems/schemas";
import { notFound } from "@/lib/errors";
import { command } from "@/lib/services/command";
import { systemById } from "./internal";

/** Adds a zone, or changes the one whose id is given. */
export const saveZone = command({
  name: "system.save-zone",
  needs: "system:write",
  input: ZoneInput,
  async run({ tx, who }, { id: known, systemId, ...facts }) {
    await systemById(tx, systemId);
    const id = known ?? uuidv7();
    const own = and(eq(zones.id, id), eq(zones.systemId, systemId));
    const [before] = known ? await tx.select().from(zones).where(own) : [];
    if (known && !before) throw notFound("zone");
    if (before) await tx.update(zones).set(facts).where(own);
    else await tx.insert(zones).values({ ...facts, id, systemId, companyId: who.companyId });
    return {
      result: { zoneId: id },
      audit: { entity: "system", entityId: systemId, before, after: { zoneId: id, ...facts } },
    };
  },
});
