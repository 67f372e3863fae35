import { spawn } from "node:child_process";
import { once } from "node:events";
import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { createInterface } from "node:readline";
import { expect, test } from "vitest";
import { bornAt } from "./locks.mjs";

const folder = mkdtempSync(join(tmpdir(), "coastdown-processes-"));

/** A launcher of one program, which tells the number of each process it starts. */
function launcher(program: string) {
  const code = `import { stopOnSignals, supervise } from ${JSON.stringify(join(import.meta.dirname, "processes.mjs"))};
    stopOnSignals(() => {});
    supervise({ name: "program", command: process.execPath, args: ["-e", ${JSON.stringify(program)}],
      cwd: "/", logFile: ${JSON.stringify(join(folder, "log"))}, onLaunch: (pid) => console.log(pid) });`;
  const child = spawn(process.execPath, ["--input-type=module", "-e", code], { stdio: ["ignore", "pipe", "inherit"] });
  const lines = createInterface(child.stdout)[Symbol.asyncIterator]();
  const nextPid = async () => {
    for (;;) {
      const { value, done } = await lines.next();
      if (done) throw new Error("the launcher has ended");
      if (/^\d+$/.test(value)) return Number(value);
    }
  };
  return { child, nextPid };
}

async function untilGone(pid: number) {
  while (bornAt(pid)) await new Promise((resolve) => setImmediate(resolve));
}

const staying = "setInterval(() => {}, 1000)";

test("a program that dies is started again", async () => {
  const { child, nextPid } = launcher(staying);
  process.kill(await nextPid(), "SIGKILL");
  expect(await nextPid()).toBeGreaterThan(0);
  child.kill("SIGTERM");
  await once(child, "exit");
});

test("asked to end, the launcher ends its programs first", async () => {
  const { child, nextPid } = launcher(staying);
  const pid = await nextPid();
  child.kill("SIGINT");
  expect(await once(child, "exit")).toEqual([130, null]);
  expect(bornAt(pid)).toBeUndefined();
});

test("a killed launcher leaves no program behind", async () => {
  const { child, nextPid } = launcher(staying);
  const pid = await nextPid();
  child.kill("SIGKILL");
  await untilGone(pid);
  rmSync(folder, { recursive: true });
});
