import { z } from "zod";
import { AppError } from "@/lib/errors";
import { command } from "@/lib/services/command";
import { signOutEverywhere as endSessions } from "./internal";

export const signOutEverywhere = command({
  name: "account.sign-out-everywhere",
  needs: "account:own",
  input: z.object({}),
  async run({ tx, who, now }) {
    if (who.kind !== "person") throw new AppError("forbidden", "Only people are signed in");
    await endSessions(tx, who.userId, now);
    return { result: null, audit: { entity: "person", entityId: who.memberId } };
  },
});
