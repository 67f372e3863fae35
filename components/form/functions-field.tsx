"use client";

import { Checkbox, Choice, ChoiceGroup } from "@/components/ui/choice";
import { FUNCTION_WORDS, FUNCTIONS, type SystemFunction } from "@/lib/domain/systems/words";

type Props = {
  legend: string;
  hint?: React.ReactNode;
  value: readonly SystemFunction[];
  onChange: (value: SystemFunction[]) => void;
};

/** Which functions: kept by whoever holds the form, since a choice elsewhere may change it. Posts `functions[]`. */
export function FunctionsField({ legend, hint, value, onChange }: Props) {
  const toggle = (one: SystemFunction, on: boolean) =>
    onChange(FUNCTIONS.filter((each) => (each === one ? on : value.includes(each))));
  return (
    <ChoiceGroup legend={legend} className="sm:grid-cols-2 lg:grid-cols-3">
      {hint && <p className="col-span-full text-sm text-muted">{hint}</p>}
      {FUNCTIONS.map((one) => (
        <Choice key={one}>
          <Checkbox
            name="functions[]"
            value={one}
            checked={value.includes(one)}
            onChange={(event) => toggle(one, event.target.checked)}
          />
          {FUNCTION_WORDS[one]}
        </Choice>
      ))}
    </ChoiceGroup>
  );
}
