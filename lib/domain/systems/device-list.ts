import type { CalendarDate } from "../shared/zone";
import type {
  Action,
  EquipmentKind,
  OutputKind,
  PointKind,
  ProofOutcome,
  RestartMode,
  Signal,
  SystemFunction,
} from "./words";

export type PointZone = { id: string; key: string; name: string };

export type Point = {
  id: string;
  zoneId: string | null;
  address: string;
  kind: PointKind;
  label: string;
  location: string | null;
  signal: Signal;
  walkOrder: number | null;
  removedOn: CalendarDate | null;
};

export type OutputGroup = { id: string; key: string; name: string; function: SystemFunction };

export type Output = {
  id: string;
  groupId: string;
  address: string;
  kind: OutputKind;
  label: string;
  location: string | null;
  removedOn: CalendarDate | null;
};

export type Equipment = {
  id: string;
  outputId: string;
  tag: string;
  kind: EquipmentKind;
  action: Action;
  location: string | null;
  serves: string | null;
  restart: RestartMode;
  longestOffMinutes: number | null;
  minutesBetweenStarts: number | null;
  removedOn: CalendarDate | null;
};

/** What hangs on a system; a list of points alone, or nothing at all, is a list too. */
export type DeviceList = {
  zones: readonly PointZone[];
  points: readonly Point[];
  groups: readonly OutputGroup[];
  outputs: readonly Output[];
  equipment: readonly Equipment[];
};

/** When something was last seen to work, or to fail. */
export type Proof = { on: CalendarDate; outcome: ProofOutcome; method: string | null };

const collator = new Intl.Collator("en", { numeric: true });

/** Device 10 after device 9. */
export const byAddress = (a: { address: string }, b: { address: string }): number =>
  collator.compare(a.address, b.address);
