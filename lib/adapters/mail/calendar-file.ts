import ical, { ICalAttendeeRole, ICalAttendeeStatus, ICalCalendarMethod, ICalEventStatus } from "ical-generator";

export type CalendarEntry = {
  /** RFC 5546: REQUEST makes or changes the entry of this UID, CANCEL takes it away; the higher sequence counts. */
  method: "REQUEST" | "CANCEL";
  uid: string;
  sequence: number;
  startsAt: Date;
  endsAt: Date;
  writtenAt: Date;
  summary: string;
  location: string;
  description: string;
  organizer: { name: string; email: string };
  attendee: { name: string; email: string };
};

const PRODUCT = { company: "Coastdown", product: "Visits", language: "EN" };

/** One entry as RFC 5545 has it, its times as instants. Answers come by the letter's link, so none is asked for here. */
export function calendarFile({ method, organizer, attendee, uid, ...entry }: CalendarEntry): string {
  const canceled = method === "CANCEL";
  const calendar = ical({ prodId: PRODUCT, method: ICalCalendarMethod[method] });
  calendar.createEvent({
    id: uid,
    sequence: entry.sequence,
    start: entry.startsAt,
    end: entry.endsAt,
    stamp: entry.writtenAt,
    summary: entry.summary,
    location: entry.location,
    description: entry.description,
    status: canceled ? ICalEventStatus.CANCELLED : ICalEventStatus.CONFIRMED,
    organizer,
    attendees: [
      {
        ...attendee,
        rsvp: false,
        role: ICalAttendeeRole.REQ,
        status: ICalAttendeeStatus.NEEDSACTION,
      },
    ],
  });
  return calendar.toString();
}
