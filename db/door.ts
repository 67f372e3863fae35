import { createHash } from "node:crypto";
import { sql } from "drizzle-orm";
import type { Actor, Entered } from "@/lib/auth/actor";
import type { Role } from "@/lib/domain/shared/roles";
import { AppError } from "@/lib/errors";
import { database, type Tx } from "./client";

type SessionRow = {
  company_id: string;
  user_id: string;
  role: Role;
  member_id: string;
  contact_id: string | null;
  customer_id: string | null;
};
type LinkRow = { company_id: string; link_id: string; grant_name: string; subject_id: string };

export const hashToken = (token: string): string => createHash("sha256").update(token).digest("hex");

async function enter(tx: Tx, actor: Actor): Promise<Entered> {
  switch (actor.kind) {
    case "session": {
      const [row] = await tx.execute<SessionRow>(sql`select * from app.enter_session(${actor.sessionId}::uuid)`);
      if (!row) break;
      return {
        kind: "person",
        sessionId: actor.sessionId,
        companyId: row.company_id,
        userId: row.user_id,
        memberId: row.member_id,
        role: row.role,
        contactId: row.contact_id,
        customerId: row.customer_id,
      };
    }
    case "link": {
      const [row] = await tx.execute<LinkRow>(sql`select * from app.enter_link(${hashToken(actor.token)})`);
      if (!row) break;
      return {
        kind: "link",
        companyId: row.company_id,
        linkId: row.link_id,
        grant: row.grant_name,
        subjectId: row.subject_id,
      };
    }
    case "worker":
      await tx.execute(sql`select app.enter_worker(${actor.companyId}::uuid)`);
      return actor;
    case "operator":
      await tx.execute(sql`select app.enter_operator(${actor.companyId}::uuid)`);
      return actor;
    case "nobody":
      break;
  }
  throw new AppError("unauthenticated", "Please sign in");
}

/**
 * The one door to tenant data: a transaction that carries who asks, so that row-level security decides what exists.
 * Refusals that the database defers to the end are raised before this returns, as ours to explain.
 */
export function asActor<T>(
  actor: Actor,
  run: (tx: Tx, who: Entered) => Promise<T>,
  mode: "read" | "write",
): Promise<T> {
  return database().transaction(
    async (tx) => {
      const result = await run(tx, await enter(tx, actor));
      if (mode === "write") await tx.execute(sql`set constraints all immediate`);
      return result;
    },
    { accessMode: mode === "read" ? "read only" : "read write" },
  );
}
