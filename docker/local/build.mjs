import { cpSync, existsSync, mkdirSync, readdirSync, renameSync, rmSync, statSync, utimesSync } from "node:fs";
import { join } from "node:path";
import { bundlePrograms } from "./bundle.mjs";
import { folderFor, root } from "./checkout.mjs";
import { withLock } from "./locks.mjs";
import { step } from "./progress.mjs";
import { run } from "./run.mjs";
import { sourceHash } from "./sources.mjs";

const builds = join(root, "build");
const keptBuilds = 3;

/** Next.js builds in `.next`; what runs stands in a folder of its own, complete, and is never written again. */
async function buildInto(target) {
  const draft = `${target}.new`;
  rmSync(draft, { recursive: true, force: true });
  await run(process.execPath, [join(root, "node_modules/next/dist/bin/next"), "build"], {
    cwd: root,
    env: { NODE_ENV: "production", NEXT_TELEMETRY_DISABLED: "1" },
  });
  mkdirSync(builds, { recursive: true });
  cpSync(join(root, ".next/standalone"), draft, { recursive: true, verbatimSymlinks: true });
  cpSync(join(root, ".next/static"), join(draft, ".next/static"), { recursive: true });
  if (existsSync(join(root, "public"))) cpSync(join(root, "public"), join(draft, "public"), { recursive: true });
  cpSync(join(root, "db/migrations"), join(draft, "db/migrations"), { recursive: true });
  await bundlePrograms(draft);
  renameSync(draft, target);
}

/** Forgets old builds, least recently started first; one that still runs was started recently enough. */
function forgetOldBuilds() {
  const all = readdirSync(builds).map((name) => ({
    path: join(builds, name),
    at: statSync(join(builds, name)).mtimeMs,
  }));
  for (const { path } of all.sort((a, b) => b.at - a.at).slice(keptBuilds))
    rmSync(path, { recursive: true, force: true });
}

/** The folder of the build that belongs to the sources as they stand, made if there is none. */
export async function currentBuild() {
  return withLock(folderFor("build"), "the build", async () => {
    const target = join(builds, sourceHash());
    if (!existsSync(target)) await step("Building the application (one to two minutes)", () => buildInto(target));
    utimesSync(target, new Date(), new Date());
    forgetOldBuilds();
    return target;
  });
}

// In the image: `node docker/local/build.mjs <folder>`.
if (process.argv[1] === import.meta.filename) {
  await buildInto(process.argv[2]);
}
