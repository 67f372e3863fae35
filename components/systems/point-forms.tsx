import { SelectField, TextField } from "@/components/form/field";
import type { FormAction } from "@/components/form/form";
import { FormDialog } from "@/components/form/form-dialog";
import type { Point, PointZone } from "@/lib/domain/systems/device-list";
import { POINT_KIND_WORDS, POINT_KINDS, SIGNAL_WORDS, SIGNALS } from "@/lib/domain/systems/words";
import { Options } from "./options";

type ZoneProps = { action: FormAction; systemId: string; zone?: PointZone };

export const ZoneForm = ({ action, systemId, zone }: ZoneProps) => (
  <FormDialog
    action={action}
    button={zone ? `Edit zone ${zone.key}` : "Add zone"}
    title={zone ? `Zone ${zone.key}` : "Add a zone"}
    submit={zone ? "Save" : "Add zone"}
    hidden={{ systemId, ...(zone && { id: zone.id }) }}
  >
    <TextField label="Key" name="key" hint="Its number or letter at the panel" defaultValue={zone?.key} />
    <TextField label="Name" name="name" defaultValue={zone?.name} />
  </FormDialog>
);

type Props = { action: FormAction; systemId: string; zones: readonly PointZone[]; point?: Point };

export const PointForm = ({ action, systemId, zones, point }: Props) => (
  <FormDialog
    action={action}
    button={point ? "Edit" : "Add device"}
    aside={point?.address}
    look={point ? "plain" : "primary"}
    title={point ? `Device ${point.address}` : "Add a device"}
    submit={point ? "Save" : "Add device"}
    hidden={{ systemId, ...(point && { id: point.id }) }}
  >
    <div className="grid gap-4 sm:grid-cols-2">
      <TextField label="Address" name="address" defaultValue={point?.address} hint="As the panel shows it: L1-014" />
      <SelectField label="Kind" name="kind" defaultValue={point?.kind ?? "smoke"}>
        <Options values={POINT_KINDS} words={POINT_KIND_WORDS} />
      </SelectField>
    </div>
    <TextField label="Text at the panel" name="label" defaultValue={point?.label} />
    <TextField label="Location" name="location" optional defaultValue={point?.location} />
    <div className="grid gap-4 sm:grid-cols-3">
      <SelectField label="Zone" name="zoneId" optional defaultValue={point?.zoneId ?? ""}>
        <option value="">None</option>
        {zones.map(({ id, key, name }) => (
          <option key={id} value={id}>
            {key} {name}
          </option>
        ))}
      </SelectField>
      <SelectField label="Signal" name="signal" defaultValue={point?.signal ?? "alarm"}>
        <Options values={SIGNALS} words={SIGNAL_WORDS} />
      </SelectField>
      <TextField
        label="Place on the walk"
        name="walkOrder"
        optional
        inputMode="numeric"
        defaultValue={point?.walkOrder?.toString()}
      />
    </div>
  </FormDialog>
);
