import { spawn } from "node:child_process";
import { once } from "node:events";
import { join } from "node:path";
import { createInterface } from "node:readline";

const root = join(import.meta.dirname, "../..");

/** Runs a source file as a program of its own, with more settings than this one has. */
export function start(file: string, settings: Record<string, string>) {
  const env = { ...process.env, TSX_TSCONFIG_PATH: join(root, "docker/local/tsconfig.json"), ...settings };
  const child = spawn(process.execPath, ["--import", "tsx", join(root, file)], {
    cwd: root,
    env,
    stdio: ["ignore", "pipe", "inherit"],
  });
  const exited = once(child, "exit");
  return {
    lines: createInterface(child.stdout),
    exited,
    async end(signal: NodeJS.Signals) {
      child.kill(signal);
      await exited;
    },
  };
}
