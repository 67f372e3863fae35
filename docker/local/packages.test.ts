import { expect, test } from "vitest";
import { packagesDiffer } from "./packages.mjs";

const wanted = {
  packages: {
    "": { version: "1.0.0" },
    "node_modules/a": { version: "1.0.0" },
    "node_modules/for-another-platform": { version: "1.0.0", optional: true },
  },
};
const installed = (version: string) => ({ packages: { "node_modules/a": { version } } });

test("nothing is installed again while what is there fits the lock file", () => {
  expect(packagesDiffer(wanted, installed("1.0.0"))).toBe(false);
});

test.each([
  ["nothing is installed, or an installation was cut off", undefined],
  ["a version has changed", installed("1.0.1")],
  ["a package is new", { packages: {} }],
])("packages are installed when %s", (_, there) => {
  expect(packagesDiffer(wanted, there)).toBe(true);
});
