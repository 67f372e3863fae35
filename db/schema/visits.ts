import { sql } from "drizzle-orm";
import { boolean, check, foreignKey, index, pgTable, primaryKey, text, uuid } from "drizzle-orm/pg-core";
import { companyId, createdAt, either, gate, id, instant, mayAdd, mayChange, mayRead, OFFICE } from "./columns";
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
    createdAt: createdAt(),
    canceledAt: instant("canceled_at"),
    canceledBy: uuid("canceled_by"),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    foreignKey({ columns: [t.companyId, t.jobId], foreignColumns: [jobs.companyId, jobs.id] }),
    foreignKey({ columns: [t.companyId, t.siteId], foreignColumns: [sites.companyId, sites.id] }),
    check("visits_ends_after_start", sql`${t.endsAt} > ${t.startsAt}`),
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
