import { MatrixRef } from "@/lib/domain/systems/schemas";
import { query } from "@/lib/services/command";
import { partsOf, pointsOf, systemById } from "@/lib/services/systems/internal";
import { pairProofs } from "@/lib/services/systems/proofs";
import { matrixOf, versionsOf } from "./internal";

/** A version of the matrix with everything that its grid shows. */
export const getMatrix = query({
  name: "matrix.get",
  needs: "system:read",
  input: MatrixRef,
  async run({ tx }, { systemId, version }) {
    await systemById(tx, systemId);
    const { zones, groups } = await partsOf(tx, systemId);
    const points = await pointsOf(tx, systemId);
    const [newest] = await versionsOf(tx, systemId);
    return {
      newest: newest?.number ?? 0,
      version: await matrixOf(tx, systemId, version),
      zones,
      groups,
      points: points.map(({ id, zoneId, address, label, kind, removedOn }) => ({
        id,
        zoneId,
        address,
        label,
        kind,
        removedOn,
      })),
      proofs: await pairProofs(tx, systemId),
    };
  },
});
