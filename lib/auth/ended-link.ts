import { sql } from "drizzle-orm";
import { database } from "@/db/client";
import { hashToken } from "@/db/door";

export type EndedLink = {
  companyName: string;
  companyPhone: string;
  reason: "canceled" | "moved" | "withdrawn" | "expired";
};

type Row = { company_name: string; company_phone: string; reason: EndedLink["reason"] };

/** Whom the holder of a link that works no longer should call; nothing for a token that never was. */
export async function endedVisitLink(token: string): Promise<EndedLink | null> {
  const [row] = await database().execute<Row>(sql`select * from app.ended_visit_link(${hashToken(token)})`);
  return row ? { companyName: row.company_name, companyPhone: row.company_phone, reason: row.reason } : null;
}
