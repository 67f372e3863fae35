import { z } from "zod";
import { companies } from "@/db/schema/company";
import { sites } from "@/db/schema/sites";
import { notFound } from "@/lib/errors";
import { query } from "@/lib/services/command";
import { asksOf, visitsBetween } from "./internal";

const PAST_DAYS = 365;
const COMING_DAYS = 365;
const DAY_MS = 86_400_000;

/** What a customer's contact may see: their sites, who comes when, and what they were asked about it. */
export const getPortal = query({
  name: "portal.home",
  needs: "portal:read",
  input: z.object({}),
  async run({ tx, now }) {
    const [company] = await tx.select({ name: companies.name, phone: companies.phone }).from(companies);
    if (!company) throw notFound("company");
    const held = await tx.select().from(sites).orderBy(sites.name);
    const from = new Date(now.getTime() - PAST_DAYS * DAY_MS);
    const to = new Date(now.getTime() + COMING_DAYS * DAY_MS);
    const all = await visitsBetween(tx, from, to);
    const asks = await asksOf(
      tx,
      all.map((visit) => visit.id),
    );
    const visits = all.map((visit) => ({ ...visit, ask: asks.find((ask) => ask.visitId === visit.id) ?? null }));
    return { company, sites: held, visits };
  },
});
