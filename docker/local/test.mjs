import { mkdirSync, rmSync } from "node:fs";
import { join } from "node:path";
import { currentBuild } from "./build.mjs";
import { folderFor, root } from "./checkout.mjs";
import { browserProgram, installSystemPackages } from "./debian.mjs";
import { waitForLock } from "./locks.mjs";
import { check, interruptChecks, playwrightCounts, sayOutcome, vitestCounts } from "./outcome.mjs";
import { installPackages } from "./packages.mjs";
import { reservePort } from "./ports.mjs";
import { stopAll, stopOnSignals } from "./processes.mjs";
import { builtPrograms } from "./programs.mjs";
import { interruptRuns, run } from "./run.mjs";
import { bringUp, openServer, stateFile } from "./stack.mjs";

// `npm test -- lib/services` runs the tests of those files alone.
const only = process.argv.slice(2);
const reports = join(root, "test-results");
const bin = (path, ...args) => run(process.execPath, [join(root, "node_modules", path), ...args], { cwd: root });

async function tests(path, args, env, counts) {
  const program = [join(root, "node_modules", path), ...args];
  const report = join(reports, `${counts.name}.json`);
  rmSync(report, { force: true });
  const { code } = await run(process.execPath, program, {
    cwd: root,
    show: true,
    mayFail: true,
    env: { ...env, NODE_ENV: "test", TEST_REPORT: report },
  });
  return counts(report, code);
}

async function checks() {
  await check("Format and lint", async () => void (await bin("@biomejs/biome/bin/biome", "ci", "--error-on-warnings")));
  await check("Types", async () => {
    await bin("next/dist/bin/next", "typegen");
    await bin("typescript/bin/tsc", "--noEmit");
  });
  await check("Unused files, exports and packages", async () => void (await bin("knip/bin/knip.js", "--no-progress")));
}

const unitTests = (urls) => () => {
  const args = [
    "run",
    ...only,
    "--reporter=default",
    "--reporter=json",
    `--outputFile.json=${join(reports, "vitestCounts.json")}`,
  ];
  return tests("vitest/vitest.mjs", args, urls, vitestCounts);
};

/** The whole product as built, with a database made anew. */
async function endToEnd(server) {
  let stack;
  let urls;
  const built = await check("Production build and stack", async () => {
    urls = await server.database("e2e", { fresh: true });
    const programs = builtPrograms(await currentBuild());
    stack = await bringUp({ purpose: "test", urls, programs, held: await reservePort() });
  });
  if (!built) return;
  const env = {
    ...urls,
    APP_URL: stack.address,
    MAIL_URL: stack.inbox,
    STATE_FILE: stateFile("test"),
    CHROMIUM: browserProgram(),
  };
  await check("End-to-end tests", () => tests("@playwright/test/cli.js", ["test"], env, playwrightCounts));
}

async function everything() {
  mkdirSync(reports, { recursive: true });
  let server;
  let urls;
  const ready = await check("Preparing the machine", async () => {
    await installSystemPackages(
      ...(process.env.DATABASE_URL ? [] : ["postgres"]),
      ...(only.length > 0 ? [] : ["browser"]),
    );
    await installPackages();
    server = await openServer("test");
    urls = await server.database("coastdown");
  });
  if (!ready) return;
  if (only.length === 0) await checks();
  await check("Tests", unitTests(urls));
  if (only.length === 0) await endToEnd(server);
}

const lock = await waitForLock(folderFor("test"), "`npm test`");
process.once("exit", lock.release);
stopOnSignals(() => {
  interruptChecks();
  interruptRuns();
}, sayOutcome);
await everything();
await stopAll();
process.exit(sayOutcome());
