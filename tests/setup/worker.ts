import { afterAll, inject } from "vitest";

const databases = inject("databases");
const mine = databases[(Number(process.env.VITEST_POOL_ID ?? 1) - 1) % databases.length];

for (const name of ["DATABASE_URL", "DATABASE_OWNER_URL"]) {
  process.env[name] = Object.assign(new URL(process.env[name] ?? ""), { pathname: `/${mine}` }).toString();
}
Object.assign(process.env, {
  AUTH_SECRET: "only-for-tests-only-for-tests-only-for-tests",
  SECRETS_KEY: Buffer.from("only-for-tests-only-for-tests-32").toString("base64"),
  APP_URL: "http://localhost:3000",
  SMTP_URL: "smtp://127.0.0.1:1025",
  NODE_ENV: "test",
  LOG_LEVEL: "silent",
});

/** Each test file has modules, and so a pool, of its own. */
afterAll(async () => {
  const kept = globalThis as { coastdownDatabase?: { $client: { end(): Promise<void> } } };
  await kept.coastdownDatabase?.$client.end();
  delete kept.coastdownDatabase;
});
