import { Explained } from "./progress.mjs";

async function withClient(url, work) {
  const { default: postgres } = await import("postgres");
  const client = postgres(url, { max: 1, connect_timeout: 10, onnotice: () => {} });
  try {
    return await work(client);
  } finally {
    await client.end();
  }
}

async function checkThatItAnswers(variable, url) {
  try {
    await withClient(url, (client) => client`select 1`);
  } catch (error) {
    throw new Explained(`${variable} does not lead into a database: ${error.message}. Its roles: docker/roles.sql.`);
  }
}

/** A server that others run: its roles are there already, and the owner may create databases where one is needed. */
export async function givenServer(given) {
  for (const [variable, url] of Object.entries(given)) await checkThatItAnswers(variable, url);
  const urlsOf = (name) =>
    Object.fromEntries(
      Object.entries(given).map(([key, url]) => [key, Object.assign(new URL(url), { pathname: name }).href]),
    );
  return {
    async database(name, { fresh = false } = {}) {
      if (!fresh) return given;
      await withClient(given.DATABASE_OWNER_URL, async (owner) => {
        await owner.unsafe(`drop database if exists ${name} with (force)`);
        await owner.unsafe(`create database ${name}`);
      });
      return urlsOf(name);
    },
  };
}
