import { z } from "zod";
import { companies } from "@/db/schema/company";
import { emailAddress, rowId } from "@/lib/domain/shared/inputs";
import { notFound } from "@/lib/errors";
import { command } from "@/lib/services/command";
import { mail } from "@/lib/services/outbox";

export const sendSignInLink = command({
  name: "account.send-sign-in-link",
  needs: "mail:send",
  input: z.object({ memberId: rowId, email: emailAddress, url: z.string() }),
  async run({ tx, who }, { memberId, email, url }) {
    const [company] = await tx.select({ name: companies.name }).from(companies);
    if (!company) throw notFound("company");
    await mail(tx, who, email, { template: "sign-in-link", companyName: company.name }, url);
    return { result: null, audit: { entity: "person", entityId: memberId } };
  },
});
