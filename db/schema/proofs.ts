import { sql } from "drizzle-orm";
import { check, date, foreignKey, pgTable, primaryKey, text, unique, uuid } from "drizzle-orm/pg-core";
import { PROOF_OUTCOMES } from "@/lib/domain/systems/words";
import { instant, mayAdd, mayRead, OFFICE } from "./columns";
import { equipment, OF_MY_SITES, ofSystem, outputGroups, points } from "./systems";
import { visits } from "./visits";

/** When a device, an output group, a piece of equipment, or a pair of input and group was last seen to work, or to fail. */
export const proofs = pgTable(
  "proofs",
  {
    ...ofSystem(),
    pointId: uuid("point_id"),
    groupId: uuid("group_id"),
    equipmentId: uuid("equipment_id"),
    provenOn: date("proven_on", { mode: "string" }).notNull(),
    outcome: text("outcome", { enum: PROOF_OUTCOMES }).notNull(),
    method: text("method"),
    /** None where the list that was imported says so. */
    visitId: uuid("visit_id"),
    recordedAt: instant("recorded_at").notNull().defaultNow(),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    check("proofs_of_something", sql`num_nonnulls(${t.pointId}, ${t.groupId}, ${t.equipmentId}) > 0`),
    unique("proofs_once")
      .on(t.companyId, t.systemId, t.pointId, t.groupId, t.equipmentId, t.provenOn, t.visitId)
      .nullsNotDistinct(),
    foreignKey({
      columns: [t.companyId, t.systemId, t.pointId],
      foreignColumns: [points.companyId, points.systemId, points.id],
    }),
    foreignKey({
      columns: [t.companyId, t.systemId, t.groupId],
      foreignColumns: [outputGroups.companyId, outputGroups.systemId, outputGroups.id],
    }),
    foreignKey({
      columns: [t.companyId, t.systemId, t.equipmentId],
      foreignColumns: [equipment.companyId, equipment.systemId, equipment.id],
    }),
    foreignKey({ columns: [t.companyId, t.visitId], foreignColumns: [visits.companyId, visits.id] }),
    mayRead(OF_MY_SITES),
    mayAdd(OFFICE),
  ],
);
