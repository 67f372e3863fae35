import { spawn } from "node:child_process";
import { Explained } from "./progress.mjs";

const tailLines = 40;
const running = new Set();
const colors = process.stdout.isTTY ? { FORCE_COLOR: "1" } : { NO_COLOR: "1", FORCE_COLOR: "0" };

/** Ends what is under way, for instance on Ctrl-C. Whole groups: npm and the browser have children of their own. */
export function interruptRuns() {
  for (const child of running) signalGroup(child.pid, "SIGTERM");
}

export function signalGroup(pid, signal) {
  try {
    process.kill(-pid, signal);
  } catch (error) {
    if (error.code !== "ESRCH") throw error;
  }
}

/** Runs a program to its end. With `show` its output is passed through, else kept and shown when it fails. */
export function run(command, args, { cwd, env = {}, show = false, uid, gid, mayFail = false } = {}) {
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, {
      cwd,
      uid,
      gid,
      detached: true,
      env: { ...process.env, ...colors, ...env },
      stdio: ["ignore", show ? "inherit" : "pipe", show ? "inherit" : "pipe"],
    });
    running.add(child);
    let output = "";
    let stdout = "";
    child.stdout?.on("data", (chunk) => {
      stdout += chunk;
      output += chunk;
    });
    child.stderr?.on("data", (chunk) => {
      output += chunk;
    });
    child.once("error", (error) => {
      running.delete(child);
      reject(new Explained(`${command} could not be run: ${error.message}`));
    });
    child.once("close", (code, signal) => {
      running.delete(child);
      if (code === 0 || mayFail) return resolve({ code: code ?? 1, stdout });
      const tail = output.trimEnd().split("\n").slice(-tailLines).join("\n");
      reject(new Explained(`${tail}\n${command} ${args[0] ?? ""} ended with ${signal ?? `code ${code}`}`));
    });
  });
}
