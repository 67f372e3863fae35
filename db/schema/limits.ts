import { bigint, integer, pgSchema, text } from "drizzle-orm/pg-core";

/** Bookkeeping of the installation itself. */
export const ops = pgSchema("ops");

/** Attempts by account and by address; the columns are those of the rate limiter's PostgreSQL store. */
export const rateLimits = ops.table("rate_limits", {
  key: text("key").primaryKey(),
  points: integer("points").notNull().default(0),
  expire: bigint("expire", { mode: "number" }),
});
