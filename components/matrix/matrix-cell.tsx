// biome-ignore-all lint/a11y/useSemanticElements: most rows are not drawn, which a table element cannot tell
import { Check, Minus, X } from "lucide-react";
import { memo } from "react";
import { cn } from "@/components/ui/cn";
import type { MatrixCell as Cell } from "@/lib/domain/sequences/matrix";
import { EXPECTATION_SOURCE_WORDS, SIGNAL_WORDS } from "@/lib/domain/systems/words";
import { type PairProof, SIGNAL_MARKS, SOURCE_LETTERS } from "./matrix-facts";

type Props = {
  row: number;
  column: number;
  input: string;
  group: string;
  cells: readonly Cell[];
  proof: PairProof | undefined;
  /** Signals of the cells that are not saved yet, as one word. */
  unsaved: string;
  active: boolean;
  editable: boolean;
};

/** A press draws one cell anew, not a thousand. */
const same = ({ cells: a, ...before }: Props, { cells: b, ...after }: Props): boolean =>
  a.length === b.length &&
  a.every((cell, i) => cell === b[i]) &&
  (Object.keys(after) as (keyof typeof after)[]).every((name) => before[name] === after[name]);

const proofWords = (proof: PairProof | undefined) =>
  proof ? `${proof.outcome === "failed" ? "failed" : "proven"} ${proof.on}` : "never proven";

function wordsOf({ input, group, cells, proof, unsaved }: Props): string {
  if (cells.length === 0) return `${input}, ${group}: operates nothing`;
  const each = cells.map((cell) =>
    [
      SIGNAL_WORDS[cell.signal],
      EXPECTATION_SOURCE_WORDS[cell.source].toLowerCase(),
      cell.delaySeconds > 0 && `after ${cell.delaySeconds} s`,
      unsaved.includes(cell.signal) && "not saved",
    ]
      .filter(Boolean)
      .join(", "),
  );
  return `${input}, ${group}: ${each.join("; ")}; ${proofWords(proof)}`;
}

const LOOKS = {
  proven: { Glyph: Check, look: "text-settled" },
  failed: { Glyph: X, look: "text-alert" },
  never: { Glyph: Minus, look: "text-muted" },
} as const;

/** Where an input meets a group: a letter for each expectation's source, and a glyph for its proof. */
export const MatrixCell = memo(function MatrixCell(props: Props) {
  const { row, column, cells, proof, unsaved, active, editable } = props;
  const words = wordsOf(props);
  const { Glyph, look } = LOOKS[proof?.outcome ?? "never"];
  return (
    <div
      role="gridcell"
      aria-colindex={column + 1}
      aria-label={words}
      title={words}
      tabIndex={active ? 0 : -1}
      data-place={`${row}:${column}`}
      className={cn(
        "flex w-24 shrink-0 items-center justify-center gap-1 border-r border-b border-line bg-surface -outline-offset-3",
        editable && "cursor-pointer hover:bg-sunken",
        unsaved && "bg-soon-soft",
      )}
    >
      {cells.map((cell) => (
        <span key={cell.signal} className="figures font-bold">
          {SOURCE_LETTERS[cell.source]}
          {SIGNAL_MARKS[cell.signal] && <sub>{SIGNAL_MARKS[cell.signal]}</sub>}
          {cell.delaySeconds > 0 && <span className="text-sm font-normal">+{cell.delaySeconds}s</span>}
        </span>
      ))}
      {cells.length > 0 && <Glyph aria-hidden className={cn("size-3.5", look)} />}
    </div>
  );
}, same);
