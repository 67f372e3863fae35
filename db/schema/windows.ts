import { sql } from "drizzle-orm";
import { check, date, foreignKey, index, integer, pgTable, primaryKey, text, uuid } from "drizzle-orm/pg-core";
import { FUNCTIONS } from "@/lib/domain/systems/words";
import { companyId, createdAt, either, id, instant, MY_SITE, mayAdd, mayChange, mayRead, OFFICE } from "./columns";
import { contacts } from "./customers";
import { sites } from "./sites";

const ofSite = () => ({
  companyId: companyId(),
  id: id(),
  siteId: uuid("site_id").notNull(),
  /** Which functions this speaks of. */
  functions: text("functions", { enum: FUNCTIONS }).array().notNull(),
});
const SEEN_BY = either(OFFICE, MY_SITE());

/** When a site lets given functions operate, by the wall clock there. An end at or before the start lies on the next day. */
export const testWindows = pgTable(
  "test_windows",
  {
    ...ofSite(),
    /** ISO 8601 weekdays, 1 Monday to 7 Sunday, on which the window starts; empty for a single date. */
    weekdays: integer("weekdays").array().notNull(),
    onDate: date("on_date", { mode: "string" }),
    startsLocal: text("starts_local").notNull(),
    endsLocal: text("ends_local").notNull(),
    fromDate: date("from_date", { mode: "string" }),
    toDate: date("to_date", { mode: "string" }),
    noticeHours: integer("notice_hours").notNull().default(0),
    note: text("note"),
    createdAt: createdAt(),
    endedAt: instant("ended_at"),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    foreignKey({ columns: [t.companyId, t.siteId], foreignColumns: [sites.companyId, sites.id] }),
    check("test_windows_functions", sql`cardinality(${t.functions}) > 0`),
    check("test_windows_days", sql`(cardinality(${t.weekdays}) > 0) = (${t.onDate} is null)`),
    check("test_windows_weekdays", sql`${t.weekdays} <@ array[1,2,3,4,5,6,7]`),
    check("test_windows_clock", sql`${t.startsLocal} ~ '^\\d\\d:\\d\\d$' and ${t.endsLocal} ~ '^\\d\\d:\\d\\d$'`),
    check("test_windows_notice", sql`${t.noticeHours} >= 0`),
    check("test_windows_dates", sql`${t.toDate} >= ${t.fromDate}`),
    index("test_windows_site").on(t.companyId, t.siteId),
    mayRead(SEEN_BY),
    mayAdd(OFFICE),
    mayChange(OFFICE),
  ],
);

/** Dates, both included, on which given functions never operate. */
export const noTestDates = pgTable(
  "no_test_dates",
  {
    ...ofSite(),
    fromDate: date("from_date", { mode: "string" }).notNull(),
    toDate: date("to_date", { mode: "string" }).notNull(),
    reason: text("reason").notNull(),
    createdAt: createdAt(),
    endedAt: instant("ended_at"),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    foreignKey({ columns: [t.companyId, t.siteId], foreignColumns: [sites.companyId, sites.id] }),
    check("no_test_dates_functions", sql`cardinality(${t.functions}) > 0`),
    check("no_test_dates_order", sql`${t.toDate} >= ${t.fromDate}`),
    index("no_test_dates_site").on(t.companyId, t.siteId),
    mayRead(SEEN_BY),
    mayAdd(OFFICE),
    mayChange(OFFICE),
  ],
);

/** Who must stand by while given functions operate. */
export const attendances = pgTable(
  "attendances",
  {
    ...ofSite(),
    /** In the building's words: building engineer, elevator contractor. */
    party: text("party").notNull(),
    contactId: uuid("contact_id"),
    phone: text("phone"),
    createdAt: createdAt(),
    endedAt: instant("ended_at"),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    foreignKey({ columns: [t.companyId, t.siteId], foreignColumns: [sites.companyId, sites.id] }),
    foreignKey({ columns: [t.companyId, t.contactId], foreignColumns: [contacts.companyId, contacts.id] }),
    check("attendances_functions", sql`cardinality(${t.functions}) > 0`),
    index("attendances_site").on(t.companyId, t.siteId),
    mayRead(SEEN_BY),
    mayAdd(OFFICE),
    mayChange(OFFICE),
  ],
);
