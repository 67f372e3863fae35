import { sql } from "drizzle-orm";
import {
  boolean,
  check,
  foreignKey,
  index,
  integer,
  pgTable,
  primaryKey,
  text,
  unique,
  uuid,
} from "drizzle-orm/pg-core";
import { FUNCTIONS } from "@/lib/domain/systems/words";
import { ANSWERS, CHANNELS, SLOT_REASONS } from "@/lib/domain/visits/words";
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
import { contacts } from "./customers";
import { jobs } from "./jobs";
import { members } from "./people";
import { sites } from "./sites";

export const visits = pgTable(
  "visits",
  {
    companyId: companyId(),
    id: id(),
    jobId: uuid("job_id").notNull(),
    siteId: uuid("site_id").notNull(),
    /** A promise is kept as the wall clock that was agreed, its zone, and the instant that follows from them. */
    startsLocal: text("starts_local").notNull(),
    endsLocal: text("ends_local").notNull(),
    zone: text("zone").notNull(),
    startsAt: instant("starts_at").notNull(),
    endsAt: instant("ends_at").notNull(),
    /** Counts every change that others must hear of: RFC 5545 SEQUENCE. */
    sequence: integer("sequence").notNull().default(0),
    createdAt: createdAt(),
    canceledAt: instant("canceled_at"),
    canceledBy: uuid("canceled_by"),
    cancelReason: text("cancel_reason"),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    foreignKey({ columns: [t.companyId, t.jobId], foreignColumns: [jobs.companyId, jobs.id] }),
    foreignKey({ columns: [t.companyId, t.siteId], foreignColumns: [sites.companyId, sites.id] }),
    check("visits_ends_after_start", sql`${t.endsAt} > ${t.startsAt}`),
    index("visits_job").on(t.companyId, t.jobId),
    index("visits_starts_at").on(t.companyId, t.startsAt),
    index("visits_site").on(t.companyId, t.siteId, t.startsAt),
    mayRead(either(OFFICE, "id in (select app.my_visit_ids())")),
    mayAdd(OFFICE),
    mayChange(OFFICE),
    gate(),
  ],
);

/** Who goes. A row is released, never deleted: whoever was ever sent keeps sight of the visit. */
export const visitCrew = pgTable(
  "visit_crew",
  {
    companyId: companyId(),
    id: id(),
    visitId: uuid("visit_id").notNull(),
    memberId: uuid("member_id").notNull(),
    lead: boolean("lead").notNull().default(false),
    /** The visit's own span, repeated here so that the database can forbid two places at once. */
    startsAt: instant("starts_at").notNull(),
    endsAt: instant("ends_at").notNull(),
    createdAt: createdAt(),
    releasedAt: instant("released_at"),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    foreignKey({ columns: [t.companyId, t.visitId], foreignColumns: [visits.companyId, visits.id] }),
    foreignKey({ columns: [t.companyId, t.memberId], foreignColumns: [members.companyId, members.id] }),
    check("visit_crew_ends_after_start", sql`${t.endsAt} > ${t.startsAt}`),
    index("visit_crew_visit").on(t.companyId, t.visitId),
    mayRead(either(OFFICE, "visit_id in (select app.my_visit_ids())")),
    mayAdd(OFFICE),
    mayChange(OFFICE),
    gate(),
  ],
);

const OF_MY_VISITS = either(OFFICE, "visit_id in (select app.my_visit_ids())");
const CREW_AND_OFFICE = either(OFFICE, "(select app.is_technician()) and visit_id in (select app.my_visit_ids())");

/** The part of a visit in which functions really operate. */
export const liveBlocks = pgTable(
  "live_blocks",
  {
    companyId: companyId(),
    id: id(),
    visitId: uuid("visit_id").notNull(),
    functions: text("functions", { enum: FUNCTIONS }).array().notNull(),
    startsLocal: text("starts_local").notNull(),
    endsLocal: text("ends_local").notNull(),
    startsAt: instant("starts_at").notNull(),
    endsAt: instant("ends_at").notNull(),
    /** Who stands by, in the building's words. */
    attendees: text("attendees").array().notNull().default(sql`'{}'`),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    foreignKey({ columns: [t.companyId, t.visitId], foreignColumns: [visits.companyId, visits.id] }),
    check("live_blocks_ends_after_start", sql`${t.endsAt} > ${t.startsAt}`),
    check("live_blocks_functions", sql`cardinality(${t.functions}) > 0`),
    index("live_blocks_visit").on(t.companyId, t.visitId),
    mayRead(OF_MY_VISITS),
    mayAdd(OFFICE),
    mayChange(OFFICE),
    mayRemove(OFFICE),
  ],
);

/** A reason that stood against a booking, and who went past it in writing. */
export const visitOverrides = pgTable(
  "visit_overrides",
  {
    companyId: companyId(),
    id: id(),
    visitId: uuid("visit_id").notNull(),
    reason: text("reason", { enum: SLOT_REASONS }).notNull(),
    /** What stood against it, as it was shown. */
    words: text("words").notNull(),
    note: text("note").notNull(),
    createdAt: createdAt(),
    createdBy: uuid("created_by").notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    foreignKey({ columns: [t.companyId, t.visitId], foreignColumns: [visits.companyId, visits.id] }),
    foreignKey({ columns: [t.companyId, t.createdBy], foreignColumns: [members.companyId, members.id] }),
    mayRead(CREW_AND_OFFICE),
    mayAdd(OFFICE),
  ],
);

/** Whoever was asked sees and answers that one ask, by the link or signed in; not what others were asked. */
const ASKED = either(
  "id = (select app.link_subject()) and (select app.is_link())",
  "contact_id = (select app.contact_id())",
);

/** Whom the company asked to agree to a visit as it stood at a sequence, and what was answered, when and how. */
export const visitAsks = pgTable(
  "visit_asks",
  {
    companyId: companyId(),
    id: id(),
    visitId: uuid("visit_id").notNull(),
    sequence: integer("sequence").notNull(),
    contactId: uuid("contact_id"),
    /** The person's name, also where no contact is on file. */
    name: text("name").notNull(),
    email: text("email"),
    askedAt: createdAt(),
    answer: text("answer", { enum: ANSWERS }),
    answeredAt: instant("answered_at"),
    channel: text("channel", { enum: CHANNELS }),
    permitNumber: text("permit_number"),
    note: text("note"),
    /** Who wrote the answer down; nobody where the person answered by the link. */
    recordedBy: uuid("recorded_by"),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    unique("visit_asks_once").on(t.companyId, t.visitId, t.sequence, t.contactId),
    foreignKey({ columns: [t.companyId, t.visitId], foreignColumns: [visits.companyId, visits.id] }),
    foreignKey({ columns: [t.companyId, t.contactId], foreignColumns: [contacts.companyId, contacts.id] }),
    foreignKey({ columns: [t.companyId, t.recordedBy], foreignColumns: [members.companyId, members.id] }),
    check("visit_asks_answer", sql`num_nonnulls(${t.answer}, ${t.answeredAt}, ${t.channel}) in (0, 3)`),
    index("visit_asks_visit").on(t.companyId, t.visitId),
    mayRead(either(CREW_AND_OFFICE, ASKED)),
    mayAdd(OFFICE),
    mayChange(either(OFFICE, ASKED)),
    gate(),
  ],
);
