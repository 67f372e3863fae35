import { existsSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { expect, test } from "vitest";
import { parse } from "yaml";
import { EnvSchema } from "@/lib/env";
import { entries } from "./local/bundle.mjs";

type Service = {
  build?: { dockerfile: string; target: string };
  command?: string[];
  environment?: Record<string, string>;
  ports?: string[];
  volumes?: string[];
  image: string;
};

const here = (file: string) => join(import.meta.dirname, file);
const composeText = readFileSync(here("compose.yaml"), "utf8");
const { services } = parse(composeText, { merge: true }) as { services: Record<string, Service> };
const stages = readFileSync(here("Dockerfile"), "utf8").split(/^(?=FROM )/m);
const stageOf = (target: string) => stages.find((stage) => stage.split("\n", 1)[0]?.endsWith(` AS ${target}`)) ?? "";
const service = (name: string): Service => {
  const found = services[name];
  if (!found) throw new Error(`compose.yaml has no ${name}`);
  return found;
};

test.each(["app", "worker", "demo"])(
  "%s gets every setting that has no default, and never the owner's address",
  (name) => {
    const given = Object.keys(service(name).environment ?? {});
    const needed = Object.entries(EnvSchema.shape).filter(([, type]) => !type.safeParse(undefined).success);
    expect(given).toEqual(expect.arrayContaining(needed.map(([key]) => key)));
    expect(given).not.toContain("DATABASE_OWNER_URL");
    expect(service(name).environment?.DATABASE_URL).toMatch(/^postgres:\/\/coastdown_app:/);
  },
);

test("only migrations hold the owner's address, and nothing else", () => {
  expect(Object.keys(service("migrate").environment ?? {})).toEqual(["DATABASE_OWNER_URL"]);
});

test("only the application can be reached from outside", () => {
  const open = Object.entries(services).filter(([, { ports }]) =>
    ports?.some((port) => !port.startsWith("127.0.0.1:")),
  );
  expect(open.map(([name]) => name)).toEqual(["app"]);
});

test("every variable of the compose file is explained in env.example", () => {
  const used = [...composeText.matchAll(/\$\{(\w+)/g)].map(([, name]) => name as string);
  const explained = [...readFileSync(here("env.example"), "utf8").matchAll(/^(\w+)=/gm)].map(
    ([, name]) => name as string,
  );
  expect([...new Set(used)].sort()).toEqual(explained.sort());
});

test("files that the compose file mounts are there", () => {
  const mounted = Object.values(services).flatMap(({ volumes = [] }) =>
    volumes.map((volume) => volume.split(":")[0] ?? ""),
  );
  for (const path of mounted.filter((p) => p.startsWith("./"))) expect(existsSync(here(path)), path).toBe(true);
});

test("each command is a program that the build makes", () => {
  const programs = Object.keys(entries).map((name) => `${name}.mjs`);
  const commands = Object.values(services).flatMap(({ command }) => (command ? [command[1]] : []));
  expect(commands.toSorted()).toEqual(programs.toSorted());
});

test.each(Object.values(services).flatMap(({ build }) => build?.target ?? []))(
  "stage %s does not run as root",
  (target) => {
    expect(stageOf(target)).toMatch(/^USER node$/m);
  },
);

test("the image runs the Node.js that the project asks for, and asks its own health check on its own port", () => {
  const { engines } = JSON.parse(readFileSync(here("../package.json"), "utf8")) as { engines: { node: string } };
  const major = engines.node.match(/\d+/)?.[0];
  expect(stageOf("app")).toMatch(new RegExp(`^FROM node:${major}-`));
  const port = stageOf("app").match(/PORT=(\d+)/)?.[1];
  expect(stageOf("app")).toContain(`http://127.0.0.1:${port}/api/health`);
  expect(service("app").ports).toEqual([`\${PORT:-3000}:${port}`]);
  expect(existsSync(here("../app/api/health/route.ts"))).toBe(true);
});
