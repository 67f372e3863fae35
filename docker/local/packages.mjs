import { existsSync } from "node:fs";
import { join } from "node:path";
import { folderFor, readState, root } from "./checkout.mjs";
import { holderOf, withLock } from "./locks.mjs";
import { Explained, step } from "./progress.mjs";
import { run } from "./run.mjs";

/** Compares the lock file with npm's own note of what is installed; packages for other platforms may be absent. */
export function packagesDiffer(wanted, installed) {
  if (!installed) return true;
  return Object.entries(wanted.packages).some(([path, entry]) => {
    if (path === "") return false;
    const present = installed.packages[path];
    return present ? present.version !== entry.version : !entry.optional && !entry.devOptional;
  });
}

function missing() {
  const wanted = readState(join(root, "package-lock.json"), undefined);
  if (!wanted) throw new Explained("package-lock.json is missing: this is not a whole checkout.");
  return packagesDiffer(wanted, readState(join(root, "node_modules/.package-lock.json"), undefined));
}

function refuseBeneathServer() {
  for (const purpose of ["start", "dev", "test", "bench"]) {
    const holder = holderOf(folderFor(purpose));
    if (holder && holder.pid !== process.pid && existsSync(join(root, "node_modules"))) {
      throw new Explained(
        `The list of packages has changed, but \`npm ${purpose === "dev" || purpose === "bench" ? "run " : ""}${purpose}\` ` +
          `runs from this checkout (process ${holder.pid}). Stop it first: its packages may not be replaced beneath it.`,
      );
    }
  }
}

export async function installPackages() {
  if (!missing()) return;
  await withLock(folderFor("packages"), "the packages", async () => {
    if (!missing()) return;
    refuseBeneathServer();
    await step("Installing packages (npm ci, about a minute the first time)", () =>
      run("npm", ["ci", "--no-audit", "--no-fund", "--include=dev"], { cwd: root }),
    );
  });
}
