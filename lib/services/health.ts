import { sql } from "drizzle-orm";
import { database } from "@/db/client";
import journal from "@/db/migrations/meta/_journal.json";

/** Older than this, work that is due is not being done. */
const LATE_SECONDS = 300;

type State = { waiting: string; oldest_seconds: number; dead: string; applied: number };

export type Health = {
  status: "ok" | "late" | "failing";
  uptimeSeconds: number;
  database: "ok" | "unreachable";
  migrations: { applied: number | null; expected: number };
  outbox: { waiting: number; oldestSeconds: number; dead: number } | null;
};

/** Whether this process can do its work, and whether the worker keeps up. No tenant's data is in it. */
export async function health(): Promise<Health> {
  const expected = journal.entries.length;
  const uptimeSeconds = Math.round(process.uptime());
  try {
    const [state] = await database().execute<State>(
      sql`select s.*, (select count(*)::int from drizzle.__drizzle_migrations) as applied from app.outbox_state() s`,
    );
    if (!state) throw new Error("no answer");
    const late = state.oldest_seconds > LATE_SECONDS;
    return {
      status: state.applied !== expected ? "failing" : late ? "late" : "ok",
      uptimeSeconds,
      database: "ok",
      migrations: { applied: state.applied, expected },
      outbox: {
        waiting: Number(state.waiting),
        oldestSeconds: Math.round(state.oldest_seconds),
        dead: Number(state.dead),
      },
    };
  } catch {
    return {
      status: "failing",
      uptimeSeconds,
      database: "unreachable",
      migrations: { applied: null, expected },
      outbox: null,
    };
  }
}
