import { RemoveInput } from "@/lib/domain/systems/schemas";
import { command } from "@/lib/services/command";
import { setRemoved } from "./internal";

/** A device, an output or a piece of equipment is there no longer. */
export const removeEntry = command({
  name: "system.remove",
  needs: "system:write",
  input: RemoveInput,
  async run({ tx }, removal) {
    await setRemoved(tx, removal);
    return { result: null, audit: { entity: "system", entityId: removal.systemId, after: removal } };
  },
});
