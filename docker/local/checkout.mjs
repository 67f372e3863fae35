import { createHash } from "node:crypto";
import { chmodSync, mkdirSync, readFileSync, realpathSync, renameSync, writeFileSync } from "node:fs";
import { homedir } from "node:os";
import { join } from "node:path";

export const root = realpathSync(join(import.meta.dirname, "../.."));
export const isRoot = process.getuid?.() === 0;

// Outside the tree: the database server's own user may often not enter the folder of the checkout.
const everyCheckout = isRoot ? "/var/lib/coastdown" : join(homedir(), ".local/share/coastdown");
const thisCheckout = join(everyCheckout, createHash("sha256").update(root).digest("hex").slice(0, 12));

function passableFolder(path) {
  mkdirSync(path, { recursive: true });
  chmodSync(path, 0o711);
  return path;
}

/** Where one purpose (start, dev, test, bench) keeps its cluster, mail, secrets and logs. */
export function folderFor(purpose) {
  passableFolder(everyCheckout);
  writeFileSync(join(passableFolder(thisCheckout), "checkout"), `${root}\n`);
  return passableFolder(join(thisCheckout, purpose));
}

export function readState(file, fallback) {
  try {
    return JSON.parse(readFileSync(file, "utf8"));
  } catch (error) {
    if (error.code === "ENOENT") return fallback;
    throw error;
  }
}

/** Replaced in one step, readable by its owner alone: it may hold passwords. */
export function writeState(file, value) {
  const next = `${file}.${process.pid}`;
  writeFileSync(next, `${JSON.stringify(value, null, 2)}\n`, { mode: 0o600 });
  renameSync(next, file);
}
