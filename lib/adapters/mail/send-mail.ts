import nodemailer, { type Transporter } from "nodemailer";
import { env } from "@/lib/env";
import { type CalendarEntry, calendarFile } from "./calendar-file";

export type Mail = {
  to: string;
  subject: string;
  html: string;
  text: string;
  messageId: string;
  /** RFC 6047: goes along as one more reading of the letter, and as a file for programs that look for one. */
  calendar?: Omit<CalendarEntry, "organizer" | "attendee"> & { organizerName: string; attendeeName: string };
};

let transport: Transporter | undefined;

/** Returns once the server has taken the letter. */
export async function sendMail({ calendar, ...mail }: Mail): Promise<void> {
  transport ??= nodemailer.createTransport(env().SMTP_URL);
  await transport.sendMail({
    from: env().MAIL_FROM,
    ...mail,
    ...(calendar && { icalEvent: calendarPart(calendar, mail.to) }),
  });
}

function calendarPart({ organizerName, attendeeName, ...entry }: NonNullable<Mail["calendar"]>, to: string) {
  const sender = /<([^>]+)>/.exec(env().MAIL_FROM)?.[1] ?? env().MAIL_FROM;
  const content = calendarFile({
    ...entry,
    organizer: { name: organizerName, email: sender },
    attendee: { name: attendeeName, email: to },
  });
  return { method: entry.method, filename: "visit.ics", content };
}
