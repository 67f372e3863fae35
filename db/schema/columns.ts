import { sql } from "drizzle-orm";
import { pgPolicy, pgRole, timestamp, uuid } from "drizzle-orm/pg-core";
import { v7 as uuidv7 } from "uuid";

/** Made by the launcher: roles belong to the cluster, not to a database. */
export const appRole = pgRole("coastdown_app").existing();
export const gateRole = pgRole("coastdown_gate").existing();

export const companyId = () => uuid("company_id").notNull();
export const id = () => uuid("id").notNull().$defaultFn(uuidv7);
export const instant = (name: string) => timestamp(name, { withTimezone: true, mode: "date" });
export const createdAt = () => instant("created_at").notNull().defaultNow();

const ours = sql.raw("company_id = (select app.company_id())");

/** Who may see or change a row of one company, as an SQL condition beside the company's own. */
export type Condition = string;
export const OFFICE: Condition = "(select app.is_office())";
export const OWNER: Condition = "(select app.is_owner())";
export const WORKER: Condition = "(select app.is_worker())";
export const ANYONE: Condition = "true";
export const MY_SITE = (column = "site_id"): Condition => `${column} in (select app.my_site_ids())`;
export const either = (...conditions: Condition[]): Condition => conditions.join(" or ");

const within = (condition: Condition) => sql`${ours} and (${sql.raw(condition)})`;

export const mayRead = (condition: Condition) =>
  pgPolicy("read", { for: "select", to: appRole, using: within(condition) });
export const mayAdd = (condition: Condition) =>
  pgPolicy("add", { for: "insert", to: appRole, withCheck: within(condition) });
export const mayChange = (condition: Condition) =>
  pgPolicy("change", { for: "update", to: appRole, using: within(condition), withCheck: within(condition) });
export const mayRemove = (condition: Condition) =>
  pgPolicy("remove", { for: "delete", to: appRole, using: within(condition) });
/** The definer functions' own view: they decide who an actor is before a company is known. */
export const gate = () => pgPolicy("gate", { for: "all", to: gateRole, using: sql`true`, withCheck: sql`true` });
