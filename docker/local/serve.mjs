import { rmSync } from "node:fs";
import { folderFor, readState } from "./checkout.mjs";
import { installSystemPackages } from "./debian.mjs";
import { tryLock } from "./locks.mjs";
import { installPackages } from "./packages.mjs";
import { reserveApplicationPort } from "./ports.mjs";
import { stopAll, stopOnSignals } from "./processes.mjs";
import { say, sayFailure } from "./progress.mjs";
import { interruptRuns } from "./run.mjs";
import { bringUp, openServer, stateFile } from "./stack.mjs";

function sayRunning(command, holder, { address, inbox }) {
  if (!address)
    return say(`\`${command}\` is already starting (process ${holder.pid}); its address will appear there.`);
  say(`Already running (process ${holder.pid}): ${address}`);
  if (inbox) say(`Sent mail: ${inbox}`);
  say(`Stop it with Ctrl-C where it runs, or: kill ${holder.pid}`);
}

function sayReady({ address, inbox, demo }) {
  say();
  if (demo) say(`${demo}\n`);
  say(`Coastdown: ${address}`);
  if (inbox) say(`Sent mail: ${inbox}`);
  say("Ctrl-C stops everything.");
}

async function prepare(purpose) {
  const ownDatabase = !process.env.DATABASE_URL;
  if (ownDatabase) await installSystemPackages("postgres");
  await installPackages();
  rmSync(stateFile(purpose), { force: true });
}

/** From whatever there is to the product on its address, until it is told to stop. */
export async function serve({ command, purpose, programs, show }) {
  const lock = tryLock(folderFor(purpose));
  if (lock.holder) return sayRunning(command, lock.holder, readState(stateFile(purpose), {}));
  process.once("exit", lock.release);
  stopOnSignals(() => {
    say("\nStopping …");
    interruptRuns();
  });
  try {
    const held = await reserveApplicationPort();
    await prepare(purpose);
    const run = await programs();
    const server = await openServer(purpose);
    const urls = await server.database("coastdown");
    sayReady(await bringUp({ purpose, urls, programs: run, held, show }));
  } catch (error) {
    sayFailure(error);
    await stopAll();
    process.exit(1);
  }
}
