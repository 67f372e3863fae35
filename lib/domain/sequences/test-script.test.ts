import fc from "fast-check";
import { describe, expect, test } from "vitest";
import type { DeviceList, Equipment, Output, OutputGroup, Point } from "../systems/device-list";
import { EQUIPMENT_KINDS, FUNCTIONS, POINT_KINDS, SIGNALS } from "../systems/words";
import { cellKey, type MatrixCell, type MatrixVersion } from "./matrix";
import { scriptRule } from "./script-rules";
import { testScript } from "./test-script";

const point = (id: string, change: Partial<Point> = {}): Point => ({
  id,
  zoneId: null,
  address: id,
  kind: "smoke",
  label: `Device ${id}`,
  location: null,
  signal: "alarm",
  walkOrder: null,
  removedOn: null,
  ...change,
});
const group = (id: string, change: Partial<OutputGroup> = {}): OutputGroup => ({
  id,
  key: id,
  name: id,
  function: "fan_shutdown",
  ...change,
});
const output = (groupId: string): Output => ({
  id: `out of ${groupId}`,
  groupId,
  address: `R ${groupId}`,
  kind: "relay",
  label: groupId,
  location: null,
  removedOn: null,
});
const fan = (groupId: string, change: Partial<Equipment> = {}): Equipment => ({
  id: `fan of ${groupId}`,
  outputId: `out of ${groupId}`,
  tag: `AHU ${groupId}`,
  kind: "fan",
  action: "stop",
  location: null,
  serves: null,
  restart: "unknown",
  longestOffMinutes: null,
  minutesBetweenStarts: null,
  removedOn: null,
  ...change,
});
const cell = (change: Partial<MatrixCell>): MatrixCell => ({
  zoneId: null,
  pointId: null,
  groupId: "fans",
  signal: "alarm",
  source: "approved_sequence",
  delaySeconds: 0,
  ...change,
});
const matrix = (...cells: MatrixCell[]): MatrixVersion => ({
  number: 1,
  note: "first",
  author: "somebody",
  at: new Date(0),
  cells,
});
const EMPTY: DeviceList = { zones: [], points: [], groups: [], outputs: [], equipment: [] };
const script = (list: Partial<DeviceList>, version: MatrixVersion | null = null) =>
  testScript({ ...EMPTY, ...list }, version, scriptRule);

test("from nothing: an empty script that says to add devices while walking", () => {
  const { inputs, live, notes } = script({});
  expect([inputs, live]).toEqual([[], []]);
  expect(notes).toEqual([expect.stringContaining("add its devices while walking")]);
});

test("from a bare device list: every input in walking order, then by zone, then by address as people count", () => {
  const zones = [
    { id: "b", key: "10", name: "Ten" },
    { id: "a", key: "9", name: "Nine" },
  ];
  const points = [
    point("L1-10", { zoneId: "a" }),
    point("L1-9", { zoneId: "a" }),
    point("L1-1", { zoneId: "b" }),
    point("L1-2"),
    point("L2-77", { walkOrder: 1, zoneId: "b" }),
    point("L2-78", { removedOn: "2026-01-01" }),
  ];
  const { inputs, live, notes } = script({ zones, points });
  expect(inputs.map((step) => step.point.address)).toEqual(["L2-77", "L1-9", "L1-10", "L1-1", "L1-2"]);
  expect(live).toEqual([]);
  expect(notes).toEqual(["What operates is not recorded: write down what you find"]);
});

test("each kind has its method, and says what stays open after it", () => {
  const { inputs } = script({ points: POINT_KINDS.map((kind) => point(kind, { kind })) });
  const of = (kind: string) => inputs.find((step) => step.point.kind === kind)?.method;
  expect(of("smoke")?.leavesOpen).toMatch(/magnet alone proves the electronics/i);
  expect(of("duct")?.how).toMatch(/pressure differential/);
  expect(of("duct")?.leavesOpen).toMatch(/sampling/);
  expect(of("pull")?.how).toMatch(/operate/i);
  expect(of("waterflow")?.how).toMatch(/flow of water/i);
  expect(of("tamper")?.how).toMatch(/turn the valve/i);
});

