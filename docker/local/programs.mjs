import { join } from "node:path";
import { root } from "./checkout.mjs";

const node = process.execPath;
const tsx = ["--import", "tsx"];
// Names the sources' own import paths, and an empty `server-only`, which throws outside a server bundle.
export const sourceEnv = { TSX_TSCONFIG_PATH: join(root, "docker/local/tsconfig.json") };

/** How to run each program from a build. */
export function builtPrograms(build) {
  const from = (file) => ({
    command: node,
    args: [join(build, file)],
    cwd: build,
    env: { NODE_ENV: "production" },
  });
  return {
    migrate: from("migrate.mjs"),
    demo: from("demo.mjs"),
    worker: from("worker.mjs"),
    app: (port) => ({
      ...from("server.js"),
      env: { NODE_ENV: "production", HOSTNAME: "127.0.0.1", PORT: String(port) },
    }),
  };
}

/** The same from the sources, with hot reload. */
export function sourcePrograms() {
  const env = { ...sourceEnv, NODE_ENV: "development", NEXT_TELEMETRY_DISABLED: "1" };
  const from = (file) => ({ command: node, args: [...tsx, join(root, file)], cwd: root, env });
  const bin = (path, ...args) => ({
    command: node,
    args: [join(root, "node_modules", path), ...args],
    cwd: root,
    env,
  });
  return {
    migrate: from("db/migrate.ts"),
    demo: from("db/demo/load.ts"),
    worker: bin("tsx/dist/cli.mjs", "watch", "--clear-screen=false", "lib/worker/main.ts"),
    app: (port) => bin("next/dist/bin/next", "dev", "--hostname", "127.0.0.1", "--port", String(port)),
  };
}
