import { eq } from "drizzle-orm";
import { companies } from "@/db/schema/company";
import { memberDetails, members } from "@/db/schema/people";
import { hashPassword } from "@/lib/auth/password";
import { NewPasswordInput } from "@/lib/domain/people/schemas";
import { paths } from "@/lib/domain/shared/paths";
import { notFound } from "@/lib/errors";
import { command } from "@/lib/services/command";
import { spendLink } from "@/lib/services/links";
import { mail } from "@/lib/services/outbox";
import { setPassword } from "./internal";

export const resetPassword = command({
  name: "password.reset",
  needs: "password:reset",
  input: NewPasswordInput,
  async run({ tx, who, now }, { password }) {
    const memberId = await spendLink(tx, who, now);
    const [member] = await tx.select().from(members).where(eq(members.id, memberId));
    const [details] = await tx.select().from(memberDetails).where(eq(memberDetails.memberId, memberId));
    const [company] = await tx.select({ name: companies.name }).from(companies);
    if (!member?.userId || !details || !company) throw notFound("person");
    await setPassword(tx, member.userId, await hashPassword(password), now);
    const letter = { template: "password-changed", companyName: company.name, name: member.name } as const;
    await mail(tx, who, details.email, letter, paths.forgot);
    return { result: null, audit: { entity: "person", entityId: memberId } };
  },
});
