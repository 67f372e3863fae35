import type { Mail } from "@/lib/adapters/mail/send-mail";
import type { MailTemplate } from "@/lib/domain/messages/events";
import { FUNCTION_WORDS } from "@/lib/domain/systems/words";
import { clockOf } from "@/lib/domain/visits/clock";
import type { VisitLetter } from "@/lib/domain/visits/letter";

/** Calendars are shared, so the address that answers stays in the letter. */
const descriptionOf = ({ liveBlocks, crew, companyPhone }: VisitLetter): string =>
  [
    ...liveBlocks.map(
      ({ functions, startsLocal, endsLocal }) =>
        `Operates from ${clockOf(startsLocal)} to ${clockOf(endsLocal)}: ${functions.map((one) => FUNCTION_WORDS[one]).join(", ")}`,
    ),
    crew.length > 0 && `Who comes: ${crew.join(", ")}`,
    `Questions: ${companyPhone}`,
  ]
    .filter(Boolean)
    .join("\n");

/** The calendar file that goes with a letter about a visit: one entry, whatever becomes of it. */
export function calendarOf(letter: MailTemplate): Mail["calendar"] {
  switch (letter.template) {
    case "visit-asked":
    case "visit-moved":
    case "visit-canceled":
      return {
        method: letter.template === "visit-canceled" ? "CANCEL" : "REQUEST",
        uid: letter.calendar.uid,
        sequence: letter.calendar.sequence,
        startsAt: new Date(letter.calendar.startsAt),
        endsAt: new Date(letter.calendar.endsAt),
        writtenAt: new Date(letter.calendar.writtenAt),
        summary: `${letter.title}, ${letter.companyName}`,
        location: `${letter.site.name}, ${letter.site.address}`,
        description: descriptionOf(letter),
        organizerName: letter.companyName,
        attendeeName: letter.contactName,
      };
    default:
      return undefined;
  }
}
