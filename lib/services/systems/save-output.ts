import { and, eq } from "drizzle-orm";
import { v7 as uuidv7 } from "uuid";
import { outputs } from "@/db/schema/systems";
import { OutputInput } from "@/lib/domain/systems/schemas";
import { notFound } from "@/lib/errors";
import { command } from "@/lib/services/command";
import { systemById } from "./internal";

/** Adds an output, or changes the one whose id is given. */
export const saveOutput = command({
  name: "system.save-output",
  needs: "system:write",
  input: OutputInput,
  async run({ tx, who }, { id: known, systemId, ...facts }) {
    await systemById(tx, systemId);
    const id = known ?? uuidv7();
    const own = and(eq(outputs.id, id), eq(outputs.systemId, systemId));
    const [before] = known ? await tx.select().from(outputs).where(own) : [];
    if (known && !before) throw notFound("output");
    if (before) await tx.update(outputs).set(facts).where(own);
    else await tx.insert(outputs).values({ ...facts, id, systemId, companyId: who.companyId });
    return {
      result: { outputId: id },
      audit: { entity: "system", entityId: systemId, before, after: { outputId: id, ...facts } },
    };
  },
});
