import { sql } from "drizzle-orm";
import { check, date, foreignKey, index, integer, pgTable, primaryKey, text, unique, uuid } from "drizzle-orm/pg-core";
import {
  ACTIONS,
  EQUIPMENT_KINDS,
  EXPECTATION_SOURCES,
  FUNCTIONS,
  OUTPUT_KINDS,
  POINT_KINDS,
  RESTART_MODES,
  SIGNALS,
} from "@/lib/domain/systems/words";
import { companyId, createdAt, either, gate, id, MY_SITE, mayAdd, mayChange, mayRead, OFFICE } from "./columns";
import { members } from "./people";
import { sites } from "./sites";

/** Whoever sees a site sees the systems there. */
export const OF_MY_SITES = either(OFFICE, "system_id in (select app.my_system_ids())");

/** A fire alarm control unit and what hangs on it. `key` is the list's own name for it, the same at every import. */
export const systems = pgTable(
  "systems",
  {
    companyId: companyId(),
    id: id(),
    siteId: uuid("site_id").notNull(),
    key: text("key").notNull(),
    name: text("name").notNull(),
    maker: text("maker"),
    model: text("model"),
    /** Where the panel hangs. */
    location: text("location"),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    unique("systems_key_unique").on(t.companyId, t.siteId, t.key),
    foreignKey({ columns: [t.companyId, t.siteId], foreignColumns: [sites.companyId, sites.id] }),
    mayRead(either(OFFICE, MY_SITE())),
    mayAdd(OFFICE),
    mayChange(OFFICE),
    gate(),
  ],
);

export const ofSystem = () => ({ companyId: companyId(), id: id(), systemId: uuid("system_id").notNull() });

/** A group of initiating devices. */
export const zones = pgTable(
  "zones",
  { ...ofSystem(), key: text("key").notNull(), name: text("name").notNull() },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    unique("zones_key_unique").on(t.companyId, t.systemId, t.key),
    unique("zones_of_system").on(t.companyId, t.systemId, t.id),
    foreignKey({ columns: [t.companyId, t.systemId], foreignColumns: [systems.companyId, systems.id] }),
    mayRead(OF_MY_SITES),
    mayAdd(OFFICE),
    mayChange(OFFICE),
  ],
);

/** One initiating device. Never deleted: `removedOn` ends it, what was proven of it stays. */
export const points = pgTable(
  "points",
  {
    ...ofSystem(),
    zoneId: uuid("zone_id"),
    address: text("address").notNull(),
    kind: text("kind", { enum: POINT_KINDS }).notNull(),
    /** The text at the panel. */
    label: text("label").notNull(),
    location: text("location"),
    signal: text("signal", { enum: SIGNALS }).notNull().default("alarm"),
    /** The place of the device on the walk through the building. */
    walkOrder: integer("walk_order"),
    removedOn: date("removed_on", { mode: "string" }),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    unique("points_address_unique").on(t.companyId, t.systemId, t.address),
    unique("points_of_system").on(t.companyId, t.systemId, t.id),
    foreignKey({ columns: [t.companyId, t.systemId], foreignColumns: [systems.companyId, systems.id] }),
    foreignKey({
      columns: [t.companyId, t.systemId, t.zoneId],
      foreignColumns: [zones.companyId, zones.systemId, zones.id],
    }),
    mayRead(OF_MY_SITES),
    mayAdd(OFFICE),
    mayChange(OFFICE),
  ],
);

/** What the panel operates together. */
export const outputGroups = pgTable(
  "output_groups",
  {
    ...ofSystem(),
    key: text("key").notNull(),
    name: text("name").notNull(),
    function: text("function", { enum: FUNCTIONS }).notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    unique("output_groups_key_unique").on(t.companyId, t.systemId, t.key),
    unique("output_groups_of_system").on(t.companyId, t.systemId, t.id),
    foreignKey({ columns: [t.companyId, t.systemId], foreignColumns: [systems.companyId, systems.id] }),
    mayRead(OF_MY_SITES),
    mayAdd(OFFICE),
    mayChange(OFFICE),
  ],
);

/** One operated thing: a relay or a circuit. */
export const outputs = pgTable(
  "outputs",
  {
    ...ofSystem(),
    groupId: uuid("group_id").notNull(),
    address: text("address").notNull(),
    kind: text("kind", { enum: OUTPUT_KINDS }).notNull(),
    label: text("label").notNull(),
    location: text("location"),
    removedOn: date("removed_on", { mode: "string" }),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    unique("outputs_address_unique").on(t.companyId, t.systemId, t.address),
    unique("outputs_of_system").on(t.companyId, t.systemId, t.id),
    foreignKey({
      columns: [t.companyId, t.systemId, t.groupId],
      foreignColumns: [outputGroups.companyId, outputGroups.systemId, outputGroups.id],
    }),
    mayRead(OF_MY_SITES),
    mayAdd(OFFICE),
    mayChange(OFFICE),
  ],
);

