import { PutBackInput } from "@/lib/domain/systems/schemas";
import { command } from "@/lib/services/command";
import { setRemoved } from "./internal";

/** Taken off by mistake, or there again. */
export const putBackEntry = command({
  name: "system.put-back",
  needs: "system:write",
  input: PutBackInput,
  async run({ tx }, entry) {
    await setRemoved(tx, { ...entry, removedOn: null });
    return {
      result: null,
      audit: { entity: "system", entityId: entry.systemId, after: { ...entry, removedOn: null } },
    };
  },
});
