import { existsSync, readdirSync } from "node:fs";
import { join } from "node:path";
import { currentBuild } from "./build.mjs";
import { folderFor, root } from "./checkout.mjs";
import { installSystemPackages } from "./debian.mjs";
import { waitForLock } from "./locks.mjs";
import { installPackages } from "./packages.mjs";
import { reservePort } from "./ports.mjs";
import { stopAll, stopOnSignals } from "./processes.mjs";
import { builtPrograms, sourceEnv } from "./programs.mjs";
import { Explained, sayFailure, step } from "./progress.mjs";
import { interruptRuns, run } from "./run.mjs";
import { bringUp, openServer, stateFile } from "./stack.mjs";

const folder = join(root, "tests/bench");
const suffix = ".bench.ts";

function benchFile(name) {
  const file = join(folder, `${name}${suffix}`);
  if (name && existsSync(file)) return file;
  const names = readdirSync(folder).filter((entry) => entry.endsWith(suffix));
  throw new Explained(
    `Which one? npm run bench -- ${names.map((entry) => entry.slice(0, -suffix.length)).join(" | ")}`,
  );
}

/** Measures the product as built and with its demo company, on a cluster that nothing else uses. */
async function bench(name) {
  const file = benchFile(name);
  if (!process.env.DATABASE_URL) await installSystemPackages("postgres");
  await installPackages();
  const programs = builtPrograms(await currentBuild());
  const urls = await (await openServer("bench")).database("bench", { fresh: true });
  const { address, inbox } = await bringUp({ purpose: "bench", urls, programs, held: await reservePort() });
  const env = { ...urls, ...sourceEnv, APP_URL: address, MAIL_URL: inbox, STATE_FILE: stateFile("bench") };
  await step(`Measuring: ${name}`, async () => {
    await run(process.execPath, ["--import", "tsx", file, ...process.argv.slice(3)], { cwd: root, env, show: true });
  });
}

const lock = await waitForLock(folderFor("bench"), "`npm run bench`");
process.once("exit", lock.release);
stopOnSignals(interruptRuns);
try {
  await bench(process.argv[2]);
} catch (error) {
  sayFailure(error);
  process.exitCode = 1;
}
await stopAll();
process.exit();
