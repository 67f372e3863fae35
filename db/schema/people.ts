import { sql } from "drizzle-orm";
import { check, date, doublePrecision, foreignKey, pgTable, primaryKey, text, unique, uuid } from "drizzle-orm/pg-core";
import { ROLES } from "@/lib/domain/shared/roles";
import { companyId, createdAt, either, gate, id, instant, mayAdd, mayChange, mayRead, OFFICE, OWNER } from "./columns";
import { companies } from "./company";
import { contacts } from "./customers";
import { users } from "./identity";

/** Technicians know who works here; a customer's people they know as contacts of their sites. */
const COLLEAGUE = "(select app.is_technician()) and contact_id is null";
const SELF = "member_id = (select app.member_id())";

/** A person's place in one company. Ended, never deleted: history names people. */
export const members = pgTable(
  "members",
  {
    companyId: companyId().references(() => companies.companyId),
    id: id(),
    userId: uuid("user_id").references(() => users.id),
    role: text("role", { enum: ROLES }).notNull(),
    name: text("name").notNull(),
    /** Whom a member of role `customer` speaks for. */
    contactId: uuid("contact_id"),
    createdAt: createdAt(),
    endedAt: instant("ended_at"),
    endedBy: uuid("ended_by"),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    unique("members_user_unique").on(t.companyId, t.userId),
    foreignKey({ columns: [t.companyId, t.contactId], foreignColumns: [contacts.companyId, contacts.id] }),
    check("members_contact_of_customer", sql`(${t.role} = 'customer') = (${t.contactId} is not null)`),
    mayRead(either(OFFICE, COLLEAGUE, "id = (select app.member_id())", "id in (select app.my_crew_ids())")),
    mayAdd(either(OWNER, "(select app.is_operator())")),
    mayChange(either(OWNER, "(select app.is_link()) and id = (select app.member_id())")),
    gate(),
  ],
);

/** What only the office and the person may see. */
export const memberDetails = pgTable(
  "member_details",
  {
    companyId: companyId(),
    memberId: uuid("member_id").notNull(),
    email: text("email").notNull(),
    phone: text("phone"),
    homeStreet: text("home_street"),
    homeCity: text("home_city"),
    homeState: text("home_state"),
    homePostalCode: text("home_postal_code"),
    homeLatitude: doublePrecision("home_latitude"),
    homeLongitude: doublePrecision("home_longitude"),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.memberId] }),
    foreignKey({ columns: [t.companyId, t.memberId], foreignColumns: [members.companyId, members.id] }),
    unique("member_details_email_unique").on(t.companyId, t.email),
    mayRead(either(OFFICE, SELF)),
    mayAdd(either(OWNER, "(select app.is_operator())")),
    mayChange(either(OWNER, SELF)),
    gate(),
  ],
);

export const licenses = pgTable(
  "licenses",
  {
    companyId: companyId(),
    id: id(),
    memberId: uuid("member_id").notNull(),
    kind: text("kind").notNull(),
    number: text("number").notNull(),
    /** US state (ISO 3166-2 subdivision without the country), or a city's name. */
    jurisdiction: text("jurisdiction").notNull(),
    expiresOn: date("expires_on", { mode: "string" }).notNull(),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    foreignKey({ columns: [t.companyId, t.memberId], foreignColumns: [members.companyId, members.id] }),
    unique("licenses_number_unique").on(t.companyId, t.jurisdiction, t.number),
    mayRead(either(OFFICE, SELF)),
    mayAdd(OWNER),
    mayChange(OWNER),
  ],
);
