import type { CellKey, MatrixCell } from "@/lib/domain/sequences/matrix";
import { grouped } from "@/lib/domain/shared/grouped";
import type { MatrixFacts, MatrixPoint, PairProof } from "./matrix-facts";

/** An input of the matrix: a zone, which opens to its devices, or a device. */
export type MatrixRow =
  | { kind: "zone"; id: string; key: string; label: string; devices: number; open: boolean }
  | { kind: "point"; id: string; key: string; label: string; removed: boolean; inZone: boolean };

/** Zones, the devices of those that are open, and devices of no zone; a removed device only while cells name it. */
export function rowsOf(
  { zones, points }: MatrixFacts,
  cells: Iterable<MatrixCell>,
  open: ReadonlySet<string>,
): MatrixRow[] {
  const named = new Set([...cells].map(({ pointId }) => pointId));
  const shown = points.filter(({ id, removedOn }) => removedOn === null || named.has(id));
  const ofZone = grouped(shown, ({ zoneId }) => zoneId);
  const rowOf = (point: MatrixPoint): MatrixRow => ({
    kind: "point",
    id: point.id,
    key: point.address,
    label: point.label,
    removed: point.removedOn !== null,
    inZone: point.zoneId !== null,
  });
  return [
    ...zones.flatMap((zone): MatrixRow[] => {
      const devices = ofZone.get(zone.id) ?? [];
      const head = { id: zone.id, key: zone.key, label: zone.name, devices: devices.length, open: open.has(zone.id) };
      return [{ kind: "zone", ...head }, ...(head.open ? devices.map(rowOf) : [])];
    }),
    ...(ofZone.get(null) ?? []).map(rowOf),
  ];
}

export const inputOf = (row: MatrixRow): Pick<CellKey, "zoneId" | "pointId"> =>
  row.kind === "zone" ? { zoneId: row.id, pointId: null } : { zoneId: null, pointId: row.id };

/** Where one input and one output group meet. */
export const placeOf = (inputId: string, groupId: string): string => `${inputId}/${groupId}`;

export const byPlace = (cells: Iterable<MatrixCell>): Map<string, MatrixCell[]> =>
  grouped([...cells], ({ zoneId, pointId, groupId }) => placeOf(zoneId ?? pointId ?? "", groupId));

/** The last proof of each pair; a zone has that of its device that was tried last. */
export function proofsByPlace({ proofs, points }: MatrixFacts): Map<string, PairProof> {
  const zoneOf = new Map(points.map(({ id, zoneId }) => [id, zoneId]));
  const last = new Map<string, PairProof>();
  for (const proof of proofs) {
    for (const inputId of [proof.pointId, zoneOf.get(proof.pointId)]) {
      if (!inputId) continue;
      const place = placeOf(inputId, proof.groupId);
      const known = last.get(place);
      if (!known || known.on < proof.on) last.set(place, proof);
    }
  }
  return last;
}
