import { scriptRule } from "@/lib/domain/sequences/script-rules";
import { testScript } from "@/lib/domain/sequences/test-script";
import { SystemRef } from "@/lib/domain/systems/schemas";
import { query } from "@/lib/services/command";
import { partsOf, pointsOf, systemById } from "@/lib/services/systems/internal";
import { matrixOf } from "./internal";

/** The test script as it follows from the device list and the newest matrix. */
export const getScript = query({
  name: "system.script",
  needs: "system:read",
  input: SystemRef,
  async run({ tx }, { systemId }) {
    await systemById(tx, systemId);
    const matrix = await matrixOf(tx, systemId, null);
    const parts = await partsOf(tx, systemId);
    const points = await pointsOf(tx, systemId);
    return { matrixVersion: matrix?.number ?? null, ...testScript({ ...parts, points }, matrix, scriptRule) };
  },
});
