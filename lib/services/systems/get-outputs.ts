import { SystemRef } from "@/lib/domain/systems/schemas";
import { query } from "@/lib/services/command";
import { partsOf, systemById } from "./internal";
import { lastProofs } from "./proofs";

/** What the panel operates and what hangs on that, with when each was last seen to work. */
export const getOutputs = query({
  name: "system.outputs",
  needs: "system:read",
  input: SystemRef,
  async run({ tx }, { systemId }) {
    await systemById(tx, systemId);
    const { groups, outputs, equipment } = await partsOf(tx, systemId);
    return {
      groups,
      outputs,
      equipment,
      proofs: {
        groups: await lastProofs(tx, systemId, "group"),
        equipment: await lastProofs(tx, systemId, "equipment"),
      },
    };
  },
});
