import { once } from "node:events";
import ICAL from "ical.js";
import { type ParsedMail, simpleParser } from "mailparser";
import { SMTPServer } from "smtp-server";
import { afterAll, beforeAll, expect, test, vi } from "vitest";
import { createJob } from "@/lib/services/jobs/create-job";
import { cancelVisit } from "@/lib/services/visits/cancel-visit";
import { moveVisit } from "@/lib/services/visits/move-visit";
import { planVisit } from "@/lib/services/visits/plan-visit";
import { runOutbox } from "@/lib/worker/outbox-runner";
import { NOW } from "../factories/company";
import { newWorld, UNLICENSED, type World } from "../factories/world";

const NO_WINDOW = [...UNLICENSED, { code: "no_window", note: "not what this is about" }];

/** What arrived, byte for byte. */
const arrived: { to: string; raw: Buffer }[] = [];
const server = new SMTPServer({
  authOptional: true,
  disabledCommands: ["STARTTLS"],
  onData(stream, session, done) {
    const parts: Buffer[] = [];
    stream.on("data", (part: Buffer) => parts.push(part));
    stream.on("end", () => {
      for (const { address } of session.envelope.rcptTo) arrived.push({ to: address, raw: Buffer.concat(parts) });
      done();
    });
  },
});

let w: World;
beforeAll(async () => {
  server.listen(0, "127.0.0.1");
  await once(server.server, "listening");
  const address = server.server.address();
  // Settings are read at first use, which is the first letter below.
  vi.stubEnv("SMTP_URL", `smtp://127.0.0.1:${typeof address === "object" ? address?.port : 0}`);
  w = await newWorld();
});
afterAll(() => new Promise<void>((resolve) => server.close(() => resolve())));

/** The newest letter to the contact, once the worker has sent what waits. */
async function newest(): Promise<ParsedMail> {
  await runOutbox(
    () => new Date(),
    () => true,
  );
  const letter = arrived.filter(({ to }) => to === w.contact.email).at(-1);
  if (!letter) throw new Error("nothing arrived");
  return simpleParser(letter.raw);
}

type Component = InstanceType<typeof ICAL.Component>;

/** The one entry of the calendar file, as an independent reader understands it (RFC 5545). */
function entryIn(mail: ParsedMail): { method: unknown; event: Component; text: string } {
  const file = mail.attachments.find(({ filename }) => filename === "visit.ics");
  if (!file) throw new Error("no calendar file");
  const text = file.content.toString("utf8");
  const calendar = new ICAL.Component(ICAL.parse(text));
  const events = calendar.getAllSubcomponents("vevent");
  expect(events).toHaveLength(1);
  return { method: calendar.getFirstPropertyValue("method"), event: events[0] as Component, text };
}

const value = (event: Component, name: string) => event.getFirstPropertyValue(name)?.toString();

test("one calendar entry is made, moved and taken away by three letters (RFC 5545, 5546, 6047)", async () => {
  const { jobId } = await createJob(w.owner.context, {
    siteId: w.site.siteId,
    kind: "test",
    title: "Fans; horns, and a very long title that has to be folded where a line has seventy-five octets: ätsch",
    functions: ["fan_shutdown"],
  });
  const { visitId } = await planVisit(w.dispatcher.context, {
    jobId,
    startsLocal: "2026-12-15T06:00",
    minutes: 180,
    crew: [w.technician.memberId],
    liveBlocks: [{ offsetMinutes: 30, minutes: 60, functions: ["fan_shutdown"], attendees: ["building engineer"] }],
    overrides: NO_WINDOW,
    ask: [w.contact.contactId],
  });
  const asked = await newest();
  const first = entryIn(asked);
  expect(first.method).toBe("REQUEST");
  expect(value(first.event, "uid")).toBe(visitId);
  expect(value(first.event, "sequence")).toBe("0");
  expect(value(first.event, "status")).toBe("CONFIRMED");
  // 06:00 in Chicago in December is six hours behind UTC.
  expect(value(first.event, "dtstart")).toBe("2026-12-15T12:00:00Z");
  expect(value(first.event, "dtend")).toBe("2026-12-15T15:00:00Z");
  expect(value(first.event, "dtstamp")).toBe(NOW.toISOString().replace(".000", ""));
  expect(value(first.event, "summary")).toContain("has to be folded where a line has seventy-five octets: ätsch");
  expect(value(first.event, "location")).toContain(w.site.name);
  const organizer = first.event.getFirstProperty("organizer");
  expect(organizer?.getFirstValue()).toBe("mailto:no-reply@coastdown.example");
  expect(organizer?.getFirstParameter("cn")).toBe(w.company.name);
  const attendee = first.event.getFirstProperty("attendee");
  expect(String(attendee?.getFirstValue()).toLowerCase()).toBe(`mailto:${w.contact.email}`);
  expect(attendee?.getFirstParameter("partstat")).toBe("NEEDS-ACTION");
  for (const line of first.text.split("\r\n")) expect(Buffer.byteLength(line)).toBeLessThanOrEqual(75);

  await moveVisit(w.dispatcher.context, {
    visitId,
    sequence: 0,
    startsLocal: "2026-12-16T07:00",
    overrides: NO_WINDOW,
  });
  const moved = await newest();
  const second = entryIn(moved);
  expect(second.method).toBe("REQUEST");
  expect(value(second.event, "uid")).toBe(visitId);
  expect(value(second.event, "sequence")).toBe("1");
  expect(value(second.event, "dtstart")).toBe("2026-12-16T13:00:00Z");
  expect(moved.text).toContain("it stood at Tue, Dec 15, 2026, 06:00 to 09:00");

  await cancelVisit(w.dispatcher.context, { visitId, reason: "The building lost its window" });
  const canceled = await newest();
  const third = entryIn(canceled);
  expect(third.method).toBe("CANCEL");
  expect(value(third.event, "uid")).toBe(visitId);
  expect(value(third.event, "sequence")).toBe("2");
  expect(value(third.event, "status")).toBe("CANCELLED");
  expect(canceled.text).toContain("The building lost its window");
});

const askedLetter = (): Buffer => {
  const letter = arrived.find(({ to, raw }) => to === w.contact.email && raw.includes("method=REQUEST"));
  if (!letter) throw new Error("the letter that asks has not arrived");
  return letter.raw;
};

test("the calendar is one more reading of the letter, under its method, and a file beside it", () => {
  const raw = askedLetter().toString("utf8");
  expect(raw).toMatch(/Content-Type: multipart\/mixed/);
  expect(raw).toMatch(/Content-Type: multipart\/alternative/);
  expect(raw).toMatch(/Content-Type: text\/calendar; charset=utf-8;\s+method=REQUEST/);
});

test("letters say what operates, who comes and whom to call, in HTML and in plain text", async () => {
  const mail = await simpleParser(askedLetter());
  for (const reading of [mail.text ?? "", (mail.html || "").replace(/<!-- -->/g, "")]) {
    for (const said of ["fan shutdown", "06:30 to 07:30", "building engineer", "312-555-0100", "authority having"])
      expect(reading).toContain(said);
    expect(reading).toMatch(/http:\/\/localhost:3000\/visits\/[\w-]{40,}/);
  }
  // A calendar is shared, and the address answers for whoever holds it.
  expect(mail.attachments[0]?.content.toString()).not.toContain("/visits/");
});