/** What an output controls, by the building's own tag. */
export const equipment = pgTable(
  "equipment",
  {
    ...ofSystem(),
    outputId: uuid("output_id").notNull(),
    tag: text("tag").notNull(),
    kind: text("kind", { enum: EQUIPMENT_KINDS }).notNull(),
    action: text("action", { enum: ACTIONS }).notNull(),
    location: text("location"),
    serves: text("serves"),
    restart: text("restart", { enum: RESTART_MODES }).notNull().default("unknown"),
    longestOffMinutes: integer("longest_off_minutes"),
    minutesBetweenStarts: integer("minutes_between_starts"),
    removedOn: date("removed_on", { mode: "string" }),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    unique("equipment_tag_unique").on(t.companyId, t.systemId, t.tag),
    unique("equipment_of_system").on(t.companyId, t.systemId, t.id),
    foreignKey({
      columns: [t.companyId, t.systemId, t.outputId],
      foreignColumns: [outputs.companyId, outputs.systemId, outputs.id],
    }),
    check("equipment_minutes", sql`${t.longestOffMinutes} > 0 and ${t.minutesBetweenStarts} >= 0`),
    mayRead(OF_MY_SITES),
    mayAdd(OFFICE),
    mayChange(OFFICE),
  ],
);

/** The matrix grows in versions: the newest is in force, older ones can be read back. */
export const matrixVersions = pgTable(
  "matrix_versions",
  {
    companyId: companyId(),
    systemId: uuid("system_id").notNull(),
    number: integer("number").notNull(),
    note: text("note").notNull(),
    createdAt: createdAt(),
    createdBy: uuid("created_by").notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.systemId, t.number] }),
    foreignKey({ columns: [t.companyId, t.systemId], foreignColumns: [systems.companyId, systems.id] }),
    foreignKey({ columns: [t.companyId, t.createdBy], foreignColumns: [members.companyId, members.id] }),
    mayRead(OF_MY_SITES),
    mayAdd(OFFICE),
  ],
);

/**
 * One input (a zone or a single point) that operates one output group. A cell holds from version `addedIn` until just
 * before `removedIn`; it is never changed otherwise.
 */
export const matrixCells = pgTable(
  "matrix_cells",
  {
    ...ofSystem(),
    zoneId: uuid("zone_id"),
    pointId: uuid("point_id"),
    groupId: uuid("group_id").notNull(),
    signal: text("signal", { enum: SIGNALS }).notNull(),
    source: text("source", { enum: EXPECTATION_SOURCES }).notNull(),
    delaySeconds: integer("delay_seconds").notNull().default(0),
    addedIn: integer("added_in").notNull(),
    removedIn: integer("removed_in"),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    check("matrix_cells_one_input", sql`num_nonnulls(${t.zoneId}, ${t.pointId}) = 1`),
    check("matrix_cells_versions", sql`${t.removedIn} > ${t.addedIn}`),
    check("matrix_cells_delay", sql`${t.delaySeconds} >= 0`),
    index("matrix_cells_system").on(t.companyId, t.systemId),
    foreignKey({
      columns: [t.companyId, t.systemId, t.addedIn],
      foreignColumns: [matrixVersions.companyId, matrixVersions.systemId, matrixVersions.number],
    }),
    foreignKey({
      columns: [t.companyId, t.systemId, t.removedIn],
      foreignColumns: [matrixVersions.companyId, matrixVersions.systemId, matrixVersions.number],
    }),
    foreignKey({
      columns: [t.companyId, t.systemId, t.zoneId],
      foreignColumns: [zones.companyId, zones.systemId, zones.id],
    }),
    foreignKey({
      columns: [t.companyId, t.systemId, t.pointId],
      foreignColumns: [points.companyId, points.systemId, points.id],
    }),
    foreignKey({
      columns: [t.companyId, t.systemId, t.groupId],
      foreignColumns: [outputGroups.companyId, outputGroups.systemId, outputGroups.id],
    }),
    mayRead(OF_MY_SITES),
    mayAdd(OFFICE),
    mayChange(OFFICE),
  ],
);

/** How a company's own column names were matched to ours, so that the next list of theirs fits by itself. */
export const columnMatches = pgTable(
  "column_matches",
  {
    companyId: companyId(),
    /** The kind of list: points, outputs, … */
    list: text("list").notNull(),
    /** Their heading, lower case and trimmed. */
    heading: text("heading").notNull(),
    column: text("column").notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.list, t.heading] }),
    mayRead(OFFICE),
    mayAdd(OFFICE),
    mayChange(OFFICE),
  ],
);
