import { index, jsonb, pgTable, primaryKey, text, uuid } from "drizzle-orm/pg-core";
import { ANYONE, companyId, either, id, instant, mayAdd, mayRead, OFFICE, OWNER } from "./columns";
import { companies } from "./company";

/**
 * Who did what, when: written by `command` in the same transaction, never changed (there is no such policy). The owner
 * reads all of it, the office the history of its work.
 */
export const auditEntries = pgTable(
  "audit_entries",
  {
    companyId: companyId().references(() => companies.companyId),
    id: id(),
    at: instant("at").notNull(),
    actorKind: text("actor_kind").notNull(),
    memberId: uuid("member_id"),
    linkId: uuid("link_id"),
    command: text("command").notNull(),
    entity: text("entity").notNull(),
    entityId: uuid("entity_id").notNull(),
    before: jsonb("before"),
    after: jsonb("after"),
    requestId: text("request_id"),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    index("audit_entries_entity").on(t.companyId, t.entityId),
    index("audit_entries_at").on(t.companyId, t.at),
    mayRead(either(OWNER, `${OFFICE} and entity in ('agreement', 'job', 'visit')`)),
    mayAdd(ANYONE),
  ],
);
