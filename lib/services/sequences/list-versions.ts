import { type CellRow, cellsOf, difference } from "@/lib/domain/sequences/matrix";
import { SystemRef } from "@/lib/domain/systems/schemas";
import { query } from "@/lib/services/command";
import { partsOf, pointsOf, systemById } from "@/lib/services/systems/internal";
import { cellRows, versionsOf } from "./internal";

/** Words beyond which a version's changes are only counted. */
const WORDS_SHOWN = 40;

/** Who made which version of the matrix when, why, and what changed. */
export const listVersions = query({
  name: "matrix.versions",
  needs: "system:read",
  input: SystemRef,
  async run({ tx }, { systemId }) {
    await systemById(tx, systemId);
    const versions = await versionsOf(tx, systemId);
    const rows: CellRow[] = await cellRows(tx, systemId);
    const { zones, groups } = await partsOf(tx, systemId);
    const names = new Map([
      ...zones.map((zone) => [zone.id, `zone ${zone.key}`] as const),
      ...(await pointsOf(tx, systemId)).map((point) => [point.id, point.address] as const),
      ...groups.map((group) => [group.id, group.name] as const),
    ]);
    return versions.map((version) => {
      const cells = cellsOf(version.number, rows);
      const changes = difference(cellsOf(version.number - 1, rows), cells, (id) => names.get(id) ?? "unknown");
      return {
        ...version,
        cells: cells.length,
        changes: changes.slice(0, WORDS_SHOWN),
        changesLeftOut: Math.max(0, changes.length - WORDS_SHOWN),
      };
    });
  },
});
