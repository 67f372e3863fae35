import type { FormAction } from "@/components/form/form";
import { Card, EmptyState } from "@/components/ui/card";
import { grouped } from "@/lib/domain/shared/grouped";
import type { Equipment, Output, OutputGroup, Proof } from "@/lib/domain/systems/device-list";
import { FUNCTION_WORDS, OUTPUT_KIND_WORDS } from "@/lib/domain/systems/words";
import { EquipmentRow } from "./equipment-row";
import { EquipmentForm, GroupForm, OutputForm } from "./output-forms";
import { ProofMark } from "./proof-mark";
import { Removal } from "./removal";

export type OutputActions = Record<"saveGroup" | "saveOutput" | "saveEquipment" | "remove" | "putBack", FormAction>;
type Props = {
  systemId: string;
  today: string;
  groups: readonly OutputGroup[];
  outputs: readonly Output[];
  equipment: readonly Equipment[];
  proofs: { groups: Record<string, Proof>; equipment: Record<string, Proof> };
  mayChange: boolean;
  actions: OutputActions;
};

/** Group by group: what the panel operates together, through which outputs, and what must then happen. */
export function OutputsList(props: Props) {
  const { systemId, groups, outputs, mayChange, actions } = props;
  const ofGroup = grouped(outputs, ({ groupId }) => groupId);
  const add = mayChange && <GroupForm action={actions.saveGroup} systemId={systemId} />;
  if (groups.length === 0) {
    return (
      <EmptyState title="No output group yet" action={add}>
        A group is what the panel operates together: all horns, the fans of one air handler, the doors of a floor.
      </EmptyState>
    );
  }
  return (
    <div className="grid gap-4">
      <div className="flex justify-end">{add}</div>
      {groups.map((group) => (
        <Group key={group.id} {...props} group={group} outputs={ofGroup.get(group.id) ?? []} />
      ))}
    </div>
  );
}

function Group({ group, outputs, ...props }: Props & { group: OutputGroup }) {
  const { systemId, proofs, mayChange, actions } = props;
  return (
    <Card className="grid gap-3" aria-label={group.name}>
      <header className="flex flex-wrap items-start justify-between gap-2">
        <div className="flex-1 basis-56">
          <h2 className="font-bold">
            <span className="figures text-muted">{group.key}</span> {group.name}
          </h2>
          <p className="text-sm text-muted">{FUNCTION_WORDS[group.function]}</p>
        </div>
        <ProofMark proof={proofs.groups[group.id]} />
        {mayChange && (
          <span className="flex flex-wrap gap-1">
            <GroupForm action={actions.saveGroup} {...{ systemId, group }} />
            <OutputForm action={actions.saveOutput} {...{ systemId }} groupId={group.id} />
          </span>
        )}
      </header>
      {outputs.length === 0 && <p className="text-muted">No output is recorded here yet.</p>}
      <ul className="grid gap-3">
        {outputs.map((output) => (
          <OutputRow key={output.id} {...props} output={output} />
        ))}
      </ul>
    </Card>
  );
}

function OutputRow({ output, equipment, ...props }: Omit<Props, "outputs"> & { output: Output }) {
  const { systemId, today, proofs, mayChange, actions } = props;
  return (
    <li className="grid gap-2 border-t border-line pt-3">
      <div className="flex flex-wrap items-start justify-between gap-2">
        <p>
          <span className="figures font-semibold">{output.address}</span> {output.label}
          <span className="block text-sm text-muted">
            {[OUTPUT_KIND_WORDS[output.kind], output.location, output.removedOn && `removed ${output.removedOn}`]
              .filter(Boolean)
              .join(", ")}
          </span>
        </p>
        {mayChange && (
          <span className="flex flex-wrap gap-1">
            <OutputForm action={actions.saveOutput} {...{ systemId, output }} groupId={output.groupId} />
            <EquipmentForm action={actions.saveEquipment} {...{ systemId }} outputId={output.id} />
            <Removal
              {...{ systemId, today, actions }}
              entry="output"
              id={output.id}
              name={output.address}
              removedOn={output.removedOn}
            />
          </span>
        )}
      </div>
      <ul className="grid gap-2 pl-4">
        {equipment
          .filter(({ outputId }) => outputId === output.id)
          .map((one) => (
            <EquipmentRow
              key={one.id}
              {...{ systemId, today, mayChange, actions }}
              equipment={one}
              proof={proofs.equipment[one.id]}
            />
          ))}
      </ul>
    </li>
  );
}
