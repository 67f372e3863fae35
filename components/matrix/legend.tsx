import { Check, Minus, X } from "lucide-react";
import { EXPECTATION_SOURCE_WORDS, EXPECTATION_SOURCES } from "@/lib/domain/systems/words";
import { SOURCE_LETTERS } from "./matrix-facts";

/** What the letters and glyphs in the cells mean. */
export const Legend = () => (
  <ul aria-label="Legend" className="flex flex-wrap gap-x-5 gap-y-1 text-sm text-muted">
    {EXPECTATION_SOURCES.map((source) => (
      <li key={source}>
        <span className="figures font-bold text-text">{SOURCE_LETTERS[source]}</span> {EXPECTATION_SOURCE_WORDS[source]}
      </li>
    ))}
    <li>
      <Check aria-hidden className="inline size-3.5 text-settled" /> proven, on the date in the cell’s name
    </li>
    <li>
      <X aria-hidden className="inline size-3.5 text-alert" /> failed last
    </li>
    <li>
      <Minus aria-hidden className="inline size-3.5" /> never proven
    </li>
    <li>sup, trb: supervisory, trouble; otherwise alarm</li>
  </ul>
);
