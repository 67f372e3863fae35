import "server-only";
import type postgres from "postgres";
import { RateLimiterPostgres } from "rate-limiter-flexible";
import { rawClient } from "@/db/client";
import { AppError } from "@/lib/errors";

const QUARTER_HOUR_SECONDS = 900;

/** Attempts in a quarter of an hour, before the door stays shut for the rest of it. */
const LIMITS = { account: 10, address: 60, mail: 5 } as const;
export type LimitKind = keyof typeof LIMITS;

let client: postgres.Sql | undefined;
const limiters = new Map<LimitKind, RateLimiterPostgres>();

/** Counts are kept in the database: neither a restart nor a second instance forgets them. */
function limiter(kind: LimitKind): RateLimiterPostgres {
  client ??= rawClient({ max: 2 });
  const sql = client;
  const known = limiters.get(kind);
  if (known) return known;
  const made = new RateLimiterPostgres({
    storeClient: {
      query: async ({ text, values }: { text: string; values: (string | number)[] }) => {
        const rows = await sql.unsafe(text, values);
        return { rows, rowCount: rows.count };
      },
    },
    storeType: "client",
    schemaName: "ops",
    tableName: "rate_limits",
    tableCreated: true,
    keyPrefix: kind,
    points: LIMITS[kind],
    duration: QUARTER_HOUR_SECONDS,
  });
  limiters.set(kind, made);
  return made;
}

/** Counts one attempt; throws `limited` when there were too many. */
export async function countAttempt(kind: LimitKind, key: string): Promise<void> {
  try {
    await limiter(kind).consume(key.toLowerCase());
  } catch (error) {
    if (error instanceof Error) throw error;
    const { msBeforeNext } = error as { msBeforeNext: number };
    const minutes = Math.ceil(msBeforeNext / 60_000);
    throw new AppError(
      "limited",
      `Too many attempts. Try again in ${minutes} ${minutes === 1 ? "minute" : "minutes"}.`,
    );
  }
}

export const forgetAttempts = (kind: LimitKind, key: string) => limiter(kind).delete(key.toLowerCase());
