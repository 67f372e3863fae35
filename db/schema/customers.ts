import { boolean, foreignKey, pgTable, primaryKey, text, unique, uuid } from "drizzle-orm/pg-core";
import {
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
} from "./columns";
import { companies } from "./company";

export const customers = pgTable(
  "customers",
  {
    companyId: companyId().references(() => companies.companyId),
    id: id(),
    name: text("name").notNull(),
    phone: text("phone"),
    billingStreet: text("billing_street"),
    billingCity: text("billing_city"),
    billingState: text("billing_state"),
    billingPostalCode: text("billing_postal_code"),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    unique("customers_name_unique").on(t.companyId, t.name),
    mayRead(either(OFFICE, "id = (select app.customer_id())", "id in (select app.my_customer_ids())")),
    mayAdd(OFFICE),
    mayChange(OFFICE),
  ],
);

/** Internal: no customer and no technician ever sees it. */
export const customerNotes = pgTable(
  "customer_notes",
  { companyId: companyId(), customerId: uuid("customer_id").notNull(), note: text("note").notNull() },
  (t) => [
    primaryKey({ columns: [t.companyId, t.customerId] }),
    foreignKey({ columns: [t.companyId, t.customerId], foreignColumns: [customers.companyId, customers.id] }),
    mayRead(OFFICE),
    mayAdd(OFFICE),
    mayChange(OFFICE),
    mayRemove(OFFICE),
  ],
);

export const contacts = pgTable(
  "contacts",
  {
    companyId: companyId(),
    id: id(),
    customerId: uuid("customer_id").notNull(),
    name: text("name").notNull(),
    title: text("title"),
    email: text("email"),
    phone: text("phone"),
    /** Sees every site that the customer holds; otherwise only the rows of `contact_sites`. */
    allSites: boolean("all_sites").notNull().default(false),
    createdAt: createdAt(),
    endedAt: instant("ended_at"),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    foreignKey({ columns: [t.companyId, t.customerId], foreignColumns: [customers.companyId, customers.id] }),
    mayRead(either(OFFICE, "id = (select app.contact_id())", "id in (select app.my_site_contact_ids())")),
    mayAdd(OFFICE),
    mayChange(OFFICE),
    gate(),
  ],
);
