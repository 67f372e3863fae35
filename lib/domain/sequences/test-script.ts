import { grouped } from "../shared/grouped";
import {
  byAddress,
  type DeviceList,
  type Equipment,
  type OutputGroup,
  type Point,
  type PointZone,
} from "../systems/device-list";
import type { ExpectationSource, Signal, SystemFunction } from "../systems/words";
import type { MatrixCell, MatrixVersion } from "./matrix";
import type { Method, ScriptRule } from "./script-rules";

/** One device is made to signal; what it operates stays quiet if that can be. */
export type InputStep = {
  number: number;
  point: Point;
  zone: PointZone | null;
  method: Method;
  /** The groups that it would operate, by the matrix. */
  operates: readonly string[];
  /** Why it must not be done yet. */
  locked: string | null;
};

export type Operation = {
  group: OutputGroup;
  source: ExpectationSource;
  delaySeconds: number;
  /** What must do what; none where nothing is recorded behind the group. */
  equipment: readonly Equipment[];
};

/** One device signals and everything behind it really operates. */
export type LiveStep = {
  number: number;
  /** None where no device on the list is a proper input for it. */
  by: Point | null;
  signal: Signal;
  operates: readonly Operation[];
  locked: string | null;
};

export type TestScript = {
  rule: Pick<ScriptRule, "name" | "edition">;
  inputs: readonly InputStep[];
  live: readonly LiveStep[];
  /** What the script does not know. */
  notes: readonly string[];
};

/** Heard, seen or received by itself; other functions show at the equipment behind them. */
const SHOW_BY_THEMSELVES: readonly SystemFunction[] = ["notification", "off_site_signal"];

/** Whether it is not known what must happen. */
export const equipmentMissing = ({ group, equipment }: Operation): boolean =>
  equipment.length === 0 && !SHOW_BY_THEMSELVES.includes(group.function);

const LOCKED = "Releasing: locked until physical isolation is recorded, by whom and seen by whom";
const UNKNOWN_RELEASE =
  "It is not recorded what releases here, so any device may: locked until physical isolation is recorded";

/**
 * The test of a system as it follows from what is known of it: each device once, in walking order, with its method;
 * then, in one batch, enough live signals that each group which the matrix operates really operates.
 */
export function testScript(list: DeviceList, matrix: MatrixVersion | null, rule: ScriptRule): TestScript {
  const index = indexed(list, matrix?.cells ?? []);
  const inputs = inWalkingOrder(index).map((point, i) => inputStep(point, i + 1, index, rule));
  const live = liveSteps(index).map((step, i) => ({ ...step, number: inputs.length + i + 1 }));
  return { rule: { name: rule.name, edition: rule.edition }, inputs, live, notes: notesOf(list, matrix, index, live) };
}

type Index = ReturnType<typeof indexed>;

function indexed(list: DeviceList, cells: readonly MatrixCell[]) {
  const points = list.points.filter(({ removedOn }) => removedOn === null);
  const zones = new Map(list.zones.map((zone) => [zone.id, zone]));
  const groups = new Map(list.groups.map((group) => [group.id, group]));
  const groupOfOutput = new Map(
    list.outputs.filter(({ removedOn }) => removedOn === null).map(({ id, groupId }) => [id, groupId]),
  );
  const equipment = grouped(
    list.equipment.filter(({ removedOn, outputId }) => removedOn === null && groupOfOutput.has(outputId)),
    ({ outputId }) => groupOfOutput.get(outputId) ?? "",
  );
  const releases = (group: OutputGroup) =>
    group.function === "suppression_release" || (equipment.get(group.id) ?? []).some(({ kind }) => kind === "release");
  return {
    points,
    zones,
    groups,
    equipment,
    ofZone: grouped(cells, ({ zoneId }) => zoneId),
    ofPoint: grouped(cells, ({ pointId }) => pointId),
    cells: cells.filter(({ groupId }) => groups.has(groupId)),
    releasing: new Set(list.groups.filter(releases).map(({ id }) => id)),
    /** Something releases, and no cell says on what. */
    mayRelease: list.groups.some((group) => releases(group) && !cells.some(({ groupId }) => groupId === group.id)),
  };
}

const lockOf = ({ releasing, mayRelease }: Index, groupIds: readonly string[]): string | null => {
  if (groupIds.some((id) => releasing.has(id))) return LOCKED;
  return mayRelease ? UNKNOWN_RELEASE : null;
};

/** The cells of a device: its own and its zone's. */
const cellsOfPoint = ({ ofZone, ofPoint }: Index, { id, zoneId }: Point): MatrixCell[] => [
  ...(ofPoint.get(id) ?? []),
  ...(zoneId ? (ofZone.get(zoneId) ?? []) : []),
];

const LAST = Number.MAX_SAFE_INTEGER;

