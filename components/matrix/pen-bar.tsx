import { Choice, Radio } from "@/components/ui/choice";
import { Input, Select } from "@/components/ui/input";
import { EXPECTATION_SOURCE_WORDS, EXPECTATION_SOURCES, SIGNAL_WORDS, SIGNALS } from "@/lib/domain/systems/words";
import { type Pen, SOURCE_LETTERS } from "./matrix-facts";

const LONGEST_DELAY_S = 86_400;

/** What the next press writes. */
export function PenBar({ pen, onChange }: { pen: Pen; onChange: (pen: Pen) => void }) {
  return (
    <div className="flex flex-wrap items-end gap-x-5 gap-y-2">
      <label className="grid gap-1" htmlFor="matrix-signal">
        <span className="text-sm text-muted">Signal</span>
        <Select
          id="matrix-signal"
          value={pen.signal}
          onChange={(event) =>
            onChange({ ...pen, signal: SIGNALS.find((one) => one === event.target.value) ?? "alarm" })
          }
        >
          {SIGNALS.map((signal) => (
            <option key={signal} value={signal}>
              {SIGNAL_WORDS[signal]}
            </option>
          ))}
        </Select>
      </label>
      <fieldset className="grid gap-1">
        <legend className="text-sm text-muted">Source</legend>
        <div className="flex flex-wrap gap-x-4">
          {EXPECTATION_SOURCES.map((source) => (
            <Choice key={source}>
              <Radio
                name="matrix-source"
                checked={pen.source === source}
                onChange={() => onChange({ ...pen, source })}
              />
              <span>
                <span className="figures font-bold">{SOURCE_LETTERS[source]}</span> {EXPECTATION_SOURCE_WORDS[source]}
              </span>
            </Choice>
          ))}
        </div>
      </fieldset>
      <label className="grid gap-1" htmlFor="matrix-delay">
        <span className="text-sm text-muted">Delay, seconds</span>
        <Input
          id="matrix-delay"
          type="number"
          min={0}
          max={LONGEST_DELAY_S}
          value={pen.delaySeconds}
          onChange={(event) => {
            const delaySeconds = Math.trunc(event.target.valueAsNumber || 0);
            onChange({ ...pen, delaySeconds: Math.max(0, Math.min(LONGEST_DELAY_S, delaySeconds)) });
          }}
          className="w-28"
        />
      </label>
    </div>
  );
}
