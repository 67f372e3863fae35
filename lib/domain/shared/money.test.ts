import fc from "fast-check";
import { expect, test } from "vitest";
import { centsOf, dollarsOf } from "./money";

test.each([
  ["1250", 125_000],
  ["$1,250.00", 125_000],
  ["0.07", 7],
  ["1.1", 110],
  // 1.1 * 3 and 19.99 * 100 are famous for not being whole in binary fractions.
  ["19.99", 1999],
  ["99,999,999.99", 9_999_999_999],
] as const)("%s is %i cents", (typed, cents) => expect(centsOf(typed)).toBe(cents));

test.each(["", "1.234", "12,34", "-5", "1e3", "one", "100,000,000.00"])("%s is no amount", (typed) =>
  expect(centsOf(typed)).toBeNull(),
);

test("what is written can be read back", () => {
  fc.assert(fc.property(fc.integer({ min: 0, max: 9_999_999_999 }), (cents) => centsOf(dollarsOf(cents)) === cents));
});
