import { readFileSync } from "node:fs";
import { join } from "node:path";
import { expect, test } from "vitest";
import { LOOK } from "@/emails/look";
import { contrast } from "./wcag";

const css = readFileSync(join(import.meta.dirname, "../../app/globals.css"), "utf8");

type Theme = "light" | "dark";
const THEMES: readonly Theme[] = ["light", "dark"];

/** Every token with its color in both themes, as the style sheet says. */
const tokens = new Map(
  [...css.matchAll(/--([\w-]+): light-dark\((#[0-9a-f]{6}(?:[0-9a-f]{2})?), (#[0-9a-f]{6}(?:[0-9a-f]{2})?)\)/g)].map(
    ([, name = "", light = "", dark = ""]) => [name, { light, dark }] as const,
  ),
);

function colorOf(token: string, theme: Theme): string {
  const color = tokens.get(token)?.[theme];
  if (!color) throw new Error(`no token ${token}`);
  return color;
}

test("the formula gives the published values", () => {
  // WCAG 2.2, "contrast ratio": from 1 to 21.
  expect(contrast("#000000", "#ffffff")).toBeCloseTo(21, 10);
  expect(contrast("#ffffff", "#ffffff")).toBe(1);
  // W3C, Understanding SC 1.4.3: #777777 on white just fails at 4.47:1.
  expect(contrast("#777777", "#ffffff")).toBeCloseTo(4.478, 3);
});

const GROUNDS = ["ground", "surface", "sunken"];

/** SC 1.4.3: text, 4.5:1. */
const TEXT: readonly [string, readonly string[]][] = [
  ["ink", [...GROUNDS, "still-soft", "ember-soft", "amber-soft"]],
  ["steel", GROUNDS],
  ["still", ["ground", "surface", "still-soft"]],
  ["ember", ["ground", "surface", "ember-soft"]],
  ["amber", ["ground", "surface", "amber-soft"]],
  ["on-strong", ["still", "ember"]],
];

/** SC 1.4.11: what one must see to use a control, and the ring of focus (SC 2.4.13), 3:1. */
const MARKS: readonly [string, readonly string[]][] = [
  ["field-line", ["ground", "surface"]],
  ["still", GROUNDS],
];

const pairs = (table: readonly [string, readonly string[]][], least: number) =>
  THEMES.flatMap((theme) =>
    table.flatMap(([token, grounds]) => grounds.map((ground) => [theme, token, ground, least] as const)),
  );

test.each([...pairs(TEXT, 4.5), ...pairs(MARKS, 3)])("%s: %s on %s reaches %s:1", (theme, token, ground, least) => {
  expect(contrast(colorOf(token, theme), colorOf(ground, theme))).toBeGreaterThanOrEqual(least);
});

/** Mail programs know no style sheets of ours, and most no dark theme: letters are drawn in the light one. */
test.each([
  ["ground", "ground"],
  ["surface", "surface"],
  ["ink", "ink"],
  ["steel", "steel"],
  ["line", "line"],
  ["still", "still"],
  ["onStill", "on-strong"],
] as const)("%s of the letters is the light %s", (ofLetters, token) => {
  expect(LOOK[ofLetters]).toBe(colorOf(token, "light"));
});

test.each([
  ["ink", "surface"],
  ["steel", "surface"],
  ["still", "surface"],
  ["onStill", "still"],
] as const)("letters: %s on %s reaches 4.5:1", (text, ground) => {
  expect(contrast(LOOK[text], LOOK[ground])).toBeGreaterThanOrEqual(4.5);
});

test("no color is written anywhere but in the tokens", () => {
  const outside = css.replace(/--[\w-]+: light-dark\([^)]*\);/g, "");
  expect(outside.match(/#[0-9a-f]{3,8}\b|rgba?\(|hsla?\(|oklch\(/g)).toBeNull();
});
