import { existsSync } from "node:fs";
import { join } from "node:path";
import { root } from "./checkout.mjs";
import { Explained } from "./progress.mjs";

/** The programs beside the application: `<out>/<name>.mjs` each. */
export const entries = { migrate: "db/migrate.ts", demo: "db/demo/load.ts", worker: "lib/worker/main.ts" };
// Packages with machine code cannot be bundled; the application's own copies serve.
const native = ["@node-rs/argon2"];

export async function bundlePrograms(out) {
  const { build } = await import("esbuild");
  const { metafile } = await build({
    absWorkingDir: root,
    entryPoints: Object.entries(entries).map(([name, path]) => ({ in: path, out: name })),
    outdir: out,
    outExtension: { ".js": ".mjs" },
    bundle: true,
    platform: "node",
    target: "node20",
    format: "esm",
    sourcemap: "linked",
    legalComments: "none",
    logLevel: "error",
    metafile: true,
    external: native,
    alias: { "server-only": join(root, "node_modules/server-only/empty.js") },
    // Packages written for CommonJS ask for these.
    banner: {
      js: `import { createRequire as coastdownRequire } from "node:module";
const require = coastdownRequire(import.meta.url), __filename = import.meta.filename, __dirname = import.meta.dirname;`,
    },
  });
  const used = new Set(
    Object.values(metafile.outputs).flatMap((o) => o.imports.filter((i) => i.external).map((i) => i.path)),
  );
  for (const name of native.filter((n) => used.has(n))) {
    if (!existsSync(join(out, "node_modules", name))) throw new Explained(`${name} is not in the built application.`);
  }
}
