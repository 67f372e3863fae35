import { readState } from "./checkout.mjs";
import { Explained, say, sayFailure, step } from "./progress.mjs";

const outcome = { passed: 0, failed: 0 };

let interrupted = false;

export function interruptChecks() {
  interrupted = true;
  outcome.failed += 1;
}

/** One check is one more passed or failed, or as many as it counted; after a failure the next one has its turn. */
export async function check(title, work) {
  if (interrupted) return false;
  let counts = { passed: 1, failed: 0 };
  try {
    await step(title, async () => {
      counts = (await work()) ?? counts;
      if (counts.failed > 0) throw new Explained(`${title}: ${counts.passed} passed, ${counts.failed} failed`);
    });
  } catch (error) {
    sayFailure(error);
    if (counts.failed === 0) counts = { passed: 0, failed: 1 };
  }
  outcome.passed += counts.passed;
  outcome.failed += counts.failed;
  return counts.failed === 0;
}

/** A run that ended badly without a failed test (a file that does not load, a crash) counts as one failure. */
const counted = (passed, failed, code) => ({ passed, failed: code !== 0 && failed === 0 ? 1 : failed });

export function vitestCounts(reportFile, code) {
  const report = readState(reportFile, { numPassedTests: 0, numFailedTests: 0 });
  return counted(report.numPassedTests, report.numFailedTests, code);
}

/** What passes only at the second try counts, and is told: somebody has to look at it. */
export function playwrightCounts(reportFile, code) {
  const { stats } = readState(reportFile, { stats: { expected: 0, flaky: 0, unexpected: 0 } });
  if (stats.flaky > 0) say(`! ${stats.flaky} passed only at the second try`);
  return counted(stats.expected + stats.flaky, stats.unexpected, code);
}

/** The last line, whatever happened before it. */
export function sayOutcome() {
  say(`${outcome.passed} passed, ${outcome.failed} failed`);
  return outcome.failed === 0 && outcome.passed > 0 ? 0 : 1;
}
