"use server";

import { changeSystem } from "@/lib/services/systems/change-system";
import { putBackEntry } from "@/lib/services/systems/put-back-entry";
import { removeEntry } from "@/lib/services/systems/remove-entry";
import { saveEquipment } from "@/lib/services/systems/save-equipment";
import { saveGroup } from "@/lib/services/systems/save-group";
import { saveOutput } from "@/lib/services/systems/save-output";
import { savePoint } from "@/lib/services/systems/save-point";
import { saveZone } from "@/lib/services/systems/save-zone";
import { action } from "@/lib/web/action";

export const changeSystemAction = action(changeSystem, { done: "System saved" });
export const saveZoneAction = action(saveZone, { done: "Zone saved" });
export const savePointAction = action(savePoint, { done: "Device saved" });
export const saveGroupAction = action(saveGroup, { done: "Group saved" });
export const saveOutputAction = action(saveOutput, { done: "Output saved" });
export const saveEquipmentAction = action(saveEquipment, { done: "Equipment saved" });
export const removeEntryAction = action(removeEntry, { done: "Taken off the list" });
export const putBackEntryAction = action(putBackEntry, { done: "Back on the list" });