describe("live steps", () => {
  const list = {
    zones: [{ id: "z", key: "1", name: "Lobby" }],
    points: [
      point("1", { zoneId: "z" }),
      point("2"),
      point("3", { kind: "tamper", signal: "supervisory", zoneId: "z" }),
    ],
    groups: [
      group("fans"),
      group("doors", { function: "door_release" }),
      group("agent", { function: "suppression_release" }),
    ],
    outputs: [output("fans"), output("doors"), output("agent")],
    equipment: [fan("fans", { tag: "AHU-1" }), fan("doors", { kind: "door", action: "release", tag: "D-1" })],
  } satisfies Partial<DeviceList>;

  test("one signal that operates everything is enough, each expectation with its source", () => {
    const { live } = script(
      list,
      matrix(
        cell({ zoneId: "z" }),
        cell({ pointId: "1", groupId: "doors", source: "as_found", delaySeconds: 20 }),
        cell({ pointId: "2" }),
      ),
    );
    expect(live).toHaveLength(1);
    expect(live[0]?.by?.address).toBe("1");
    expect(
      live[0]?.operates.map(({ group, source, delaySeconds, equipment }) => [
        group.id,
        source,
        delaySeconds,
        equipment.map(({ tag, action }) => `${tag} ${action}`),
      ]),
    ).toEqual([
      ["doors", "as_found", 20, ["D-1 release"]],
      ["fans", "approved_sequence", 0, ["AHU-1 stop"]],
    ]);
  });

  test("a device gives its own signal: an alarm is not expected of a valve switch", () => {
    const { live } = script(list, matrix(cell({ pointId: "3" })));
    expect(live[0]?.by).toBeNull();
    expect(script(list, matrix(cell({ pointId: "3", signal: "supervisory" }))).live[0]?.by?.address).toBe("3");
  });

  test("what releases is locked, at the device as in the batch, and other functions do not wait behind it", () => {
    const { inputs, live } = script(
      list,
      matrix(cell({ pointId: "1", groupId: "agent" }), cell({ pointId: "1" }), cell({ pointId: "2" })),
    );
    expect(inputs.map((step) => [step.point.address, step.locked !== null])).toContainEqual(["1", true]);
    expect(inputs.map((step) => [step.point.address, step.locked !== null])).toContainEqual(["2", false]);
    expect(live.map((step) => [step.by?.address, step.locked !== null])).toEqual([
      ["2", false],
      ["1", true],
    ]);
  });

  test("a releasing device behind a group of another function locks it too", () => {
    const { live } = script({ ...list, equipment: [fan("fans", { kind: "release" })] }, matrix(cell({ pointId: "2" })));
    expect(live[0]?.locked).toMatch(/isolation/);
  });

  test("where it is not recorded what releases, every device is locked", () => {
    const { inputs, live } = script(list, matrix(cell({ pointId: "2" })));
    expect([...inputs, ...live].every(({ locked }) => locked?.includes("any device may"))).toBe(true);
    expect(script(list).inputs.every(({ locked }) => locked !== null)).toBe(true);
  });

  test("groups that nothing operates are named", () => {
    const { notes } = script(list, matrix(cell({ pointId: "2" })));
    expect(notes).toContainEqual("Nothing is recorded that operates doors, agent: find out what does");
  });
});

