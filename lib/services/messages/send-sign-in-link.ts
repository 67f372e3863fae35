import { z } from "zod";
import { rowId } from "@/lib/domain/shared/inputs";
import { AppError } from "@/lib/errors";
import { command } from "@/lib/services/command";
import { mail } from "@/lib/services/outbox";
import { takeRequest } from "./internal";

export const sendSignInLink = command({
  name: "account.send-sign-in-link",
  needs: "mail:send",
  input: z.object({ requestId: rowId, memberId: rowId }),
  async run({ tx, who }, { requestId, memberId }) {
    const taken = await takeRequest(tx, requestId, "sign_in_link", memberId);
    if (!taken) return { result: null, audit: [] };
    const { request, email, companyName } = taken;
    if (!request.url) throw new AppError("invalid", "The request carries no address to sign in at");
    await mail(tx, who, email, { template: "sign-in-link", companyName }, request.url);
    return { result: null, audit: { entity: "person", entityId: memberId } };
  },
});
