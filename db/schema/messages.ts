import { sql } from "drizzle-orm";
import { foreignKey, index, integer, jsonb, pgTable, primaryKey, text, unique, uuid } from "drizzle-orm/pg-core";
import {
  ANYONE,
  companyId,
  createdAt,
  either,
  gate,
  id,
  instant,
  mayAdd,
  mayChange,
  mayRead,
  mayRemove,
  OFFICE,
  OWNER,
  WORKER,
} from "./columns";
import { companies } from "./company";

/** What must happen after a verb, written in the verb's own transaction. The worker empties it. */
export const outbox = pgTable(
  "outbox",
  {
    companyId: companyId().references(() => companies.companyId),
    id: id(),
    event: text("event").notNull(),
    payload: jsonb("payload").notNull(),
    createdAt: createdAt(),
    runAfter: instant("run_after").notNull().defaultNow(),
    attempts: integer("attempts").notNull().default(0),
    /** Claimed until then; a worker that died lets go by itself. */
    leasedUntil: instant("leased_until"),
    doneAt: instant("done_at"),
    /** Given up after the last attempt: waits for the owner. */
    deadAt: instant("dead_at"),
    lastError: text("last_error"),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    index("outbox_due").on(t.runAfter).where(sql`done_at is null and dead_at is null`),
    mayRead(either(OWNER, WORKER)),
    mayAdd(ANYONE),
    mayChange(either(OWNER, WORKER)),
    gate(),
  ],
);

/** Every e-mail that the company sent or will send. */
export const messages = pgTable(
  "messages",
  {
    companyId: companyId().references(() => companies.companyId),
    id: id(),
    template: text("template").notNull(),
    toAddress: text("to_address").notNull(),
    props: jsonb("props").notNull(),
    /** RFC 5322 Message-ID, fixed before the first attempt so that a repeat is recognizable. */
    messageId: text("message_id").notNull(),
    createdAt: createdAt(),
    sentAt: instant("sent_at"),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    unique("messages_message_id_unique").on(t.messageId),
    mayRead(either(OFFICE, WORKER)),
    mayAdd(ANYONE),
    mayChange(WORKER),
  ],
);

/** One-time addresses inside a message: only the worker reads them, and they go once it is sent. */
export const messageSecrets = pgTable(
  "message_secrets",
  { companyId: companyId(), messageId: uuid("message_id").notNull(), url: text("url").notNull() },
  (t) => [
    primaryKey({ columns: [t.companyId, t.messageId] }),
    foreignKey({ columns: [t.companyId, t.messageId], foreignColumns: [messages.companyId, messages.id] }),
    mayRead(WORKER),
    mayAdd(ANYONE),
    mayRemove(WORKER),
  ],
);

/** An address with a token that lets its holder do one named thing. */
export const links = pgTable(
  "links",
  {
    companyId: companyId().references(() => companies.companyId),
    id: id(),
    /** SHA-256 of the token; the token itself is nowhere. */
    tokenHash: text("token_hash").notNull(),
    grant: text("grant").notNull(),
    /** The row that the link speaks of: a member, a visit, … */
    subjectId: uuid("subject_id").notNull(),
    createdAt: createdAt(),
    expiresAt: instant("expires_at").notNull(),
    usedAt: instant("used_at"),
    withdrawnAt: instant("withdrawn_at"),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    unique("links_token_unique").on(t.tokenHash),
    mayRead(either(OFFICE, WORKER, "id = (select app.link_id())")),
    mayAdd(either(OFFICE, WORKER)),
    mayChange(either(OFFICE, WORKER, "id = (select app.link_id())")),
    gate(),
  ],
);
