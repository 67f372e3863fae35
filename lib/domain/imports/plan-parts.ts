import type { CalendarDate } from "@/lib/domain/shared/zone";
import {
  type EquipmentRow,
  type GroupRow,
  type KnownParts,
  type OutputRow,
  type PointRow,
  provenKey,
  type ZoneRow,
} from "./known";
import { type MatrixPlan, planMatrix } from "./plan-matrix";
import { type Places, within } from "./plan-places";
import { ALWAYS, type Change, findingAt, planTable, rowsOf } from "./plan-table";
import type { Finding, ListRow, Part } from "./rows";

type ProofRow = {
  id: string;
  systemId: string;
  pointId: string | null;
  groupId: string | null;
  equipmentId: string | null;
  provenOn: CalendarDate;
  method: string | null;
};

export type PartsPlan = {
  zones: Change<ZoneRow>;
  groups: Change<GroupRow>;
  points: Change<PointRow>;
  outputs: Change<OutputRow>;
  equipment: Change<EquipmentRow>;
  matrix: MatrixPlan[];
  proofs: ProofRow[];
};

export type Means = {
  newId: () => string;
  say: (finding: Finding) => void;
  /** The date where a site stands. */
  todayIn: (zone: string) => CalendarDate;
};

/** The systems of the company's own that the lists speak of: what is on them has to be known before the rest is planned. */
export function systemsSpokenOf(parts: readonly Part[], { systemOf }: Places): string[] {
  const lists = ["zones", "output_groups", "points", "outputs", "equipment", "matrix"] as const;
  const spoken = lists.flatMap((list) => rowsOf(parts, list).flatMap(({ row }) => systemOf(list, row)?.id ?? []));
  return [...new Set(spoken)];
}

/** Everything that hangs on the systems: what is new, what changes, and what does not fit together. */
export function planParts(parts: readonly Part[], places: Places, known: KnownParts, means: Means): PartsPlan {
  const shared = { ...means, parts };
  const { say } = means;
  const { systemOf } = places;
  const keyOf = (row: { systemId: string; key: string }) => within(row.systemId, row.key);
  const addressOf = (row: { systemId: string; address: string }) => within(row.systemId, row.address);

  const zones = planTable<"zones", ZoneRow>({
    ...shared,
    list: "zones",
    ownKey: "zone",
    stored: known.zones,
    keyOf,
    rowOf: (row) => {
      const system = systemOf("zones", row);
      return system && { systemId: system.id, key: row.values.zone, name: row.values.name };
    },
    fields: { name: "name" },
  });

  const groups = planTable<"output_groups", GroupRow>({
    ...shared,
    list: "output_groups",
    ownKey: "group",
    stored: known.groups,
    keyOf,
    rowOf: (row) => {
      const system = systemOf("output_groups", row);
      const { group: key, name, function: does } = row.values;
      return system && { systemId: system.id, key, name, function: does };
    },
    fields: { name: "name", function: "function" },
  });

  const points = planTable<"points", PointRow>({
    ...shared,
    list: "points",
    ownKey: "address",
    stored: known.points,
    keyOf: addressOf,
    rowOf: (row) => {
      const system = systemOf("points", row);
      if (!system) return null;
      const { address, kind, label, location, signal, walkOrder, removedOn } = row.values;
      const zoneId = parentOf(
        "points",
        row,
        "zone",
        system.id,
        zones.byKey,
        "There is no such zone in this system",
        say,
      );
      return { systemId: system.id, zoneId, address, kind, label, location, signal, walkOrder, removedOn };
    },
    fields: {
      zoneId: "zone",
      kind: "kind",
      label: "label",
      location: "location",
      signal: "signal",
      walkOrder: "walkOrder",
      removedOn: ALWAYS,
    },
  });

  const outputs = planTable<"outputs", OutputRow>({
    ...shared,
    list: "outputs",
    ownKey: "address",
    stored: known.outputs,
    keyOf: addressOf,
    rowOf: (row) => {
      const system = systemOf("outputs", row);
      if (!system) return null;
      const { address, kind, label, location, removedOn } = row.values;
      const groupId =
        parentOf("outputs", row, "group", system.id, groups.byKey, "There is no such group in this system", say) ?? "";
      return { systemId: system.id, groupId, address, kind, label, location, removedOn };
    },
    fields: { groupId: "group", kind: "kind", label: "label", location: "location", removedOn: ALWAYS },
  });

  const equipment = planTable<"equipment", EquipmentRow>({
    ...shared,
    list: "equipment",
    ownKey: "tag",
    stored: known.equipment,
    keyOf: ({ systemId, tag }) => within(systemId, tag),
    rowOf: (row) => {
      const system = systemOf("equipment", row);
      if (!system) return null;
      const { site: _, system: __, output: ___, lastProven: ____, method: _____, ...facts } = row.values;
      const outputId =
        parentOf("equipment", row, "output", system.id, outputs.byKey, "There is no such output in this system", say) ??
        "";
      return { ...facts, systemId: system.id, outputId };
    },
    fields: {
      outputId: "output",
      kind: "kind",
      action: "action",
      location: "location",
      serves: "serves",
      restart: "restart",
      longestOffMinutes: "longestOffMinutes",
      minutesBetweenStarts: "minutesBetweenStarts",
      removedOn: ALWAYS,
    },
  });

  const byOwnKey = { output_groups: groups.byKey, points: points.byKey, equipment: equipment.byKey } as const;
  const proofs = planProofs(parts, places, known, byOwnKey, means);
  const inputs = { zones: zones.byKey, points: points.byKey, groups: groups.byKey };
  return { zones, groups, points, outputs, equipment, proofs, matrix: planMatrix(parts, places, known, inputs, means) };
}

