import { spawnSync } from "node:child_process";
import { linkSync, readFileSync, renameSync, rmSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { setTimeout as pause } from "node:timers/promises";
import { readState } from "./checkout.mjs";
import { say } from "./progress.mjs";

/** When a process began; with its number it names it for good, since numbers are given out again. */
export function bornAt(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, "utf8");
    const fields = stat.slice(stat.lastIndexOf(")") + 2).split(" ");
    // Dead and waiting to be collected, which in a container may take long.
    return fields[0] === "Z" ? undefined : fields[19];
  } catch {
    const ps = spawnSync("ps", ["-o", "lstart=", "-p", String(pid)], { encoding: "utf8" });
    return ps.stdout?.trim() || undefined;
  }
}

const me = () => ({ pid: process.pid, born: bornAt(process.pid) });
const isAlive = (holder) => holder !== undefined && bornAt(holder.pid) === holder.born;
const isMe = (holder) => holder?.pid === process.pid;
const lockFile = (folder) => join(folder, "lock.json");

/** Who holds the folder now, if that process still lives. */
export function holderOf(folder) {
  const holder = readState(lockFile(folder), undefined);
  return isAlive(holder) ? holder : undefined;
}

function removeStale(file) {
  const aside = `${file}.${process.pid}.stale`;
  try {
    renameSync(file, aside);
    // Someone faster may have put a live lock there between our look and our move: give it back.
    if (isAlive(readState(aside, undefined))) linkSync(aside, file);
    rmSync(aside);
  } catch (error) {
    if (error.code !== "ENOENT" && error.code !== "EEXIST") throw error;
  }
}

/** Takes the folder, or answers who has it. Freed when `release` is called or the process has died. */
export function tryLock(folder) {
  const file = lockFile(folder);
  const draft = `${file}.${process.pid}`;
  writeFileSync(draft, JSON.stringify(me()), { mode: 0o600 });
  try {
    for (;;) {
      try {
        linkSync(draft, file);
        return { release: () => rmSync(file, { force: true }) };
      } catch (error) {
        if (error.code !== "EEXIST") throw error;
      }
      const holder = holderOf(folder);
      if (holder) return { holder };
      removeStale(file);
    }
  } finally {
    rmSync(draft, { force: true });
  }
}

export async function waitForLock(folder, what) {
  for (let told = false; ; told = true) {
    const lock = tryLock(folder);
    if (lock.release) return lock;
    if (isMe(lock.holder)) throw new Error(`${what} is already locked by this process`);
    if (!told) say(`  waiting for ${what}: process ${lock.holder.pid} of this checkout has it`);
    await pause(500);
  }
}

export async function withLock(folder, what, work) {
  const lock = await waitForLock(folder, what);
  try {
    return await work();
  } finally {
    lock.release();
  }
}
