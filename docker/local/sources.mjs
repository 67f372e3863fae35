import { createHash } from "node:crypto";
import { readdirSync, readFileSync } from "node:fs";
import { join, relative } from "node:path";
import { root } from "./checkout.mjs";

const folders = ["app", "components", "db", "emails", "lib", "public"];
const programs = ["docker/local/build.mjs", "docker/local/bundle.mjs"];
// Files at the top that no build reads, and one that Next.js writes by itself.
const idle = /^(biome|knip|vitest\.config|playwright\.config|drizzle\.config|next-env\.d)\b/;

const isTest = (name) => /\.test\.tsx?$/.test(name);

function filesIn(folder) {
  const entries = readdirSync(folder, { withFileTypes: true, recursive: true });
  return entries
    .filter((e) => e.isFile() && !isTest(e.name))
    .map((e) => relative(root, join(e.parentPath ?? e.path, e.name)));
}

/** Every file that a build is made of. */
export function sourceFiles() {
  const top = readdirSync(root, { withFileTypes: true });
  const settings = top.filter((e) => e.isFile() && /\.(ts|mjs|json)$/.test(e.name) && !idle.test(e.name));
  const trees = top.filter((e) => e.isDirectory() && folders.includes(e.name));
  return [...settings.map((e) => e.name), ...trees.flatMap((e) => filesIn(join(root, e.name))), ...programs].sort();
}

/** Names a build by what went into it: the same sources, packages and Node.js give the same name. */
export function sourceHash() {
  const hash = createHash("sha256").update(`${process.version} ${process.platform} ${process.arch}`);
  for (const file of sourceFiles()) hash.update(`\0${file}\0`).update(readFileSync(join(root, file)));
  return hash.digest("hex").slice(0, 16);
}
