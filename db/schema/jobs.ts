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
  uniqueIndex,
  uuid,
} from "drizzle-orm/pg-core";
import { JOB_KINDS, WAITS_FOR } from "@/lib/domain/jobs/words";
import { FUNCTIONS } from "@/lib/domain/systems/words";
import { agreementItems } from "./agreements";
import { companyId, createdAt, either, id, instant, mayAdd, mayChange, mayRead, OFFICE } from "./columns";
import { members } from "./people";
import { sites } from "./sites";
import { systems } from "./systems";

export const jobs = pgTable(
  "jobs",
  {
    companyId: companyId(),
    id: id(),
    number: integer("number").notNull(),
    siteId: uuid("site_id").notNull(),
    kind: text("kind", { enum: JOB_KINDS }).notNull(),
    title: text("title").notNull(),
    systemId: uuid("system_id"),
    /** What was said or seen, in more words. */
    details: text("details"),
    urgent: boolean("urgent").notNull().default(false),
    /** Who called, and how to call back. */
    callerName: text("caller_name"),
    callerPhone: text("caller_phone"),
    /** The functions that will really operate. */
    functions: text("functions", { enum: FUNCTIONS }).array().notNull().default(sql`'{}'`),
    visitMinutes: integer("visit_minutes").notNull().default(120),
    crewSize: integer("crew_size").notNull().default(1),
    /** The occurrence of an agreement that this job does; the target tells occurrences apart. */
    agreementItemId: uuid("agreement_item_id"),
    earliestOn: date("earliest_on", { mode: "string" }),
    targetOn: date("target_on", { mode: "string" }),
    latestOn: date("latest_on", { mode: "string" }),
    /** Said to be done by somebody in the office; what visits prove is kept with them. */
    doneOn: date("done_on", { mode: "string" }),
    createdAt: createdAt(),
    /** Nobody where the worker made it ahead of its time. */
    createdBy: uuid("created_by"),
    canceledAt: instant("canceled_at"),
    canceledBy: uuid("canceled_by"),
    cancelReason: text("cancel_reason"),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    unique("jobs_number_unique").on(t.companyId, t.number),
    foreignKey({ columns: [t.companyId, t.siteId], foreignColumns: [sites.companyId, sites.id] }),
    foreignKey({ columns: [t.companyId, t.systemId], foreignColumns: [systems.companyId, systems.id] }),
    foreignKey({
      columns: [t.companyId, t.agreementItemId],
      foreignColumns: [agreementItems.companyId, agreementItems.id],
    }),
    check("jobs_occurrence", sql`(${t.agreementItemId} is null) = (${t.targetOn} is null)`),
    check("jobs_due_order", sql`${t.earliestOn} <= ${t.targetOn} and ${t.targetOn} <= ${t.latestOn}`),
    check("jobs_figures", sql`${t.visitMinutes} > 0 and ${t.crewSize} between 1 and 20`),
    uniqueIndex("jobs_occurrence_once")
      .on(t.companyId, t.agreementItemId, t.targetOn)
      .where(sql`agreement_item_id is not null and canceled_at is null`),
    index("jobs_site").on(t.companyId, t.siteId),
    index("jobs_open").on(t.companyId, t.number).where(sql`canceled_at is null and done_on is null`),
    foreignKey({ columns: [t.companyId, t.createdBy], foreignColumns: [members.companyId, members.id] }),
    mayRead(either(OFFICE, "id in (select app.my_job_ids())")),
    mayAdd(OFFICE),
    mayChange(OFFICE),
  ],
);

/** What the customer said about paying: the office's business alone. */
export const jobTerms = pgTable(
  "job_terms",
  {
    companyId: companyId(),
    jobId: uuid("job_id").notNull(),
    purchaseOrder: text("purchase_order"),
    /** Not to exceed, without asking again. */
    limitCents: integer("limit_cents"),
    /** The customer wants neither: asked, and answered. */
    noneNeeded: boolean("none_needed").notNull().default(false),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.jobId] }),
    foreignKey({ columns: [t.companyId, t.jobId], foreignColumns: [jobs.companyId, jobs.id] }),
    check("job_terms_limit", sql`${t.limitCents} > 0`),
    mayRead(OFFICE),
    mayAdd(OFFICE),
    mayChange(OFFICE),
  ],
);

/** A job waits for parts, access or approval: since when, from whom, until when. */
export const jobWaits = pgTable(
  "job_waits",
  {
    companyId: companyId(),
    id: id(),
    jobId: uuid("job_id").notNull(),
    waitsFor: text("waits_for", { enum: WAITS_FOR }).notNull(),
    /** Who is to deliver, open or approve. */
    person: text("person").notNull(),
    untilDate: date("until_date", { mode: "string" }),
    note: text("note"),
    since: createdAt(),
    endedAt: instant("ended_at"),
    endedBy: uuid("ended_by"),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    foreignKey({ columns: [t.companyId, t.jobId], foreignColumns: [jobs.companyId, jobs.id] }),
    foreignKey({ columns: [t.companyId, t.endedBy], foreignColumns: [members.companyId, members.id] }),
    uniqueIndex("job_waits_once").on(t.companyId, t.jobId, t.waitsFor).where(sql`ended_at is null`),
    mayRead(either(OFFICE, "job_id in (select app.my_job_ids())")),
    mayAdd(OFFICE),
    mayChange(OFFICE),
  ],
);
