import { sql } from "drizzle-orm";
import { check, date, doublePrecision, foreignKey, pgTable, primaryKey, text, unique, uuid } from "drizzle-orm/pg-core";
import { HOLDER_CAPACITIES, SITE_KINDS } from "@/lib/domain/sites/words";
import {
  companyId,
  createdAt,
  either,
  gate,
  id,
  instant,
  MY_SITE,
  mayAdd,
  mayChange,
  mayRead,
  mayRemove,
  OFFICE,
} from "./columns";
import { companies } from "./company";
import { contacts, customers } from "./customers";

const TECHNICIAN_OF_SITE = `(select app.is_technician()) and ${MY_SITE()}`;

export const sites = pgTable(
  "sites",
  {
    companyId: companyId().references(() => companies.companyId),
    id: id(),
    name: text("name").notNull(),
    kind: text("kind", { enum: SITE_KINDS }).notNull(),
    street: text("street").notNull(),
    city: text("city").notNull(),
    state: text("state").notNull(),
    postalCode: text("postal_code").notNull(),
    latitude: doublePrecision("latitude"),
    longitude: doublePrecision("longitude"),
    zone: text("zone").notNull(),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    unique("sites_address_unique").on(t.companyId, t.street, t.city, t.state, t.name),
    mayRead(either(OFFICE, MY_SITE("id"))),
    mayAdd(OFFICE),
    mayChange(OFFICE),
  ],
);

/** How to get in, for those who go there; customers see their own building without it. */
export const siteAccess = pgTable(
  "site_access",
  { companyId: companyId(), siteId: uuid("site_id").notNull(), note: text("note").notNull() },
  (t) => [
    primaryKey({ columns: [t.companyId, t.siteId] }),
    foreignKey({ columns: [t.companyId, t.siteId], foreignColumns: [sites.companyId, sites.id] }),
    mayRead(either(OFFICE, TECHNICIAN_OF_SITE)),
    mayAdd(OFFICE),
    mayChange(OFFICE),
    mayRemove(OFFICE),
  ],
);

/** Who owns, manages, pays for or occupies a site, and from when to when (both dates included, in the site's zone). */
export const siteHolders = pgTable(
  "site_holders",
  {
    companyId: companyId(),
    id: id(),
    siteId: uuid("site_id").notNull(),
    customerId: uuid("customer_id").notNull(),
    capacity: text("capacity", { enum: HOLDER_CAPACITIES }).notNull(),
    fromDate: date("from_date", { mode: "string" }).notNull(),
    toDate: date("to_date", { mode: "string" }),
    /** The same span as instants in the site's zone, end excluded: what the policies compare. */
    startsAt: instant("starts_at").notNull(),
    endsAt: instant("ends_at"),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    foreignKey({ columns: [t.companyId, t.siteId], foreignColumns: [sites.companyId, sites.id] }),
    foreignKey({ columns: [t.companyId, t.customerId], foreignColumns: [customers.companyId, customers.id] }),
    check("site_holders_dates", sql`${t.toDate} is null or ${t.toDate} >= ${t.fromDate}`),
    mayRead(either(OFFICE, `customer_id = (select app.customer_id()) and ${MY_SITE()}`, TECHNICIAN_OF_SITE)),
    mayAdd(OFFICE),
    mayChange(OFFICE),
    gate(),
  ],
);

/** The site set of a contact who does not see all of the customer's sites. */
export const contactSites = pgTable(
  "contact_sites",
  { companyId: companyId(), contactId: uuid("contact_id").notNull(), siteId: uuid("site_id").notNull() },
  (t) => [
    primaryKey({ columns: [t.companyId, t.contactId, t.siteId] }),
    foreignKey({ columns: [t.companyId, t.contactId], foreignColumns: [contacts.companyId, contacts.id] }),
    foreignKey({ columns: [t.companyId, t.siteId], foreignColumns: [sites.companyId, sites.id] }),
    mayRead(either(OFFICE, "contact_id = (select app.contact_id())", TECHNICIAN_OF_SITE)),
    mayAdd(OFFICE),
    mayRemove(OFFICE),
    gate(),
  ],
);
