import { sql } from "drizzle-orm";
import { integer, pgSchema, primaryKey, text, uniqueIndex, uuid } from "drizzle-orm/pg-core";
import { createdAt, id, instant } from "./columns";

/** Who somebody is, across companies. Nothing here belongs to a tenant; only `lib/auth` and the gate read it. */
export const identity = pgSchema("identity");

export const users = identity.table(
  "users",
  {
    id: id().primaryKey(),
    name: text("name"),
    email: text("email").notNull(),
    emailVerified: instant("email_verified"),
    image: text("image"),
    /** Raised to sign a person out everywhere. */
    sessionVersion: integer("session_version").notNull().default(1),
    createdAt: createdAt(),
  },
  (t) => [uniqueIndex("users_email_unique").on(sql`lower(${t.email})`)],
);

export const passwords = identity.table("passwords", {
  userId: uuid("user_id")
    .primaryKey()
    .references(() => users.id, { onDelete: "cascade" }),
  /** argon2id, PHC string. */
  hash: text("hash").notNull(),
  changedAt: instant("changed_at").notNull().defaultNow(),
});

export const accounts = identity.table(
  "accounts",
  {
    userId: uuid("user_id")
      .notNull()
      .references(() => users.id, { onDelete: "cascade" }),
    type: text("type").notNull(),
    provider: text("provider").notNull(),
    providerAccountId: text("provider_account_id").notNull(),
    refresh_token: text("refresh_token"),
    access_token: text("access_token"),
    expires_at: integer("expires_at"),
    token_type: text("token_type"),
    scope: text("scope"),
    id_token: text("id_token"),
    session_state: text("session_state"),
  },
  (t) => [primaryKey({ columns: [t.provider, t.providerAccountId] })],
);

export const verificationTokens = identity.table(
  "verification_tokens",
  {
    identifier: text("identifier").notNull(),
    token: text("token").notNull(),
    expires: instant("expires").notNull(),
  },
  (t) => [primaryKey({ columns: [t.identifier, t.token] })],
);

/** The cookie carries only `id`; everything else about a session is looked up here at each entry. */
export const sessions = identity.table("sessions", {
  id: id().primaryKey(),
  userId: uuid("user_id")
    .notNull()
    .references(() => users.id, { onDelete: "cascade" }),
  companyId: uuid("company_id").notNull(),
  sessionVersion: integer("session_version").notNull(),
  userAgent: text("user_agent"),
  createdAt: createdAt(),
  expiresAt: instant("expires_at").notNull(),
  endedAt: instant("ended_at"),
});

/**
 * Asked for on the sign-in page by anybody, for any address: written the same way whether the address is known or
 * not, so that neither the answer nor its time tells. The worker finds out and mails.
 */
export const accessRequests = identity.table("access_requests", {
  id: id().primaryKey(),
  kind: text("kind", { enum: ["sign_in_link", "password_reset"] }).notNull(),
  email: text("email").notNull(),
  /** The one-time address of a sign-in link; gone with the row once mailed. */
  url: text("url"),
  createdAt: createdAt(),
});
