import { expect, test } from "vitest";
import { licenseState } from "./license-state";

test.each([
  ["2027-03-01", "valid", 90],
  ["2027-01-30", "expiring", 60],
  ["2027-01-31", "valid", 61],
  ["2026-12-01", "expiring", 0],
  ["2026-11-30", "expired", -1],
] as const)("a license that ends on %s is %s on 2026-12-01", (expiresOn, kind, daysLeft) => {
  expect(licenseState(expiresOn, "2026-12-01")).toEqual({ kind, daysLeft });
});
