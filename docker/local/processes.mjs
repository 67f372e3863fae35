import { spawn } from "node:child_process";
import { createWriteStream, readFileSync } from "node:fs";
import { join } from "node:path";
import { setTimeout as pause } from "node:timers/promises";
import { say } from "./progress.mjs";
import { signalGroup } from "./run.mjs";

const patience = 15_000;
const longestBackOff = 30_000;
const steady = 60_000;

// Node's children leave with the launcher even if it is killed without a chance to stop them.
const leash = ["--import", `file://${join(import.meta.dirname, "leash.mjs")}`];

const supervised = [];

/**
 * Keeps one program running: starts it again, each time after a longer pause, when it ends without being asked.
 * Programs stand in process groups of their own, so that Ctrl-C reaches only the launcher, which stops them in order.
 */
export function supervise(program) {
  const log = createWriteStream(program.logFile, { flags: "a", mode: 0o600 });
  const one = { program, log, child: undefined, stopping: false, failures: 0, exited: Promise.resolve() };
  supervised.push(one);
  launch(one);
  const { logFile } = program;
  return { stop: () => stop(one), failures: () => one.failures, logFile, logTail: () => tailOf(logFile) };
}

const tailOf = (file) => readFileSync(file, "utf8").trimEnd().split("\n").slice(-20).join("\n");

function launch(one) {
  const { command, args, env, cwd, uid, gid, onLeash = true, onLaunch } = one.program;
  const since = Date.now();
  const child = spawn(command, onLeash ? [...leash, ...args] : args, {
    cwd,
    uid,
    gid,
    detached: true,
    env: { ...process.env, LAUNCHER_PID: String(process.pid), ...env },
    stdio: ["ignore", "pipe", "pipe", ...(onLeash ? ["ipc"] : [])],
  });
  one.child = child;
  for (const stream of [child.stdout, child.stderr]) stream.on("data", (chunk) => write(one, chunk));
  one.exited = new Promise((resolve) => {
    child.once("error", (error) => write(one, `${error.message}\n`));
    child.once("close", (code, signal) => {
      resolve();
      if (!one.stopping) void comeBack(one, signal ?? `code ${code}`, Date.now() - since);
    });
  });
  onLaunch?.(child.pid);
}

function write(one, chunk) {
  one.log.write(chunk);
  if (one.program.show) process.stdout.write(chunk);
}

async function comeBack(one, how, lived) {
  one.failures = lived > steady ? 0 : one.failures + 1;
  const wait = Math.min(1000 * 2 ** Math.max(0, one.failures - 1), longestBackOff);
  say(
    `! ${one.program.name} ended unexpectedly (${how}); starting it again in ${wait / 1000} s. Log: ${one.program.logFile}`,
  );
  await pause(wait);
  await one.program.beforeRestart?.();
  if (!one.stopping) launch(one);
}

async function stop(one) {
  if (one.stopping) return one.exited;
  one.stopping = true;
  if (one.child?.exitCode === null && one.child.signalCode === null) {
    one.child.kill(one.program.stopSignal ?? "SIGTERM");
    const gone = await Promise.race([one.exited.then(() => true), pause(patience, false, { ref: false })]);
    if (!gone) signalGroup(one.child.pid, "SIGKILL");
  }
  await one.exited;
  one.log.end();
}

/** The last started goes first: the application before its database. */
export async function stopAll() {
  for (const one of [...supervised].reverse()) await stop(one);
}

function killAll() {
  for (const one of supervised) if (one.child) signalGroup(one.child.pid, "SIGKILL");
}

const codes = { SIGINT: 130, SIGTERM: 143, SIGHUP: 129 };

/** Ctrl-C, `kill` and a closed terminal end everything once, in order; a second Ctrl-C does not wait. */
export function stopOnSignals(before, after) {
  let asked = false;
  for (const [signal, code] of Object.entries(codes)) {
    process.on(signal, async () => {
      if (asked) return killAll();
      asked = true;
      before();
      await stopAll();
      after?.();
      process.exit(code);
    });
  }
  if (process.env.npm_lifecycle_event) stopWithParent();
}

/** npm does not pass on the signal that ends it. */
function stopWithParent() {
  const parent = process.ppid;
  const watch = setInterval(() => {
    if (process.ppid === parent) return;
    clearInterval(watch);
    process.kill(process.pid, "SIGTERM");
  }, 500);
  watch.unref();
}
