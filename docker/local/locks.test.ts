import { type ChildProcess, spawn } from "node:child_process";
import { once } from "node:events";
import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterEach, expect, test } from "vitest";
import { bornAt, holderOf, tryLock } from "./locks.mjs";

const folders: string[] = [];
const children: ChildProcess[] = [];

function freshFolder() {
  const folder = mkdtempSync(join(tmpdir(), "coastdown-lock-"));
  folders.push(folder);
  return folder;
}

/** Another process that tries for the lock, says whether it got it, and stays. */
async function rival(folder: string) {
  const code = `import { tryLock } from ${JSON.stringify(join(import.meta.dirname, "locks.mjs"))};
    const lock = tryLock(${JSON.stringify(folder)});
    console.log(lock.release ? "got" : "refused");
    setInterval(() => {}, 1000);`;
  const child = spawn(process.execPath, ["--input-type=module", "-e", code], { stdio: ["ignore", "pipe", "inherit"] });
  children.push(child);
  const [said] = (await once(child.stdout, "data")) as [Buffer];
  return { child, said: said.toString().trim() };
}

afterEach(() => {
  for (const child of children.splice(0)) child.kill("SIGKILL");
  for (const folder of folders.splice(0)) rmSync(folder, { recursive: true });
});

test("of many that try at once, one gets the lock", async () => {
  const folder = freshFolder();
  const said = await Promise.all(Array.from({ length: 5 }, () => rival(folder)));
  expect(said.filter((one) => one.said === "got")).toHaveLength(1);
});

test("a held lock names its holder; a released one is free", async () => {
  const folder = freshFolder();
  const { child } = await rival(folder);
  expect(tryLock(folder).holder?.pid).toBe(child.pid);
  const mine = tryLock(freshFolder());
  expect(mine.release).toBeDefined();
});

test("the lock of a killed process is free at once", async () => {
  const folder = freshFolder();
  const { child } = await rival(folder);
  child.kill("SIGKILL");
  await once(child, "exit");
  expect(holderOf(folder)).toBeUndefined();
  const mine = tryLock(folder);
  expect(mine.release).toBeDefined();
  mine.release?.();
  expect(tryLock(folder).release).toBeDefined();
});

test("a process is told from a later one of the same number", () => {
  expect(bornAt(process.pid)).toBe(bornAt(process.pid));
  expect(bornAt(2 ** 22 + 1)).toBeUndefined();
});
