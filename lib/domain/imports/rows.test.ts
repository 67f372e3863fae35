import { describe, expect, test } from "vitest";
import type { KnownParts } from "./known";
import { planParts } from "./plan-parts";
import { planPlaces } from "./plan-places";
import { type Finding, readFile } from "./rows";

const SITES = "site,name,kind,street,city,state,postal code,time zone";
const HALL = "S1,Hall,hotel,1 Way,Chicago,IL,60601,America/Chicago";
const NOTHING: KnownParts = {
  zones: [],
  groups: [],
  points: [],
  outputs: [],
  equipment: [],
  cells: [],
  versions: new Map(),
  proven: new Set(),
};

/** Everything that is wrong with lists of a company that has nothing yet. */
function findingsOf(lists: Record<string, string[]>): Finding[] {
  const files = Object.entries(lists).map(([name, lines]) =>
    readFile({ name: `${name}.csv`, content: lines.join("\n") }, []),
  );
  const parts = files.flatMap(({ part }) => part ?? []);
  const findings = files.flatMap((file) => file.findings);
  let id = 0;
  const means = {
    into: null,
    newId: () => String(++id),
    say: (finding: Finding) => findings.push(finding),
    todayIn: () => "2026-12-01",
  };
  const places = planPlaces(parts, { sites: [], systems: [] }, means);
  planParts(parts, places, NOTHING, means);
  return findings;
}

const place = { sites: [SITES, HALL], systems: ["system,name", "P1,Main panel"] };
const short = (findings: Finding[]) => findings.map(({ list, row, column, value }) => [list, row, column, value]);

describe("every finding has its list, row, column and value", () => {
  const zones = ["zone,name", "1,Lobby"];
  const groups = ["group,name,function", "F,Fans,fan_shutdown"];
  const points = "address,kind,label";
  test.each<[string, Record<string, string[]>, (string | number | null)[][]]>([
    [
      "an unknown time zone",
      { sites: [SITES, HALL.replace("America/Chicago", "Central")] },
      [["sites", 2, "time zone", "Central"]],
    ],
    [
      "an unknown zone of a point",
      { ...place, zones, points: [`${points},zone`, "1,smoke,Hall,7"] },
      [["points", 2, "zone", "7"]],
    ],
    [
      "a duplicate address",
      { ...place, points: [points, "1,smoke,Hall", "2,smoke,Attic", "1,heat,Attic"] },
      [["points", 4, "address", "1"]],
    ],
    ["an unknown kind", { ...place, points: [points, "1,smok,Hall"] }, [["points", 2, "kind", "smok"]]],
    ["a missing text", { ...place, points: [points, "1,smoke,"] }, [["points", 2, "label", null]]],
    [
      "an unknown group",
      { ...place, "output-groups": groups, outputs: ["address,group,label", "R1,G,Fan"] },
      [["outputs", 2, "group", "G"]],
    ],
    [
      "an unknown system",
      { ...place, points: [`system,${points}`, "P9,1,smoke,Hall"] },
      [["points", 2, "system", "P9"]],
    ],
    ["an unknown site", { systems: ["site,system,name", "S9,P1,Panel"] }, [["systems", 2, "site", "S9"]]],
    ["a system that is not named", { points: [points, "1,smoke,Hall"] }, [["points", 2, "system", null]]],
    [
      "a date that does not exist",
      { ...place, points: [`${points},last proven`, "1,smoke,Hall,2/30/2026"] },
      [["points", 2, "last proven", "2/30/2026"]],
    ],
    [
      "a proof of tomorrow",
      { ...place, points: [`${points},last proven`, "1,smoke,Hall,12/2/2026"] },
      [["points", 2, "last proven", "2026-12-02"]],
    ],
    [
      "a method without a date",
      { ...place, points: [`${points},method`, "1,smoke,Hall,smoke"] },
      [["points", 2, "method", "smoke"]],
    ],
    [
      "a cell with two inputs",
      {
        ...place,
        zones,
        points: [points, "1,smoke,Hall"],
        "output-groups": groups,
        matrix: ["zone,address,group,source", "1,1,F,as_found"],
      },
      [["matrix", 2, "address", "1"]],
    ],
    [
      "a cell with none",
      { ...place, "output-groups": groups, matrix: ["zone,address,group,source", ",,F,as_found"] },
      [["matrix", 2, "zone", null]],
    ],
    ["a missing column", { ...place, points: ["address,label", "1,Hall"] }, [["points", 1, "kind", null]]],
  ])("%s", (_, lists, expected) => {
    expect(short(findingsOf(lists))).toEqual(expected);
  });

  test("a row with a finding still stands in for its key: what refers to it is not found wrong as well", () => {
    const lists = { ...place, zones: ["zone,name", "1,"], points: ["address,kind,label,zone", "1,smoke,Hall,1"] };
    expect(short(findingsOf(lists))).toEqual([["zones", 2, "name", null]]);
  });

  test("a duplicate in a second file of the same list names the first", () => {
    const lists = {
      ...place,
      "points north": ["address,kind,label", "1,smoke,Hall"],
      "points south": ["address,kind,label", "1,heat,Attic"],
    };
    expect(findingsOf(lists)).toMatchObject([
      { file: "points south.csv", message: "This stands in row 2 of points north.csv already" },
    ]);
  });
});

test("words of the screens, US dates and empty cells are understood", () => {
  const { part, findings } = readFile(
    {
      name: "points.csv",
      content: "Address;Kind;Label;Signal;Walk order;Last proven\n1-2;Duct Detector;AHU;;;3/9/2026",
    },
    [],
  );
  expect(findings).toEqual([]);
  expect(part?.rows[0]?.values).toMatchObject({
    kind: "duct",
    signal: "alarm",
    walkOrder: null,
    lastProven: "2026-03-09",
  });
});
