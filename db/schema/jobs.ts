import { foreignKey, integer, pgTable, primaryKey, text, unique, uuid } from "drizzle-orm/pg-core";
import { JOB_KINDS } from "@/lib/domain/jobs/words";
import { companyId, createdAt, either, id, instant, mayAdd, mayChange, mayRead, OFFICE } from "./columns";
import { members } from "./people";
import { sites } from "./sites";

export const jobs = pgTable(
  "jobs",
  {
    companyId: companyId(),
    id: id(),
    number: integer("number").notNull(),
    siteId: uuid("site_id").notNull(),
    kind: text("kind", { enum: JOB_KINDS }).notNull(),
    title: text("title").notNull(),
    createdAt: createdAt(),
    createdBy: uuid("created_by").notNull(),
    canceledAt: instant("canceled_at"),
    canceledBy: uuid("canceled_by"),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    unique("jobs_number_unique").on(t.companyId, t.number),
    foreignKey({ columns: [t.companyId, t.siteId], foreignColumns: [sites.companyId, sites.id] }),
    foreignKey({ columns: [t.companyId, t.createdBy], foreignColumns: [members.companyId, members.id] }),
    mayRead(either(OFFICE, "id in (select app.my_job_ids())")),
    mayAdd(OFFICE),
    mayChange(OFFICE),
  ],
);
