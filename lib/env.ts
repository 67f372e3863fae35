import { z } from "zod";

/** Every setting of the application. `.env.example` lists the same names; a test compares them. */
export const EnvSchema = z.object({
  /** The application's role: owns nothing, cannot bypass row-level security. */
  DATABASE_URL: z.url(),
  AUTH_SECRET: z.string().min(32),
  /** Seals sites' codes: 32 bytes in base64. Lost or changed, they cannot be read any more. */
  SECRETS_KEY: z.base64().length(44, "32 bytes in base64: openssl rand -base64 32"),
  APP_URL: z.url(),
  SMTP_URL: z.url(),
  MAIL_FROM: z.string().min(3).default("Coastdown <no-reply@coastdown.example>"),
  /** `on` shows the demo accounts on the sign-in page. */
  DEMO: z.enum(["on", "off"]).default("off"),
  LOG_LEVEL: z.enum(["silent", "error", "warn", "info", "debug"]).default("info"),
  NODE_ENV: z.enum(["development", "test", "production"]).default("production"),
});

export type Env = z.infer<typeof EnvSchema>;

let read: Env | undefined;

/** Read once, at first use: a build has no settings, a server refuses to run without them. */
export function env(): Env {
  if (!read) {
    const parsed = EnvSchema.safeParse(process.env);
    if (!parsed.success) throw new Error(`Settings are missing or wrong:\n${z.prettifyError(parsed.error)}`);
    read = parsed.data;
  }
  return read;
}

/** For migrations and the tests' own databases alone; the application never holds it. */
export const ownerUrl = (): string =>
  z.url({ error: "DATABASE_OWNER_URL is missing" }).parse(process.env.DATABASE_OWNER_URL);