type Own = ReadonlyMap<string, { id: string }>;

/** The row that a cell names by its key; none where the cell is empty, or where there is no such row, which is said. */
function parentOf<L extends "points" | "outputs" | "equipment">(
  list: L,
  row: ListRow<L>,
  column: string,
  systemId: string,
  parents: Own,
  otherwise: string,
  say: Means["say"],
): string | null {
  const key = (row.values as Record<string, unknown>)[column];
  if (typeof key !== "string") return null;
  const parent = parents.get(within(systemId, key));
  if (!parent) say(findingAt(list, row, column, otherwise, key));
  return parent?.id ?? null;
}

const PROVABLE = [
  { list: "output_groups", own: "group", field: "groupId" },
  { list: "points", own: "address", field: "pointId" },
  { list: "equipment", own: "tag", field: "equipmentId" },
] as const;

/** What the lists say was seen to work, where that is not known already. */
function planProofs(
  parts: readonly Part[],
  { systemOf, siteById }: Places,
  { proven }: KnownParts,
  things: Record<(typeof PROVABLE)[number]["list"], Own>,
  { newId, say, todayIn }: Means,
): ProofRow[] {
  const proofs: ProofRow[] = [];
  for (const { list, own, field } of PROVABLE) {
    for (const { row } of rowsOf(parts, list)) {
      const values = row.values as { lastProven?: string | null; method?: string | null } & Record<string, unknown>;
      const { lastProven, method = null } = values;
      if (lastProven === null && method) say(findingAt(list, row, "method", "A method without its date", method));
      if (!lastProven) continue;
      const system = systemOf(list, row);
      const thing = system && things[list].get(within(system.id, String(values[own])));
      if (!thing) continue;
      const today = todayIn(siteById.get(system.siteId)?.zone ?? "UTC");
      if (lastProven > today) say(findingAt(list, row, "lastProven", "That date lies ahead", lastProven));
      if (proven.has(provenKey(thing.id, lastProven))) continue;
      const none = { pointId: null, groupId: null, equipmentId: null };
      proofs.push({ ...none, id: newId(), systemId: system.id, [field]: thing.id, provenOn: lastProven, method });
    }
  }
  return proofs;
}
