import { z } from "zod";
import { companies } from "@/db/schema/company";
import { emailAddress, rowId } from "@/lib/domain/shared/inputs";
import { paths } from "@/lib/domain/shared/paths";
import { notFound } from "@/lib/errors";
import { command } from "@/lib/services/command";
import { makeLink, withdrawLinks } from "@/lib/services/links";
import { mail } from "@/lib/services/outbox";

const HOURS_VALID = 1;

export const sendPasswordReset = command({
  name: "account.send-password-reset",
  needs: "mail:send",
  input: z.object({ memberId: rowId, email: emailAddress }),
  async run({ tx, who, now }, { memberId, email }) {
    const [company] = await tx.select({ name: companies.name }).from(companies);
    if (!company) throw notFound("company");
    await withdrawLinks(tx, memberId, "password:reset", now);
    const expiresAt = new Date(now.getTime() + HOURS_VALID * 3_600_000);
    const token = await makeLink(tx, who, { grant: "password:reset", subjectId: memberId, expiresAt });
    await mail(tx, who, email, { template: "password-reset", companyName: company.name }, paths.passwordReset(token));
    return { result: null, audit: { entity: "person", entityId: memberId } };
  },
});
