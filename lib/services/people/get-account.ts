import { and, desc, eq, gt, isNull } from "drizzle-orm";
import { z } from "zod";
import { sessions } from "@/db/schema/identity";
import { memberDetails, members } from "@/db/schema/people";
import { AppError, notFound } from "@/lib/errors";
import { query } from "@/lib/services/command";
import { membershipsOf } from "./internal";

/** What somebody sees of their own account: where they belong, and where they are signed in. */
export const getAccount = query({
  name: "account.get",
  needs: "account:own",
  input: z.object({}),
  async run({ tx, who, now }) {
    if (who.kind !== "person") throw new AppError("forbidden", "Only people have an account");
    const [me] = await tx
      .select({ name: members.name, role: members.role, email: memberDetails.email })
      .from(members)
      .innerJoin(memberDetails, eq(memberDetails.memberId, members.id))
      .where(eq(members.id, who.memberId));
    if (!me) throw notFound("person");
    const standing = and(eq(sessions.userId, who.userId), isNull(sessions.endedAt), gt(sessions.expiresAt, now));
    const signedIn = await tx
      .select({ id: sessions.id, browser: sessions.userAgent, since: sessions.createdAt })
      .from(sessions)
      .where(standing)
      .orderBy(desc(sessions.createdAt));
    return {
      ...me,
      companyId: who.companyId,
      memberships: await membershipsOf(tx, who.userId),
      sessions: signedIn.map((session) => ({ ...session, here: session.id === who.sessionId })),
    };
  },
});