function inWalkingOrder({ points, zones }: Index): Point[] {
  const zoneKey = ({ zoneId }: Point) => ({ address: zones.get(zoneId ?? "")?.key ?? "\uffff" });
  return points.toSorted(
    (a, b) => (a.walkOrder ?? LAST) - (b.walkOrder ?? LAST) || byAddress(zoneKey(a), zoneKey(b)) || byAddress(a, b),
  );
}

function inputStep(point: Point, number: number, index: Index, rule: ScriptRule): InputStep {
  const operates = [...new Set(cellsOfPoint(index, point).map(({ groupId }) => groupId))];
  return {
    number,
    point,
    zone: index.zones.get(point.zoneId ?? "") ?? null,
    method: rule.methods[point.kind],
    operates,
    locked: lockOf(index, operates),
  };
}

type Candidate = { point: Point; signal: Signal; cells: MatrixCell[] };

/** Each device with each signal that the matrix knows of it; trouble can be made at any device, other signals are its own. */
const candidatesOf = (index: Index): Candidate[] =>
  inWalkingOrder(index).flatMap((point) => {
    const bySignal = grouped(cellsOfPoint(index, point), ({ signal }) => signal);
    return [...bySignal]
      .filter(([signal]) => signal === point.signal || signal === "trouble")
      .map(([signal, cells]) => ({ point, signal, cells: cells.filter(({ groupId }) => index.groups.has(groupId)) }));
  });

/**
 * Few live signals: of all inputs, again and again the one that operates the most groups not operated yet. What
 * releases comes last, by itself as far as inputs allow.
 */
function liveSteps(index: Index): Omit<LiveStep, "number">[] {
  const waiting = new Set(index.cells.map(({ groupId }) => groupId));
  const releases = ({ cells }: Candidate) => cells.some(({ groupId }) => index.releasing.has(groupId));
  const candidates = candidatesOf(index);
  const steps = [false, true].flatMap((releasing) =>
    coverage(
      candidates.filter((one) => releases(one) === releasing),
      waiting,
    ).map(({ point, signal, cells }) => ({
      by: point,
      signal,
      operates: operationsOf(cells, index),
      locked: lockOf(
        index,
        cells.map(({ groupId }) => groupId),
      ),
    })),
  );
  const orphans = [...waiting].map((id) => {
    const cells = index.cells.filter(({ groupId }) => groupId === id).slice(0, 1);
    return {
      by: null,
      signal: cells[0]?.signal ?? "alarm",
      operates: operationsOf(cells, index),
      locked: lockOf(index, [id]),
    };
  });
  return [...steps, ...orphans];
}

function coverage(candidates: readonly Candidate[], waiting: Set<string>): Candidate[] {
  const chosen: Candidate[] = [];
  // Many devices of a zone operate the same: one of each kind is enough to choose from.
  const distinct = [
    ...new Map(candidates.toReversed().map((one) => [one.cells.map(({ groupId }) => groupId).join(), one])).values(),
  ].toReversed();
  const gain = ({ cells }: Candidate) =>
    new Set(cells.map(({ groupId }) => groupId).filter((id) => waiting.has(id))).size;
  for (;;) {
    const best = distinct.reduce<{ one?: Candidate; gain: number }>(
      (found, one) => (gain(one) > found.gain ? { one, gain: gain(one) } : found),
      { gain: 0 },
    ).one;
    if (!best) return chosen;
    chosen.push(best);
    for (const { groupId } of best.cells) waiting.delete(groupId);
  }
}

/** A group that a device operates twice, by its zone and by itself, is one operation; its own cell speaks first. */
const operationsOf = (cells: readonly MatrixCell[], { groups, equipment }: Index): Operation[] =>
  [...new Map(cells.toReversed().map((cell) => [cell.groupId, cell])).values()].toReversed().flatMap((cell) => {
    const group = groups.get(cell.groupId);
    if (!group) return [];
    const { source, delaySeconds } = cell;
    return [{ group, source, delaySeconds, equipment: equipment.get(group.id) ?? [] }];
  });

function notesOf(list: DeviceList, matrix: MatrixVersion | null, index: Index, live: readonly LiveStep[]): string[] {
  if (index.points.length === 0 && list.groups.length === 0)
    return ["Nothing is recorded of this system: add its devices while walking, and write down what you find"];
  const operated = new Set(index.cells.map(({ groupId }) => groupId));
  const unknown = list.groups.filter(({ id }) => !operated.has(id)).map(({ name }) => name);
  return [
    ...(index.points.length === 0 ? ["No device is recorded: add them while walking"] : []),
    ...(matrix === null || index.cells.length === 0
      ? ["What operates is not recorded: write down what you find"]
      : unknown.length > 0
        ? [`Nothing is recorded that operates ${unknown.join(", ")}: find out what does`]
        : []),
    ...(live.some(({ by }) => by === null)
      ? ["Some groups are operated by inputs that are not on the list any more: find out what operates them now"]
      : []),
    ...(live.some(({ operates }) => operates.some(equipmentMissing))
      ? ["Behind some groups no equipment is recorded: write down what operates"]
      : []),
  ];
}
