import { z } from "zod";
import { FUNCTIONS } from "@/lib/domain/systems/words";

/** What a letter about a visit tells, and what its calendar file is made of. */
export const VisitLetter = z.object({
  companyName: z.string(),
  companyPhone: z.string(),
  contactName: z.string(),
  site: z.object({ name: z.string(), address: z.string() }),
  title: z.string(),
  crew: z.array(z.string()),
  startsLocal: z.string(),
  endsLocal: z.string(),
  liveBlocks: z.array(
    z.object({
      functions: z.array(z.enum(FUNCTIONS)),
      startsLocal: z.string(),
      endsLocal: z.string(),
      attendees: z.array(z.string()),
    }),
  ),
  calendar: z.object({
    /** The same in every letter about one visit, so that a change reaches the entry that is there. */
    uid: z.string(),
    sequence: z.number().int(),
    startsAt: z.iso.datetime(),
    endsAt: z.iso.datetime(),
    writtenAt: z.iso.datetime(),
  }),
});
export type VisitLetter = z.infer<typeof VisitLetter>;
