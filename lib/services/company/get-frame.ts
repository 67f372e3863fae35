import { eq } from "drizzle-orm";
import { z } from "zod";
import { companies } from "@/db/schema/company";
import { members } from "@/db/schema/people";
import { AppError, notFound } from "@/lib/errors";
import { query } from "@/lib/services/command";

/** What every page's frame shows: the company, and who is signed in. */
export const getFrame = query({
  name: "company.frame",
  needs: "account:own",
  input: z.object({}),
  async run({ tx, who }) {
    if (who.kind !== "person") throw new AppError("forbidden", "Only people have a frame");
    const [company] = await tx
      .select({ name: companies.name, phone: companies.phone, zone: companies.zone })
      .from(companies);
    const [member] = await tx.select({ name: members.name }).from(members).where(eq(members.id, who.memberId));
    if (!company || !member) throw notFound("company");
    return { company, role: who.role, memberId: who.memberId, personName: member.name };
  },
});
