import type { MatrixVersion } from "@/lib/domain/sequences/matrix";
import type { OutputGroup, PointZone } from "@/lib/domain/systems/device-list";
import type { ExpectationSource, PointKind, ProofOutcome, Signal } from "@/lib/domain/systems/words";

export type MatrixPoint = {
  id: string;
  zoneId: string | null;
  address: string;
  label: string;
  kind: PointKind;
  removedOn: string | null;
};
export type PairProof = { pointId: string; groupId: string; on: string; outcome: ProofOutcome };

/** Everything that the grid shows. */
export type MatrixFacts = {
  newest: number;
  version: MatrixVersion | null;
  zones: readonly PointZone[];
  groups: readonly OutputGroup[];
  points: readonly MatrixPoint[];
  proofs: readonly PairProof[];
};

/** What a press writes into a cell. */
export type Pen = { signal: Signal; source: ExpectationSource; delaySeconds: number };

/** One letter in the cell; the legend and the cell's name have the words. */
export const SOURCE_LETTERS: Record<ExpectationSource, string> = {
  approved_sequence: "S",
  panel_program: "P",
  as_found: "F",
};
/** Alarm is the rule and has no mark. */
export const SIGNAL_MARKS: Record<Signal, string> = { alarm: "", supervisory: "sup", trouble: "trb" };