describe("whatever the list", () => {
  const IDS = ["a", "b", "c", "d"] as const;
  const anyList: fc.Arbitrary<DeviceList> = fc.record({
    zones: fc.constant(IDS.map((id) => ({ id: `z${id}`, key: id, name: id }))),
    points: fc.uniqueArray(
      fc
        .record({
          n: fc.nat(30),
          kind: fc.constantFrom(...POINT_KINDS),
          signal: fc.constantFrom(...SIGNALS),
          zoneId: fc.option(fc.constantFrom(...IDS.map((id) => `z${id}`))),
          walkOrder: fc.option(fc.nat(20)),
          removedOn: fc.option(fc.constant("2026-01-01")),
        })
        .map(({ n, ...rest }) => point(`p${n}`, rest)),
      { selector: ({ id }) => id },
    ),
    groups: fc.tuple(...IDS.map((id) => fc.constantFrom(...FUNCTIONS).map((one) => group(id, { function: one })))),
    outputs: fc.constant(IDS.map(output)),
    equipment: fc.tuple(...IDS.map((id) => fc.constantFrom(...EQUIPMENT_KINDS).map((kind) => fan(id, { kind })))),
  });
  const anyCell = fc
    .record({
      input: fc.oneof(
        fc.constantFrom(...IDS.map((id) => ({ zoneId: `z${id}`, pointId: null }))),
        fc.nat(30).map((n) => ({ zoneId: null, pointId: `p${n}` })),
      ),
      groupId: fc.constantFrom(...IDS),
      signal: fc.constantFrom(...SIGNALS),
    })
    .map(({ input, ...rest }) => cell({ ...input, ...rest }));
  const anyMatrix = fc.option(
    fc.uniqueArray(anyCell, { selector: cellKey, maxLength: 25 }).map((cells) => matrix(...cells)),
  );

  test("every device that is there appears exactly once", () => {
    fc.assert(
      fc.property(anyList, anyMatrix, (list, version) => {
        const there = list.points.filter(({ removedOn }) => removedOn === null).map(({ id }) => id);
        expect(
          testScript(list, version, scriptRule)
            .inputs.map((step) => step.point.id)
            .sort(),
        ).toEqual(there.sort());
      }),
    );
  });

  test("every group that a cell operates is operated at least once, and no other", () => {
    fc.assert(
      fc.property(anyList, anyMatrix, (list, version) => {
        const operated = testScript(list, version, scriptRule).live.flatMap((step) =>
          step.operates.map((one) => one.group.id),
        );
        expect([...new Set(operated)].sort()).toEqual(
          [...new Set((version?.cells ?? []).map(({ groupId }) => groupId))].sort(),
        );
      }),
    );
  });

  test("inputs come before live functions, numbered without a gap", () => {
    fc.assert(
      fc.property(anyList, anyMatrix, (list, version) => {
        const { inputs, live } = testScript(list, version, scriptRule);
        const numbers = [...inputs, ...live].map(({ number }) => number);
        expect(numbers).toEqual(numbers.map((_, i) => i + 1));
      }),
    );
  });

  test("what the matrix says of the input of a live step is all that the step expects", () => {
    fc.assert(
      fc.property(anyList, anyMatrix, (list, version) => {
        for (const { by, signal, operates } of testScript(list, version, scriptRule).live) {
          if (!by) continue;
          const expected = (version?.cells ?? []).filter(
            (one) =>
              one.signal === signal && (one.pointId === by.id || (one.zoneId !== null && one.zoneId === by.zoneId)),
          );
          expect(new Set(operates.map(({ group }) => group.id))).toEqual(new Set(expected.map((one) => one.groupId)));
        }
      }),
    );
  });

  test("what releases, or may release, is locked, and nothing else", () => {
    fc.assert(
      fc.property(anyList, anyMatrix, (list, version) => {
        const releases = (one: OutputGroup) =>
          one.function === "suppression_release" ||
          list.equipment.some(({ kind, outputId }) => kind === "release" && outputId === `out of ${one.id}`);
        const known = list.groups
          .filter(releases)
          .every(({ id }) => version?.cells.some(({ groupId }) => groupId === id));
        for (const { operates, locked } of testScript(list, version, scriptRule).live) {
          expect(locked !== null).toBe(!known || operates.some(({ group }) => releases(group)));
        }
      }),
    );
  });
});
