import type { PointKind, SystemFunction } from "@/lib/domain/systems/words";
import type { Context } from "@/lib/services/command";
import { saveMatrix } from "@/lib/services/sequences/save-matrix";
import { addSystem } from "@/lib/services/systems/add-system";
import { saveEquipment } from "@/lib/services/systems/save-equipment";
import { saveGroup } from "@/lib/services/systems/save-group";
import { saveOutput } from "@/lib/services/systems/save-output";
import { savePoint } from "@/lib/services/systems/save-point";
import { saveZone } from "@/lib/services/systems/save-zone";

const ZONES = ["Lobby and elevators", "Wards, second floor", "Wards, third floor", "Plant rooms"];

const DEVICES: readonly { kind: PointKind; label: string; signal?: "supervisory" }[] = [
  { kind: "smoke", label: "Corridor east" },
  { kind: "smoke", label: "Corridor west" },
  { kind: "pull", label: "Stair door" },
  { kind: "heat", label: "Pantry" },
  { kind: "waterflow", label: "Riser" },
  { kind: "tamper", label: "Riser valve", signal: "supervisory" },
];

type Group = {
  key: string;
  name: string;
  function: SystemFunction;
  behind: readonly { tag: string; kind: string; action: string; longestOffMinutes?: number; restart?: string }[];
};
const GROUPS: readonly Group[] = [
  { key: "NAC", name: "Horns and strobes", function: "notification", behind: [] },
  {
    key: "AHU",
    name: "Ward air handlers",
    function: "fan_shutdown",
    behind: [
      { tag: "AHU-1", kind: "air_handler", action: "stop", longestOffMinutes: 30, restart: "separate_restart" },
      { tag: "AHU-2", kind: "air_handler", action: "stop", longestOffMinutes: 30, restart: "separate_restart" },
    ],
  },
  {
    key: "SPF",
    name: "Stair pressurization",
    function: "smoke_control_start",
    behind: [{ tag: "SPF-1", kind: "fan", action: "start", restart: "with_reset" }],
  },
  {
    key: "DH",
    name: "Corridor doors",
    function: "door_release",
    behind: [{ tag: "D-201", kind: "door", action: "release", restart: "at_unit" }],
  },
  {
    key: "EL",
    name: "Elevator recall",
    function: "elevator_recall",
    behind: [{ tag: "Car 1", kind: "elevator", action: "recall", restart: "at_unit" }],
  },
];

/** One panel put down by hand, with its matrix in two versions. */
export async function addDemoSystem(dispatcher: Context, siteId: string | undefined): Promise<void> {
  const { systemId } = await addSystem(dispatcher, {
    siteId,
    key: "FACU-1",
    name: "Main panel",
    maker: "Harrow & Vale",
    model: "HV-800",
    location: "Ground floor, fire command room",
  });
  const zoneIds: string[] = [];
  let walkOrder = 0;
  for (const [z, name] of ZONES.entries()) {
    const { zoneId } = await saveZone(dispatcher, { systemId, key: String(z + 1), name });
    zoneIds.push(zoneId);
    for (const [d, device] of DEVICES.entries()) {
      const address = `L${z + 1}-${String(d + 1).padStart(3, "0")}`;
      await savePoint(dispatcher, { systemId, zoneId, address, ...device, location: name, walkOrder: ++walkOrder });
    }
  }
  const { pointId: ductId } = await savePoint(dispatcher, {
    systemId,
    zoneId: zoneIds[3],
    address: "L4-010",
    kind: "duct",
    label: "Supply duct, AHU-1",
    signal: "supervisory",
    walkOrder: ++walkOrder,
  });
  const groupIds = await addGroups(dispatcher, systemId);
  await saveVersions(dispatcher, { systemId, zoneIds, groupIds, ductId });
}

async function addGroups(dispatcher: Context, systemId: string): Promise<string[]> {
  const ids: string[] = [];
  for (const [i, { behind, ...group }] of GROUPS.entries()) {
    const { groupId } = await saveGroup(dispatcher, { systemId, ...group });
    ids.push(groupId);
    const kind = group.function === "notification" ? "notification_circuit" : "relay";
    const { outputId } = await saveOutput(dispatcher, {
      systemId,
      groupId,
      address: `R${i + 1}`,
      kind,
      label: group.name,
    });
    for (const equipment of behind) await saveEquipment(dispatcher, { systemId, outputId, ...equipment });
  }
  return ids;
}

type Ids = { systemId: string; zoneIds: string[]; groupIds: string[]; ductId: string };

async function saveVersions(dispatcher: Context, { systemId, zoneIds, groupIds, ductId }: Ids): Promise<void> {
  const cell = (zoneId: string | undefined, group: number) => ({
    zoneId,
    groupId: groupIds[group],
    signal: "alarm",
    source: "approved_sequence",
    delaySeconds: 0,
  });
  const everyZone = [0, 1, 3].flatMap((group) => zoneIds.map((zoneId) => cell(zoneId, group)));
  await saveMatrix(dispatcher, {
    systemId,
    basedOn: 0,
    note: "From the sequence of operation, revision C",
    added: [...everyZone, cell(zoneIds[0], 4)],
  });
  await saveMatrix(dispatcher, {
    systemId,
    basedOn: 1,
    note: "Stairs and the duct detector, from the panel’s program of the spring",
    removed: [cell(zoneIds[3], 1)],
    added: [
      { ...cell(zoneIds[1], 2), source: "panel_program", delaySeconds: 20 },
      { ...cell(zoneIds[2], 2), source: "panel_program", delaySeconds: 20 },
      { pointId: ductId, groupId: groupIds[1], signal: "supervisory", source: "as_found", delaySeconds: 0 },
    ],
  });
}
