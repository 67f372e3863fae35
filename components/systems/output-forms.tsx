import { SelectField, TextField } from "@/components/form/field";
import type { FormAction } from "@/components/form/form";
import { FormDialog } from "@/components/form/form-dialog";
import type { Equipment, Output, OutputGroup } from "@/lib/domain/systems/device-list";
import {
  ACTION_WORDS,
  ACTIONS,
  EQUIPMENT_KIND_WORDS,
  EQUIPMENT_KINDS,
  FUNCTION_WORDS,
  FUNCTIONS,
  OUTPUT_KIND_WORDS,
  OUTPUT_KINDS,
  RESTART_MODE_WORDS,
  RESTART_MODES,
} from "@/lib/domain/systems/words";
import { Options } from "./options";

type Shared = { action: FormAction; systemId: string };

const words = (what: string, there: string | undefined) => ({
  button: there ? "Edit" : `Add ${what}`,
  aside: there,
  look: there ? ("plain" as const) : ("quiet" as const),
  title: there ? `Edit ${there}` : `Add ${what}`,
  submit: there ? "Save" : `Add ${what}`,
});

export const GroupForm = ({ action, systemId, group }: Shared & { group?: OutputGroup }) => (
  <FormDialog
    action={action}
    {...words("group", group?.name)}
    description="What the panel operates together."
    hidden={{ systemId, ...(group && { id: group.id }) }}
  >
    <TextField label="Key" name="key" defaultValue={group?.key} hint="What lists call it" />
    <TextField label="Name" name="name" defaultValue={group?.name} />
    <SelectField label="Function" name="function" defaultValue={group?.function ?? "notification"}>
      <Options values={FUNCTIONS} words={FUNCTION_WORDS} />
    </SelectField>
  </FormDialog>
);

export const OutputForm = ({ action, systemId, groupId, output }: Shared & { groupId: string; output?: Output }) => (
  <FormDialog
    action={action}
    {...words("output", output?.address)}
    description="A relay or a circuit."
    hidden={{ systemId, groupId, ...(output && { id: output.id }) }}
  >
    <div className="grid gap-4 sm:grid-cols-2">
      <TextField label="Address" name="address" defaultValue={output?.address} />
      <SelectField label="Kind" name="kind" defaultValue={output?.kind ?? "relay"}>
        <Options values={OUTPUT_KINDS} words={OUTPUT_KIND_WORDS} />
      </SelectField>
    </div>
    <TextField label="Text at the panel" name="label" defaultValue={output?.label} />
    <TextField label="Location" name="location" optional defaultValue={output?.location} />
  </FormDialog>
);

type EquipmentProps = Shared & { outputId: string; equipment?: Equipment };

export const EquipmentForm = ({ action, systemId, outputId, equipment }: EquipmentProps) => (
  <FormDialog
    action={action}
    {...words("equipment", equipment?.tag)}
    hidden={{ systemId, outputId, ...(equipment && { id: equipment.id }) }}
  >
    <TextField label="Tag" name="tag" defaultValue={equipment?.tag} hint="The building’s own: AHU-3" />
    <div className="grid gap-4 sm:grid-cols-2">
      <SelectField label="Kind" name="kind" defaultValue={equipment?.kind ?? "fan"}>
        <Options values={EQUIPMENT_KINDS} words={EQUIPMENT_KIND_WORDS} />
      </SelectField>
      <SelectField label="When operated, it" name="action" defaultValue={equipment?.action ?? "stop"}>
        <Options values={ACTIONS} words={ACTION_WORDS} />
      </SelectField>
    </div>
    <div className="grid gap-4 sm:grid-cols-2">
      <TextField label="Location" name="location" optional defaultValue={equipment?.location} />
      <TextField label="Serves" name="serves" optional defaultValue={equipment?.serves} />
    </div>
    <SelectField label="Comes back" name="restart" defaultValue={equipment?.restart ?? "unknown"}>
      <Options values={RESTART_MODES} words={RESTART_MODE_WORDS} />
    </SelectField>
    <div className="grid gap-4 sm:grid-cols-2">
      <TextField
        label="Longest off, minutes"
        name="longestOffMinutes"
        optional
        inputMode="numeric"
        defaultValue={equipment?.longestOffMinutes?.toString()}
      />
      <TextField
        label="Between starts, minutes"
        name="minutesBetweenStarts"
        optional
        inputMode="numeric"
        defaultValue={equipment?.minutesBetweenStarts?.toString()}
      />
    </div>
  </FormDialog>
);
