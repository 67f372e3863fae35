import { and, eq, isNull } from "drizzle-orm";
import { z } from "zod";
import { sessions } from "@/db/schema/identity";
import { rowId } from "@/lib/domain/shared/inputs";
import { AppError, notFound } from "@/lib/errors";
import { command } from "@/lib/services/command";

/** Signs out one of the caller's own browsers. */
export const endSession = command({
  name: "account.end-session",
  needs: "account:own",
  input: z.object({ sessionId: rowId }),
  async run({ tx, who, now }, { sessionId }) {
    if (who.kind !== "person") throw new AppError("forbidden", "Only people are signed in");
    const ended = await tx
      .update(sessions)
      .set({ endedAt: now })
      .where(and(eq(sessions.id, sessionId), eq(sessions.userId, who.userId), isNull(sessions.endedAt)))
      .returning({ id: sessions.id });
    if (ended.length === 0) throw notFound("session");
    return { result: null, audit: { entity: "session", entityId: sessionId } };
  },
});
