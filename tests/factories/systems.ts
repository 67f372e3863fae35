import { v7 as uuidv7 } from "uuid";
import { asActor } from "@/db/door";
import { proofs } from "@/db/schema/proofs";
import { saveMatrix } from "@/lib/services/sequences/save-matrix";
import { addSecret } from "@/lib/services/sites/add-secret";
import { addSystem } from "@/lib/services/systems/add-system";
import { saveEquipment } from "@/lib/services/systems/save-equipment";
import { saveGroup } from "@/lib/services/systems/save-group";
import { saveOutput } from "@/lib/services/systems/save-output";
import { savePoint } from "@/lib/services/systems/save-point";
import { saveZone } from "@/lib/services/systems/save-zone";
import { unique } from "./company";
import type { World } from "./world";

/** A system of its own at the site, with nothing on it. */
export async function bareSystem(w: World): Promise<string> {
  const { owner, site } = w;
  return (await addSystem(owner.context, { siteId: site.siteId, key: unique("S"), name: unique("Panel") })).systemId;
}

/** A zone with one smoke detector, and a fan behind a relay. */
export async function smallSystem(w: World) {
  const { context } = w.owner;
  const systemId = await bareSystem(w);
  const { zoneId } = await saveZone(context, { systemId, key: "1", name: "Lobby" });
  const { pointId } = await savePoint(context, {
    systemId,
    zoneId,
    address: "1-001",
    kind: "smoke",
    label: "Lobby smoke",
  });
  const { groupId } = await saveGroup(context, { systemId, key: "F", name: "Fans", function: "fan_shutdown" });
  const { outputId } = await saveOutput(context, { systemId, groupId, address: "R1", kind: "relay", label: "AHU 1" });
  const { equipmentId } = await saveEquipment(context, {
    systemId,
    outputId,
    tag: "AHU-1",
    kind: "air_handler",
    action: "stop",
  });
  return { systemId, zoneId, pointId, groupId, outputId, equipmentId };
}

/** The small system with a first version of its matrix: the zone stops the fan. */
export async function systemWithMatrix(w: World) {
  const system = await smallSystem(w);
  const { systemId, zoneId, groupId } = system;
  const cell = { zoneId, groupId, signal: "alarm", source: "approved_sequence", delaySeconds: 0 };
  await saveMatrix(w.owner.context, { systemId, basedOn: 0, note: "From the drawings", added: [cell] });
  return { ...system, cell };
}

type Proven = { pointId?: string; groupId?: string; equipmentId?: string };

/** A proof, as a visit will write it. */
export const proof = (w: World, systemId: string, of: Proven, provenOn: string, outcome: "proven" | "failed") =>
  asActor(
    w.owner.actor,
    (tx) =>
      tx.insert(proofs).values({ ...of, id: uuidv7(), companyId: w.company.companyId, systemId, provenOn, outcome }),
    "write",
  );

export const CODE = "7-3-5-1";

export const newSecret = async (w: World, siteId = w.site.siteId): Promise<string> =>
  (await addSecret(w.owner.context, { siteId, kind: "key_box_code", label: unique("Key box"), secret: CODE })).secretId;
