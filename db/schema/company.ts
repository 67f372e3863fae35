import { integer, pgTable, primaryKey, text, uuid } from "drizzle-orm/pg-core";
import { ANYONE, companyId, createdAt, gate, mayAdd, mayChange, mayRead, OFFICE, OWNER } from "./columns";

export const companies = pgTable(
  "companies",
  {
    companyId: uuid("company_id").primaryKey(),
    name: text("name").notNull(),
    phone: text("phone").notNull(),
    street: text("street").notNull(),
    city: text("city").notNull(),
    state: text("state").notNull(),
    postalCode: text("postal_code").notNull(),
    zone: text("zone").notNull(),
    createdAt: createdAt(),
  },
  () => [mayRead(ANYONE), mayAdd("(select app.is_operator())"), mayChange(OWNER), gate()],
);

/** Gapless numbers: the row is locked by whoever takes the next one. */
export const series = pgTable(
  "series",
  { companyId: companyId(), name: text("name").notNull(), last: integer("last").notNull().default(0) },
  (t) => [primaryKey({ columns: [t.companyId, t.name] }), mayRead(OFFICE), mayAdd(OFFICE), mayChange(OFFICE)],
);
