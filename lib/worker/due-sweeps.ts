import { sql } from "drizzle-orm";
import { database } from "@/db/client";
import { log } from "@/lib/log";
import { sweepDue } from "@/lib/services/jobs/sweep-due";

type Row = { company_id: string };

const LOOK_EVERY_MS = 60_000;

/** Sweeps every company whose next sweep has come; one that fails does not keep the others waiting. */
async function sweepCompanies(at: Date | "infinity", clock: () => Date, goOn: () => boolean): Promise<void> {
  const by = at === "infinity" ? at : at.toISOString();
  const due = await database().execute<Row>(
    sql`select company_id from app.companies_to_sweep(${by}::timestamptz) as t (company_id)`,
  );
  for (const { company_id: companyId } of due) {
    if (!goOn()) return;
    try {
      const { made } = await sweepDue({ actor: { kind: "worker", companyId }, now: clock() }, {});
      if (made > 0) log().info({ companyId, made }, "jobs made ahead");
    } catch (error) {
      log().error({ err: error, companyId }, "a sweep of the due list failed");
    }
  }
}

/** To be called often: sweeps everybody the first time, since the worker may have been away, then whose day has come. */
export function dueSweeper(clock: () => Date): (goOn: () => boolean) => Promise<void> {
  let lookedAt: number | undefined;
  return async (goOn) => {
    const now = clock();
    if (lookedAt !== undefined && now.getTime() - lookedAt < LOOK_EVERY_MS) return;
    const at = lookedAt === undefined ? "infinity" : now;
    lookedAt = now.getTime();
    await sweepCompanies(at, clock, goOn);
  };
}
