import { randomBytes } from "node:crypto";
import { join } from "node:path";
import { setTimeout as pause } from "node:timers/promises";
import { folderFor, readState, writeState } from "./checkout.mjs";
import { startCluster } from "./cluster.mjs";
import { givenServer } from "./given-server.mjs";
import { freePort } from "./ports.mjs";
import { supervise } from "./processes.mjs";
import { Explained, step } from "./progress.mjs";
import { run } from "./run.mjs";

const readyPatience = 90_000;
const triesToStart = 3;

export const stateFile = (purpose) => join(folderFor(purpose), "state.json");

/** The server with our databases: the one given from outside, or a cluster of our own in the purpose's folder. */
export async function openServer(purpose) {
  const { DATABASE_URL, DATABASE_OWNER_URL } = process.env;
  if (DATABASE_URL && DATABASE_OWNER_URL) return givenServer({ DATABASE_URL, DATABASE_OWNER_URL });
  if (DATABASE_URL || DATABASE_OWNER_URL) throw new Explained("Give DATABASE_URL and DATABASE_OWNER_URL together.");
  const onLaunch = (pid) => note(purpose, { postgres: pid });
  return step("Starting PostgreSQL", () => startCluster(folderFor(purpose), { onLaunch }));
}

/** What runs under which process number, for a second launcher and for tests that kill things. */
function note(purpose, change) {
  const file = stateFile(purpose);
  const state = readState(file, {});
  writeState(file, { ...state, ...change });
}

/** Made once and kept beside the databases: with another one nobody stays signed in, and no code can be read. */
function keptSecret(folder, name, encoding) {
  const file = join(folder, `${name}.json`);
  const secret = readState(file, undefined) ?? randomBytes(32).toString(encoding);
  writeState(file, secret);
  return secret;
}

async function startMail(purpose) {
  if (process.env.SMTP_URL) return { smtpUrl: process.env.SMTP_URL };
  const folder = folderFor(purpose);
  const kept = readState(join(folder, "mail-ports.json"), { smtp: 1025, http: 8025 });
  const ports = { smtp: await freePort(kept.smtp), http: await freePort(kept.http) };
  writeState(join(folder, "mail-ports.json"), ports);
  const main = join(import.meta.dirname, "mail/main.mjs");
  const options = ["--smtp", ports.smtp, "--http", ports.http, "--dir", join(folder, "mail")].map(String);
  const mail = start(purpose, "mail", { command: process.execPath, args: [main, ...options], cwd: folder });
  const inbox = `http://localhost:${ports.http}`;
  await untilAnswering(mail, `${inbox}/api/messages`);
  return { smtpUrl: `smtp://127.0.0.1:${ports.smtp}`, inbox };
}

function start(purpose, name, program, show = false) {
  const logFile = join(folderFor(purpose), `${name}.log`);
  return supervise({ ...program, name, logFile, show, onLaunch: (pid) => note(purpose, { [name]: pid }) });
}

async function untilAnswering(program, url) {
  let last = "";
  for (
    const end = Date.now() + readyPatience;
    Date.now() < end && program.failures() < triesToStart;
    await pause(100)
  ) {
    try {
      const answer = await fetch(url, { signal: AbortSignal.timeout(30_000) });
      if (answer.ok) return;
      last = `${answer.status} ${await answer.text()}`;
    } catch (error) {
      last = error.cause?.code ?? error.message;
    }
  }
  throw new Explained(`${program.logTail()}\nNothing good from ${url}: ${last}\nLog: ${program.logFile}`);
}

const once = (program, env) =>
  run(program.command, program.args, { cwd: program.cwd, env: { ...program.env, ...env } });

/** Brings up everything that a user of the product meets; answers where it is and what the demo loader said. */
export async function bringUp({ purpose, urls, programs, held, show = false }) {
  await step("Applying migrations", async () => {
    const { stdout } = await once(programs.migrate, { DATABASE_OWNER_URL: urls.DATABASE_OWNER_URL });
    return stdout.trim().split("\n").at(-1);
  });
  const { smtpUrl, inbox } = await step("Starting the mail stand-in", () => startMail(purpose));
  const address = process.env.APP_URL ?? `http://localhost:${held.port}`;
  const env = {
    DATABASE_URL: urls.DATABASE_URL,
    DATABASE_OWNER_URL: undefined,
    AUTH_SECRET: process.env.AUTH_SECRET ?? keptSecret(folderFor(purpose), "auth-secret", "base64url"),
    SECRETS_KEY: process.env.SECRETS_KEY ?? keptSecret(folderFor(purpose), "secrets-key", "base64"),
    APP_URL: address,
    SMTP_URL: smtpUrl,
    DEMO: process.env.DEMO ?? "on",
  };
  const demo =
    env.DEMO === "on" ? await step("Loading the demo company", () => once(programs.demo, env)) : { stdout: "" };
  await step("Starting the application and its worker", async () => {
    start(purpose, "worker", withEnv(programs.worker, env), show);
    await held.release();
    const app = start(purpose, "app", withEnv(programs.app(held.port), env), show);
    await untilAnswering(app, `http://localhost:${held.port}/api/health`);
  });
  note(purpose, { address, inbox });
  return { address, inbox, demo: demo.stdout.trimEnd(), env };
}

const withEnv = (program, env) => ({ ...program, env: { ...program.env, ...env } });
