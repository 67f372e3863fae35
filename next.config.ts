import type { NextConfig } from "next";

const config: NextConfig = {
  output: "standalone",
  poweredByHeader: false,
  reactStrictMode: true,
  serverExternalPackages: ["@node-rs/argon2", "postgres", "pino"],
  // The launcher builds the test stack beside a running server, each into a folder of its own.
  distDir: process.env.NEXT_DIST_DIR ?? ".next",
};

export default config;
