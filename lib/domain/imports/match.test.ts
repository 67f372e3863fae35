import { expect, test } from "vitest";
import { LIST_NAMES, LISTS } from "./lists";
import { matchColumns, recognizeList } from "./match";

const match = (headings: string[], remembered: { heading: string; column: string }[] = [], chosen = {}) =>
  matchColumns(
    "points",
    headings,
    remembered.map((one) => ({ list: "points", ...one })),
    chosen,
  ).map(({ column, how }) => `${column} ${how}`);

test("a heading is matched exactly, whatever its case and its signs", () => {
  expect(match(["Address", "WALK_ORDER", " last-proven "])).toEqual([
    "address exact",
    "walkOrder exact",
    "lastProven exact",
  ]);
});

test("what was remembered goes before what is similar, and what is exact before both", () => {
  const remembered = [
    { heading: "type", column: "label" },
    { heading: "address", column: "location" },
  ];
  expect(match(["type", "address"], remembered)).toEqual(["label remembered", "address exact"]);
});

test("an empty memory keeps a heading out", () => {
  expect(match(["type", "kind"], [{ heading: "type", column: "" }])).toEqual(["null remembered", "kind exact"]);
});

test("other words and slips of the hand are found", () => {
  expect(match(["Device address", "Zone No.", "Type code", "Adress", "labels", "locatoin"])).toEqual([
    "address similar",
    "zone similar",
    "kind similar",
    "null none",
    "label similar",
    "location similar",
  ]);
});

test("no column is taken twice, and a choice at the screen goes before everything", () => {
  expect(match(["address", "point"], [], { 1: "address" })).toEqual(["null none", "address chosen"]);
  expect(match(["address", "kind"], [], { 0: null })).toEqual(["null chosen", "kind exact"]);
  expect(match(["address"], [], { 0: "no such column" })).toEqual(["address exact"]);
});

test.each(LIST_NAMES)("the headings of our own form for %s are recognized, whatever the file is called", (list) => {
  const headings = Object.values(LISTS[list].columns).map(({ heading }) => heading);
  expect(recognizeList("list.csv", headings, [])).toBe(list);
});

test.each([
  ["North hall device list.csv", ["Address", "Type", "Description"], "points"],
  ["relays.csv", ["Address", "Group", "Description"], "outputs"],
  ["Cause & effect.csv", ["Zone", "Group", "Source"], "matrix"],
  ["accounts.csv", ["Debit", "Credit"], null],
])("%s with %j is %s", (name, headings, list) => {
  expect(recognizeList(name, headings, [])).toBe(list);
});
