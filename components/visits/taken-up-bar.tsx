"use client";

import { Button } from "@/components/ui/button";
import { Callout } from "@/components/ui/card";
import { Input, Select } from "@/components/ui/input";
import { Label } from "@/components/ui/label";
import { FUNCTION_WORDS } from "@/lib/domain/systems/words";
import type { Places, Sheet } from "@/lib/queries/visits";
import { type TakenUp, titleOf } from "./taken-up";

type Props = {
  taken: TakenUp;
  places: Places | undefined;
  problem: string | undefined;
  technicians: Sheet["technicians"];
  onChange: (taken: TakenUp) => void;
  onPutBack: () => void;
};

/** What is in the hand, with what decides where it can go. */
export function TakenUpBar({ taken, places, problem, technicians, onChange, onPutBack }: Props) {
  const helpersWanted = Math.max((places?.crewSize ?? 1) - 1, taken.helpers.length);
  const setHelper = (i: number, id: string) => {
    const helpers = taken.helpers.filter((_, k) => k !== i);
    onChange({ ...taken, helpers: id ? [...helpers.slice(0, i), id, ...helpers.slice(i)] : helpers });
  };
  return (
    <Callout title={`In your hand: ${titleOf(taken)}`} aria-live="polite" data-print="off">
      <div className="flex flex-wrap items-end gap-3">
        <div className="w-28">
          <Label htmlFor="taken-minutes">Minutes</Label>
          <Input
            id="taken-minutes"
            type="number"
            min={15}
            max={1440}
            step={15}
            value={taken.minutes}
            onChange={(event) => {
              const minutes = event.target.valueAsNumber;
              if (minutes >= 5 && minutes <= 1440) onChange({ ...taken, minutes });
            }}
          />
        </div>
        {Array.from({ length: helpersWanted }, (_, i) => (
          // biome-ignore lint/suspicious/noArrayIndexKey: helpers are told apart by their place alone
          <div key={i} className="w-48">
            <Label htmlFor={`taken-helper-${i}`}>Goes along{helpersWanted > 1 && ` (${i + 1})`}</Label>
            <Select
              id={`taken-helper-${i}`}
              value={taken.helpers[i] ?? ""}
              onChange={(event) => setHelper(i, event.target.value)}
            >
              <option value="">Choose</option>
              {technicians
                .filter(({ id }) => id === taken.helpers[i] || !taken.helpers.includes(id))
                .map(({ id, name }) => (
                  <option key={id} value={id}>
                    {name}
                  </option>
                ))}
            </Select>
          </div>
        ))}
        <Button onClick={onPutBack}>Put back (Esc)</Button>
      </div>
      {!places && !problem && <p className="text-muted">Looking where it can go…</p>}
      {problem && <p className="font-semibold text-alert">{problem}</p>}
      {places && places.functions.length > 0 && (
        <p className="text-sm text-muted">
          Operates {places.functions.map((one) => FUNCTION_WORDS[one].toLowerCase()).join(", ")}. Times when the site
          allows it are marked beside the clock.
        </p>
      )}
    </Callout>
  );
}
