/** A server that others run: its roles are there already, and the owner may create databases where one is needed. */
export function givenServer(given) {
  const urlsOf = (name) =>
    Object.fromEntries(
      Object.entries(given).map(([key, url]) => [key, Object.assign(new URL(url), { pathname: name }).href]),
    );
  return {
    async database(name, { fresh = false } = {}) {
      if (!fresh) return given;
      const { default: postgres } = await import("postgres");
      const owner = postgres(given.DATABASE_OWNER_URL, { max: 1, onnotice: () => {} });
      try {
        await owner.unsafe(`drop database if exists ${name} with (force)`);
        await owner.unsafe(`create database ${name}`);
      } finally {
        await owner.end();
      }
      return urlsOf(name);
    },
  };
}
