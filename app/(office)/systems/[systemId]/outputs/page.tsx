import type { Metadata } from "next";
import { may } from "@/app/frame";
import { OutputsList } from "@/components/systems/outputs-list";
import { getOutputs } from "@/lib/services/systems/get-outputs";
import { getSystem } from "@/lib/services/systems/get-system";
import { read } from "@/lib/web/page";
import * as actions from "../../actions";

export const metadata: Metadata = { title: "Outputs and equipment" };

export default async function OutputsPage({ params }: PageProps<"/systems/[systemId]/outputs">) {
  const { systemId } = await params;
  const { today } = await read(getSystem, { systemId });
  return (
    <OutputsList
      {...(await read(getOutputs, { systemId }))}
      systemId={systemId}
      today={today}
      mayChange={await may("system:write")}
      actions={{
        saveGroup: actions.saveGroupAction,
        saveOutput: actions.saveOutputAction,
        saveEquipment: actions.saveEquipmentAction,
        remove: actions.removeEntryAction,
        putBack: actions.putBackEntryAction,
      }}
    />
  );
}
