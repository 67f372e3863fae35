"use client";

import { Plus } from "lucide-react";
import { useId } from "react";
import { Button } from "@/components/ui/button";
import { Checkbox, Choice } from "@/components/ui/choice";
import { Input } from "@/components/ui/input";
import { Label } from "@/components/ui/label";
import { FUNCTION_WORDS, FUNCTIONS, type SystemFunction } from "@/lib/domain/systems/words";
import type { LiveBlockInput } from "@/lib/domain/visits/schemas";

type Props = {
  /** Those of the job; others can be chosen where the job names none. */
  functions: SystemFunction[];
  startsLocal: string;
  blocks: LiveBlockInput[];
  onChange: (blocks: LiveBlockInput[]) => void;
};

const FIRST_MINUTES = 60;

/** When in the visit which functions really operate, and who stands by. */
export function LiveBlockFields({ functions, startsLocal, blocks, onChange }: Props) {
  const change = (i: number, block: LiveBlockInput) => onChange(blocks.map((one, k) => (k === i ? block : one)));
  const fresh: LiveBlockInput = { offsetMinutes: 0, minutes: FIRST_MINUTES, functions, attendees: [] };
  return (
    <fieldset className="grid gap-3">
      <legend className="mb-1 font-semibold">Live blocks</legend>
      {blocks.length === 0 && <p className="text-sm text-muted">No function operates during this visit.</p>}
      {blocks.map((block, i) => (
        <BlockFields
          // biome-ignore lint/suspicious/noArrayIndexKey: blocks are told apart by their place alone
          key={i}
          block={block}
          choices={functions.length > 0 ? [...new Set([...functions, ...block.functions])] : FUNCTIONS}
          startsLocal={startsLocal}
          onChange={(changed) => change(i, changed)}
          onRemove={() => onChange(blocks.filter((_, k) => k !== i))}
        />
      ))}
      <Button size="small" className="justify-self-start" onClick={() => onChange([...blocks, fresh])}>
        <Plus aria-hidden className="size-4" /> Add a live block
      </Button>
    </fieldset>
  );
}

type BlockProps = {
  block: LiveBlockInput;
  choices: readonly SystemFunction[];
  startsLocal: string;
  onChange: (block: LiveBlockInput) => void;
  onRemove: () => void;
};

function BlockFields({ block, choices, startsLocal, onChange, onRemove }: BlockProps) {
  const id = useId();
  const figure = (name: "offsetMinutes" | "minutes", label: string) => (
    <div>
      <Label htmlFor={`${id}-${name}`}>{label}</Label>
      <Input
        id={`${id}-${name}`}
        type="number"
        min={0}
        step={5}
        value={block[name]}
        onChange={(event) => onChange({ ...block, [name]: event.target.valueAsNumber || 0 })}
      />
    </div>
  );
  const toggle = (one: SystemFunction) =>
    block.functions.includes(one) ? block.functions.filter((other) => other !== one) : [...block.functions, one];
  return (
    <div className="grid gap-2 rounded-md border border-line p-3">
      <div className="grid grid-cols-2 gap-3">
        {figure("offsetMinutes", "Begins after, min")}
        {figure("minutes", "Lasts, min")}
      </div>
      <p className="figures text-sm text-muted">
        {clockAfter(startsLocal, block.offsetMinutes)} to {clockAfter(startsLocal, block.offsetMinutes + block.minutes)}
      </p>
      <div className="flex flex-wrap gap-x-4">
        {choices.map((one) => (
          <Choice key={one}>
            <Checkbox
              checked={block.functions.includes(one)}
              onChange={() => onChange({ ...block, functions: toggle(one) })}
            />
            {FUNCTION_WORDS[one]}
          </Choice>
        ))}
      </div>
      <Label htmlFor={`${id}-by`}>Who stands by, parted by commas</Label>
      <Input
        id={`${id}-by`}
        defaultValue={block.attendees.join(", ")}
        onChange={(event) =>
          onChange({
            ...block,
            attendees: event.target.value
              .split(",")
              .map((name) => name.trim())
              .filter(Boolean),
          })
        }
      />
      <Button size="small" variant="plain" className="justify-self-end" onClick={onRemove}>
        Remove
      </Button>
    </div>
  );
}

/** For the eye alone: on a night of clock change the server's answer counts. */
function clockAfter(local: string, minutes: number): string {
  const at = Date.parse(`${local}Z`) + minutes * 60_000;
  return Number.isNaN(at) ? "" : new Date(at).toISOString().slice(11, 16);
}
