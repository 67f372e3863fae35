import { expect, test } from "vitest";
import { MOST_ATTEMPTS, secondsUntilRetry } from "./backoff";

test("waits double from five seconds, never beyond an hour, and end", () => {
  const waits = Array.from({ length: MOST_ATTEMPTS }, (_, i) => secondsUntilRetry(i + 1));
  expect(waits).toEqual([5, 10, 20, 40, 80, 160, 320, null]);
});
