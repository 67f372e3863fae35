import type { FormAction } from "@/components/form/form";
import type { Equipment, Proof } from "@/lib/domain/systems/device-list";
import { ACTION_WORDS, EQUIPMENT_KIND_WORDS, RESTART_MODE_WORDS } from "@/lib/domain/systems/words";
import { EquipmentForm } from "./output-forms";
import { ProofMark } from "./proof-mark";
import { Removal } from "./removal";

type Props = {
  systemId: string;
  today: string;
  equipment: Equipment;
  proof: Proof | undefined;
  mayChange: boolean;
  actions: Record<"saveEquipment" | "remove" | "putBack", FormAction>;
};

export function EquipmentRow({ systemId, today, equipment, proof, mayChange, actions }: Props) {
  const { tag, kind, action, location, serves, restart, longestOffMinutes, minutesBetweenStarts, removedOn } =
    equipment;
  const facts = [
    location,
    serves && `serves ${serves}`,
    `comes back ${RESTART_MODE_WORDS[restart]}`,
    longestOffMinutes !== null && `off at most ${longestOffMinutes} min`,
    minutesBetweenStarts !== null && `${minutesBetweenStarts} min between starts`,
    removedOn && `removed ${removedOn}`,
  ];
  return (
    <li className="flex flex-wrap items-start justify-between gap-x-4 gap-y-1">
      <p className="min-w-0 flex-1 basis-64">
        <span className="figures font-semibold">{tag}</span> {EQUIPMENT_KIND_WORDS[kind].toLowerCase()}{" "}
        <strong>{ACTION_WORDS[action]}</strong>
        <span className="block text-sm text-muted">{facts.filter(Boolean).join(", ")}</span>
      </p>
      <ProofMark proof={proof} />
      {mayChange && (
        <span className="flex flex-wrap gap-1">
          <EquipmentForm action={actions.saveEquipment} {...{ systemId, equipment }} outputId={equipment.outputId} />
          <Removal {...{ systemId, today, actions, removedOn }} entry="equipment" id={equipment.id} name={tag} />
        </span>
      )}
    </li>
  );
}
