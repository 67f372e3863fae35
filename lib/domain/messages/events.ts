import { z } from "zod";
import { VisitLetter } from "@/lib/domain/visits/letter";

/** Everything that verbs announce. The worker has one handler for each. */
export const DomainEvent = z.discriminatedUnion("event", [
  z.object({ event: z.literal("message.written"), messageId: z.uuid() }),
]);
export type DomainEvent = z.infer<typeof DomainEvent>;

/** Every e-mail by name, with what it says. A one-time address travels apart from these. */
export const MailTemplate = z.discriminatedUnion("template", [
  z.object({
    template: z.literal("invitation"),
    companyName: z.string(),
    invitedBy: z.string(),
    name: z.string(),
    roleWord: z.string(),
  }),
  z.object({ template: z.literal("sign-in-link"), companyName: z.string() }),
  z.object({ template: z.literal("password-reset"), companyName: z.string() }),
  z.object({ template: z.literal("password-changed"), companyName: z.string(), name: z.string() }),
  VisitLetter.extend({ template: z.literal("visit-asked") }),
  VisitLetter.extend({
    template: z.literal("visit-moved"),
    before: z.object({ startsLocal: z.string(), endsLocal: z.string() }),
  }),
  VisitLetter.extend({ template: z.literal("visit-canceled"), reason: z.string() }),
]);
export type MailTemplate = z.infer<typeof MailTemplate>;
