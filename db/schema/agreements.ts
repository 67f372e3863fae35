import { sql } from "drizzle-orm";
import {
  boolean,
  check,
  date,
  foreignKey,
  index,
  integer,
  pgTable,
  primaryKey,
  text,
  unique,
  uuid,
} from "drizzle-orm/pg-core";
import { ANCHORS, FREQUENCIES, TEST_KINDS } from "@/lib/domain/agreements/words";
import { FUNCTIONS } from "@/lib/domain/systems/words";
import { companyId, createdAt, gate, id, instant, mayAdd, mayChange, mayRead, OFFICE, WORKER } from "./columns";
import { companies } from "./company";
import { customers } from "./customers";
import { sites } from "./sites";
import { systems } from "./systems";

/** The contract to do kinds of test at sites at frequencies for a price. */
export const agreements = pgTable(
  "agreements",
  {
    companyId: companyId(),
    id: id(),
    number: integer("number").notNull(),
    customerId: uuid("customer_id").notNull(),
    name: text("name").notNull(),
    startsOn: date("starts_on", { mode: "string" }).notNull(),
    endsOn: date("ends_on", { mode: "string" }),
    /** No work without a purchase order; one may stand for the whole agreement. */
    purchaseOrderNeeded: boolean("purchase_order_needed").notNull().default(false),
    purchaseOrder: text("purchase_order"),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    unique("agreements_number_unique").on(t.companyId, t.number),
    foreignKey({ columns: [t.companyId, t.customerId], foreignColumns: [customers.companyId, customers.id] }),
    check("agreements_dates", sql`${t.endsOn} >= ${t.startsOn}`),
    mayRead(OFFICE),
    mayAdd(OFFICE),
    mayChange(OFFICE),
  ],
);

/** One kind of test at one site, how often, and for how much. */
export const agreementItems = pgTable(
  "agreement_items",
  {
    companyId: companyId(),
    id: id(),
    agreementId: uuid("agreement_id").notNull(),
    siteId: uuid("site_id").notNull(),
    systemId: uuid("system_id"),
    testKind: text("test_kind", { enum: TEST_KINDS }).notNull(),
    functions: text("functions", { enum: FUNCTIONS }).array().notNull(),
    frequency: text("frequency", { enum: FREQUENCIES }).notNull(),
    /** Which reading of the frequency: a key of the interval rules. */
    rule: text("rule").notNull(),
    /** Days either way, for the agreement's own rule alone. */
    toleranceDays: integer("tolerance_days"),
    anchor: text("anchor", { enum: ANCHORS }).notNull(),
    /** The first target date, from which a fixed anchor counts. */
    anchorOn: date("anchor_on", { mode: "string" }).notNull(),
    visitMinutes: integer("visit_minutes").notNull(),
    crewSize: integer("crew_size").notNull(),
    priceCents: integer("price_cents").notNull(),
    createdAt: createdAt(),
    endedAt: instant("ended_at"),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    foreignKey({ columns: [t.companyId, t.agreementId], foreignColumns: [agreements.companyId, agreements.id] }),
    foreignKey({ columns: [t.companyId, t.siteId], foreignColumns: [sites.companyId, sites.id] }),
    foreignKey({ columns: [t.companyId, t.systemId], foreignColumns: [systems.companyId, systems.id] }),
    check(
      "agreement_items_figures",
      sql`${t.visitMinutes} > 0 and ${t.crewSize} between 1 and 20 and ${t.priceCents} >= 0`,
    ),
    check("agreement_items_tolerance", sql`(${t.rule} = 'by_agreement') = (${t.toleranceDays} is not null)`),
    check("agreement_items_tolerance_days", sql`${t.toleranceDays} between 0 and 366`),
    index("agreement_items_site").on(t.companyId, t.siteId),
    mayRead(OFFICE),
    mayAdd(OFFICE),
    mayChange(OFFICE),
  ],
);

/** When an occurrence was done: by a job of ours, or before we came. The next window counts from the newest. */
export const completions = pgTable(
  "completions",
  {
    companyId: companyId(),
    id: id(),
    itemId: uuid("item_id").notNull(),
    /** Tells occurrences apart. */
    targetOn: date("target_on", { mode: "string" }).notNull(),
    doneOn: date("done_on", { mode: "string" }).notNull(),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    unique("completions_once").on(t.companyId, t.itemId, t.targetOn),
    foreignKey({ columns: [t.companyId, t.itemId], foreignColumns: [agreementItems.companyId, agreementItems.id] }),
    mayRead(OFFICE),
    mayAdd(OFFICE),
    mayChange(OFFICE),
  ],
);

/** When the worker last looked through a company's agreements for jobs to make, and when it will again. */
export const dueSweeps = pgTable(
  "due_sweeps",
  {
    companyId: uuid("company_id")
      .primaryKey()
      .references(() => companies.companyId),
    lastAt: instant("last_at").notNull(),
    nextAt: instant("next_at").notNull(),
  },
  () => [mayRead(WORKER), mayAdd(WORKER), mayChange(WORKER), gate()],
);
