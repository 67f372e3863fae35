import { existsSync, mkdirSync, readdirSync, readFileSync, rmSync, statSync, writeFileSync } from "node:fs";
import { delimiter, join } from "node:path";
import { folderFor, isRoot } from "./checkout.mjs";
import { withLock } from "./locks.mjs";
import { Explained, say, step } from "./progress.mjs";
import { run } from "./run.mjs";

const oldestPostgres = 15;
const zoneDataDays = 30;

export const isDebian = existsSync("/etc/debian_version") && existsSync("/usr/bin/apt-get");

const onPath = (name) => (process.env.PATH ?? "").split(delimiter).find((folder) => existsSync(join(folder, name)));

/** The folder of PostgreSQL's programs: of one major version, or of the newest there is. */
export function postgresPrograms(major) {
  const debian = "/usr/lib/postgresql";
  const versions = existsSync(debian) ? readdirSync(debian).map(Number) : [];
  const fits = (version) => (major ? version === major : version >= oldestPostgres);
  const best = versions.filter((v) => fits(v) && existsSync(`${debian}/${v}/bin/initdb`)).sort((a, b) => b - a)[0];
  return best ? `${debian}/${best}/bin` : onPath("initdb");
}

export const browserProgram = () =>
  process.env.CHROMIUM ??
  ["/usr/bin/chromium", "/usr/bin/chromium-browser", "/usr/bin/google-chrome"].find((file) => existsSync(file));

/** For root the server runs as the package's user, which an installation that was cut off has not made yet. */
const mayRunServer = () => !isDebian || !isRoot || /^postgres:/m.test(readFileSync("/etc/passwd", "utf8"));

const needs = {
  postgres: {
    present: () => postgresPrograms() !== undefined && mayRunServer(),
    packages: ["postgresql", "tzdata"],
    elsewhere: `PostgreSQL ${oldestPostgres} or later, so that its \`initdb\` and \`postgres\` are on the PATH (macOS: brew install postgresql@17), or set DATABASE_URL and DATABASE_OWNER_URL`,
  },
  browser: {
    present: () => browserProgram() !== undefined,
    packages: ["chromium", "fonts-liberation"],
    elsewhere: "Chromium, and its path in the variable CHROMIUM",
  },
};

function explain(missing) {
  const packages = missing.flatMap((need) => need.packages).join(" ");
  return isDebian
    ? `Something is missing that only the administrator may install. Run:\n\n  sudo apt-get update && sudo apt-get install --no-install-recommends ${packages}\n`
    : `Please install first:\n${missing.map((need) => `  - ${need.elsewhere}`).join("\n")}\n`;
}

const env = { DEBIAN_FRONTEND: "noninteractive" };
const apt = (...args) => run("apt-get", ["-y", "-o", "DPkg::Lock::Timeout=300", ...args], { env });

/** An installation that was cut off, by Ctrl-C for instance, has to be finished before the next; apt-get says if not. */
const finishCutOff = () => run("dpkg", ["--configure", "-a"], { env, mayFail: true });

/** Debian would set up and start a cluster of its own with the server package; we bring ours. */
async function withoutDefaultCluster(work) {
  const folder = "/etc/postgresql-common/createcluster.d";
  const file = join(folder, "coastdown.conf");
  mkdirSync(folder, { recursive: true });
  writeFileSync(file, "create_main_cluster = false\n");
  try {
    return await work();
  } finally {
    rmSync(file);
  }
}

const lastZoneUpdate = () => join(folderFor("debian"), "zone-data-updated");

function zoneDataIsOld() {
  const noted = statSync(lastZoneUpdate(), { throwIfNoEntry: false });
  return !noted || Date.now() - noted.mtimeMs > zoneDataDays * 86_400_000;
}

async function install(packages) {
  await step(`Installing ${packages.join(", ")} (apt-get)`, async () => {
    await apt("update");
    await withoutDefaultCluster(async () => {
      await finishCutOff();
      await apt("install", "--fix-broken", "--no-install-recommends", ...packages);
    });
  });
  writeFileSync(lastZoneUpdate(), "");
}

/** PostgreSQL reads the system's zone data, and zones change several times a year. */
async function updateZoneData() {
  try {
    await step("Updating time zone data (apt-get)", async () => {
      await apt("update");
      await apt("install", "--only-upgrade", "tzdata");
    });
  } catch {
    say("  not updated; going on with what is there");
  }
  writeFileSync(lastZoneUpdate(), "");
}

export async function installSystemPackages(...names) {
  const missing = () => names.map((name) => needs[name]).filter((need) => !need.present());
  const mayInstall = isDebian && isRoot;
  if (missing().length > 0 && !mayInstall) throw new Explained(explain(missing()));
  if (!mayInstall || (missing().length === 0 && !zoneDataIsOld())) return;
  await withLock(folderFor("debian"), "apt-get", async () => {
    const packages = missing().flatMap((need) => need.packages);
    if (packages.length > 0) await install([...new Set([...packages, "tzdata"])]);
    else if (zoneDataIsOld()) await updateZoneData();
  });
}
