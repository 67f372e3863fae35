import { eq } from "drizzle-orm";
import { companies } from "@/db/schema/company";
import { passwords } from "@/db/schema/identity";
import { memberDetails, members } from "@/db/schema/people";
import { hashPassword, passwordMatches } from "@/lib/auth/password";
import { ChangePasswordInput } from "@/lib/domain/people/schemas";
import { paths } from "@/lib/domain/shared/paths";
import { AppError, notFound } from "@/lib/errors";
import { command } from "@/lib/services/command";
import { mail } from "@/lib/services/outbox";
import { setPassword } from "./internal";

/** Whoever finds a screen left open does not know the password: it is asked for once more. */
export const changePassword = command({
  name: "account.change-password",
  needs: "account:own",
  input: ChangePasswordInput,
  async run({ tx, who, now }, { currentPassword, password }) {
    if (who.kind !== "person") throw new AppError("forbidden", "Only people have a password");
    const [stored] = await tx.select().from(passwords).where(eq(passwords.userId, who.userId));
    if (!(await passwordMatches(stored?.hash, currentPassword))) {
      throw new AppError("invalid", "Your password stays as it is", { currentPassword: ["That is not your password"] });
    }
    const [me] = await tx
      .select({ name: members.name, email: memberDetails.email, companyName: companies.name })
      .from(members)
      .innerJoin(memberDetails, eq(memberDetails.memberId, members.id))
      .innerJoin(companies, eq(companies.companyId, members.companyId))
      .where(eq(members.id, who.memberId));
    if (!me) throw notFound("person");
    await setPassword(tx, who.userId, await hashPassword(password), now);
    const letter = { template: "password-changed", companyName: me.companyName, name: me.name } as const;
    await mail(tx, who, me.email, letter, paths.forgot);
    return { result: null, audit: { entity: "person", entityId: who.memberId } };
  },
});
