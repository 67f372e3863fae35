import { sql } from "drizzle-orm";
import { check, date, doublePrecision, foreignKey, pgTable, primaryKey, text, unique, uuid } from "drizzle-orm/pg-core";
import { DOCUMENT_KINDS, HOLDER_CAPACITIES, KEY_KINDS, SECRET_KINDS, SITE_KINDS } from "@/lib/domain/sites/words";
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
    /** The company's own list calls the site by this, the same at every import. */
    key: text("key"),
    /** Who approves and inspects there. */
    authorityName: text("authority_name"),
    authorityPhone: text("authority_phone"),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    unique("sites_key_unique").on(t.companyId, t.key),
    unique("sites_address_unique").on(t.companyId, t.street, t.city, t.state, t.name),
    mayRead(either(OFFICE, MY_SITE("id"), "id = (select app.link_site_id())")),
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

const ofSite = () => ({ companyId: companyId(), id: id(), siteId: uuid("site_id").notNull() });
const CREW_AND_OFFICE = either(OFFICE, TECHNICIAN_OF_SITE);

/** The account at the supervising station. */
export const stationAccounts = pgTable(
  "station_accounts",
  {
    ...ofSite(),
    station: text("station").notNull(),
    phone: text("phone").notNull(),
    accountNumber: text("account_number").notNull(),
    note: text("note"),
    createdAt: createdAt(),
    endedAt: instant("ended_at"),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    foreignKey({ columns: [t.companyId, t.siteId], foreignColumns: [sites.companyId, sites.id] }),
    mayRead(CREW_AND_OFFICE),
    mayAdd(OFFICE),
    mayChange(OFFICE),
  ],
);

/** Keys, badges and fobs, and where they are. */
export const siteKeys = pgTable(
  "site_keys",
  {
    ...ofSite(),
    kind: text("kind", { enum: KEY_KINDS }).notNull(),
    label: text("label").notNull(),
    /** Who has it now, or where it hangs. */
    keptBy: text("kept_by").notNull(),
    createdAt: createdAt(),
    endedAt: instant("ended_at"),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    foreignKey({ columns: [t.companyId, t.siteId], foreignColumns: [sites.companyId, sites.id] }),
    mayRead(CREW_AND_OFFICE),
    mayAdd(OFFICE),
    mayChange(OFFICE),
  ],
);

/** Papers of the site and where they are kept. */
export const siteDocuments = pgTable(
  "site_documents",
  {
    ...ofSite(),
    kind: text("kind", { enum: DOCUMENT_KINDS }).notNull(),
    title: text("title").notNull(),
    dated: date("dated", { mode: "string" }),
    keptWhere: text("kept_where").notNull(),
    createdAt: createdAt(),
    endedAt: instant("ended_at"),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    foreignKey({ columns: [t.companyId, t.siteId], foreignColumns: [sites.companyId, sites.id] }),
    mayRead(either(OFFICE, MY_SITE())),
    mayAdd(OFFICE),
    mayChange(OFFICE),
  ],
);

/** Codes, encrypted by the application: the office and that day's crew may look, and each look is in the audit trail. */
export const siteSecrets = pgTable(
  "site_secrets",
  {
    ...ofSite(),
    kind: text("kind", { enum: SECRET_KINDS }).notNull(),
    label: text("label").notNull(),
    sealed: text("sealed").notNull(),
    createdAt: createdAt(),
    endedAt: instant("ended_at"),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    foreignKey({ columns: [t.companyId, t.siteId], foreignColumns: [sites.companyId, sites.id] }),
    mayRead(either("(select app.role()) in ('owner', 'dispatcher')", "site_id in (select app.my_site_ids_today())")),
    mayAdd("(select app.role()) in ('owner', 'dispatcher')"),
    mayChange("(select app.role()) in ('owner', 'dispatcher')"),
  ],
);
