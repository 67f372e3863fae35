import { eq } from "drizzle-orm";
import { z } from "zod";
import { sessions } from "@/db/schema/identity";
import { rowId } from "@/lib/domain/shared/inputs";
import { AppError, notFound } from "@/lib/errors";
import { command } from "@/lib/services/command";
import { membershipsOf } from "./internal";

/** Moves the session to another company in which the same person is a member. */
export const enterCompany = command({
  name: "account.enter-company",
  needs: "account:own",
  input: z.object({ companyId: rowId }),
  async run({ tx, who }, { companyId }) {
    if (who.kind !== "person") throw new AppError("forbidden", "Only people are signed in");
    const memberships = await membershipsOf(tx, who.userId);
    if (!memberships.some((membership) => membership.companyId === companyId)) throw notFound("company");
    await tx.update(sessions).set({ companyId }).where(eq(sessions.id, who.sessionId));
    return { result: null, audit: { entity: "session", entityId: who.sessionId, after: { companyId } } };
  },
});
