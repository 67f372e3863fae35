import { z } from "zod";
import { rowId } from "@/lib/domain/shared/inputs";
import { PASSWORD_RESET_HOURS } from "@/lib/domain/shared/link-validity";
import { paths } from "@/lib/domain/shared/paths";
import { command } from "@/lib/services/command";
import { makeLink, withdrawLinks } from "@/lib/services/links";
import { mail } from "@/lib/services/outbox";
import { takeRequest } from "./internal";

export const sendPasswordReset = command({
  name: "account.send-password-reset",
  needs: "mail:send",
  input: z.object({ requestId: rowId, memberId: rowId }),
  async run({ tx, who, now }, { requestId, memberId }) {
    const taken = await takeRequest(tx, requestId, "password_reset", memberId);
    if (!taken) return { result: null, audit: [] };
    await withdrawLinks(tx, [memberId], "password:reset", now);
    const expiresAt = new Date(now.getTime() + PASSWORD_RESET_HOURS * 3_600_000);
    const token = await makeLink(tx, who, { grant: "password:reset", subjectId: memberId, expiresAt });
    const letter = { template: "password-reset", companyName: taken.companyName } as const;
    await mail(tx, who, taken.email, letter, paths.passwordReset(token));
    return { result: null, audit: { entity: "person", entityId: memberId } };
  },
});
