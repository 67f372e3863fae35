import { z } from "zod";
import { companies } from "@/db/schema/company";
import { notFound } from "@/lib/errors";
import { query } from "@/lib/services/command";

export const getCompany = query({
  name: "company.get",
  needs: "company:read",
  input: z.object({}),
  async run({ tx }) {
    const [company] = await tx.select().from(companies);
    if (!company) throw notFound("company");
    return company;
  },
});
