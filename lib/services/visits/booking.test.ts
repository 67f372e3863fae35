import { and, desc, eq } from "drizzle-orm";
import { beforeAll, describe, expect, test } from "vitest";
import { asActor } from "@/db/door";
import { messageSecrets, messages } from "@/db/schema/messages";
import { liveBlocks, visitAsks, visitCrew, visitOverrides, visits } from "@/db/schema/visits";
import type { Actor } from "@/lib/auth/actor";
import { endedVisitLink } from "@/lib/auth/ended-link";
import { AppError } from "@/lib/errors";
import { createJob } from "@/lib/services/jobs/create-job";
import { recordLicense } from "@/lib/services/people/record-license";
import { getPlaces } from "@/lib/services/planning/get-places";
import { addWindow } from "@/lib/services/windows/add-window";
import { hire, NOW, type Person, unique, worker } from "@/tests/factories/company";
import { newContact, newSite, newWorld, type World } from "@/tests/factories/world";
import { answerVisit } from "./answer";
import { askForVisit } from "./ask";
import { cancelVisit } from "./cancel-visit";
import { getAsked } from "./get-asked";
import { getPortal } from "./get-portal";
import { getVisit } from "./get-visit";
import { moveVisit } from "./move-visit";
import { planVisit } from "./plan-visit";
import { recordAnswer } from "./record-answer";
import { swapVisits } from "./swap-visits";

let w: World;
let siteId: string;
let contact: Awaited<ReturnType<typeof newContact>>;
beforeAll(async () => {
  w = await newWorld();
  siteId = (await newSite(w.company, w.customer.customerId)).siteId;
  contact = await newContact(w.company, w.customer.customerId, { siteIds: [siteId] });
  const window = { siteId, functions: ["fan_shutdown"], weekdays: [1, 2, 3, 4, 5], noticeHours: 24 };
  await addWindow(w.dispatcher.context, { ...window, startsLocal: "05:00", endsLocal: "09:00" });
});

async function licensed(): Promise<Person> {
  const person = await hire(w.company, "technician");
  const license = { kind: "Technician", number: unique("IL"), jurisdiction: "IL", expiresOn: "2027-12-31" };
  await recordLicense(w.owner.context, { ...license, memberId: person.memberId });
  return person;
}

const newJob = async (): Promise<string> => {
  const job = { siteId, kind: "test", title: unique("Shutdown test"), functions: ["fan_shutdown"] };
  return (await createJob(w.dispatcher.context, job)).jobId;
};

const FANS = [{ offsetMinutes: 60, minutes: 60, functions: ["fan_shutdown"], attendees: ["building engineer"] }];

/** Tuesday, December 8: the live block runs from 06:00 to 07:00. */
const plan = async (lead: Person, change: object = {}) => {
  const jobId = await newJob();
  const wish = { jobId, startsLocal: "2026-12-08T05:00", minutes: 180, crew: [lead.memberId], liveBlocks: FANS };
  return { jobId, ...(await planVisit(w.dispatcher.context, { ...wish, ...change })) };
};

const rowsOf = <T>(read: (tx: Parameters<Parameters<typeof asActor>[1]>[0]) => Promise<T>) =>
  asActor(worker(w.company.companyId), read, "read");
const visitRow = async (visitId: string) =>
  (await rowsOf((tx) => tx.select().from(visits).where(eq(visits.id, visitId))))[0];

/** The newest letter of a kind about a visit, as it is kept for sending. */
async function letterAbout(visitId: string, template: string) {
  const rows = await rowsOf((tx) =>
    tx
      .select({ props: messages.props, to: messages.toAddress, url: messageSecrets.url })
      .from(messages)
      .innerJoin(messageSecrets, eq(messageSecrets.messageId, messages.id))
      .where(eq(messages.template, template))
      .orderBy(desc(messages.id)),
  );
  const own = rows.find(({ props }) => (props as { calendar: { uid: string } }).calendar.uid === visitId);
  if (!own) throw new Error(`no ${template} letter about that visit`);
  const props = own.props as { calendar: { sequence: number }; reason?: string };
  const token = own.url.split("/").at(-1) ?? "";
  return { ...own, props, token, link: { kind: "link", token } satisfies Actor };
}

const refusal = async (attempt: Promise<unknown>): Promise<AppError> => {
  const error = await attempt.then(
    () => undefined,
    (reason: unknown) => reason,
  );
  if (error instanceof AppError) return error;
  throw error ?? new Error("it was not refused");
};

describe("planning", () => {
  test("keeps the wall clock, the instants and the live block", async () => {
    const { visitId } = await plan(await licensed());
    expect(await visitRow(visitId)).toMatchObject({
      startsLocal: "2026-12-08T05:00",
      endsLocal: "2026-12-08T08:00",
      startsAt: new Date("2026-12-08T11:00:00Z"),
      endsAt: new Date("2026-12-08T14:00:00Z"),
      sequence: 0,
    });
    const [block] = await rowsOf((tx) => tx.select().from(liveBlocks).where(eq(liveBlocks.visitId, visitId)));
    expect(block).toMatchObject({
      startsLocal: "2026-12-08T06:00",
      endsLocal: "2026-12-08T07:00",
      startsAt: new Date("2026-12-08T12:00:00Z"),
      functions: ["fan_shutdown"],
      attendees: ["building engineer"],
    });
  });

  test("on the night on which clocks go back, lasts as many minutes as it was asked for", async () => {
    const note = { code: "outside_window", note: "the building is empty that night" };
    const { visitId } = await plan(await licensed(), { startsLocal: "2027-11-07T00:30", overrides: [note] });
    const row = await visitRow(visitId);
    expect(row?.endsLocal).toBe("2027-11-07T02:30");
    expect(Number(row?.endsAt) - Number(row?.startsAt)).toBe(180 * 60_000);
  });

  test("is refused with every reason, each at the field that can mend it, and writes nothing", async () => {
    const unlicensed = await hire(w.company, "technician");
    const error = await refusal(plan(unlicensed, { startsLocal: "2026-12-08T12:00" }));
    expect(error.code).toBe("blocked");
    expect(error.fieldErrors).toEqual({
      crew: [expect.stringMatching(/holds no license in IL/)],
      liveBlocks: ["Fan shutdown: the live block lies outside every window of the site"],
    });
    const rows = await rowsOf((tx) => tx.select().from(visitCrew).where(eq(visitCrew.memberId, unlicensed.memberId)));
    expect(rows).toEqual([]);
  });

  test("goes past what stands against it in writing, and keeps what was said", async () => {
    const wish = {
      startsLocal: "2026-12-08T12:00",
      overrides: [{ code: "outside_window", note: "agreed with the chief engineer" }],
    };
    const { visitId } = await plan(await licensed(), wish);
    const kept = await rowsOf((tx) => tx.select().from(visitOverrides).where(eq(visitOverrides.visitId, visitId)));
    expect(kept).toMatchObject([
      {
        reason: "outside_window",
        words: "Fan shutdown: the live block lies outside every window of the site",
        note: "agreed with the chief engineer",
        createdBy: w.dispatcher.memberId,
      },
    ]);
  });

  test("never puts a person into two places, whatever is written", async () => {
    const lead = await licensed();
    await plan(lead);
    const overrides = [{ code: "crew_busy", note: "it will be all right" }];
    const error = await refusal(plan(lead, { startsLocal: "2026-12-08T07:30", liveBlocks: [], overrides }));
    expect(error.fieldErrors.crew).toEqual([expect.stringMatching(/ is at .* from 05:00 to 08:00/)]);
  });
});

describe("the places of a day", () => {
  test("are just those at which planning succeeds", async () => {
    const lead = await licensed();
    await plan(lead, { startsLocal: "2026-12-10T05:00" });
    const jobId = await newJob();
    const { columns, starts } = await getPlaces(w.dispatcher.context, { jobId, date: "2026-12-10", minutes: 120 });
    const own = columns.find(({ memberId }) => memberId === lead.memberId);
    let booked = 0;
    for (const { at, local, liveBlocks: blocks } of starts) {
      const band = own?.bands.find(({ from, to }) => from <= at && at <= to);
      const attempt = planVisit(w.dispatcher.context, {
        jobId,
        startsLocal: local,
        minutes: 120,
        crew: [lead.memberId],
        liveBlocks: blocks,
      });
      if (band?.reasons.length === 0) {
        const { visitId } = await attempt;
        await cancelVisit(w.dispatcher.context, { visitId, reason: "only tried" });
        booked++;
      } else {
        const said = Object.values((await refusal(attempt)).fieldErrors).flat();
        expect(said.sort()).toEqual(band?.reasons.map(({ words }) => words).sort());
      }
    }
    // The window opens from 05:00 to 09:00, the person is away from 05:00 to 08:00: 08:00, and what begins by 03:00.
    expect(booked).toBeGreaterThan(0);
    expect(booked).toBeLessThan(starts.length);
  });
});

describe("asking and answering", () => {
  test("by the link: opening answers nothing, the first press counts, a second is told so", async () => {
    const { visitId } = await plan(await licensed(), { ask: [contact.contactId] });
    const { link, to } = await letterAbout(visitId, "visit-asked");
    expect(to).toBe(contact.email);
    const seen = await getAsked({ actor: link, now: NOW }, {});
    expect(seen).toMatchObject({ visit: { id: visitId }, ask: { answer: null }, moved: false });
    expect(seen.visit.crew).toHaveLength(1);
    await answerVisit({ actor: link, now: NOW }, { answer: "acknowledged", permitNumber: "SD-1", note: "" });
    const [ask] = await rowsOf((tx) => tx.select().from(visitAsks).where(eq(visitAsks.visitId, visitId)));
    expect(ask).toMatchObject({ answer: "acknowledged", channel: "link", permitNumber: "SD-1", answeredAt: NOW });
    const again = await refusal(answerVisit({ actor: link, now: NOW }, { answer: "declined" }));
    expect(again.message).toBe("This has been answered already");
    expect((await getAsked({ actor: link, now: NOW }, {})).ask.answer).toBe("acknowledged");
  });

  test("a link shows its own ask alone, and answers no other", async () => {
    const other = await newContact(w.company, w.customer.customerId, { siteIds: [siteId] });
    const { visitId } = await plan(await licensed(), { ask: [contact.contactId, other.contactId] });
    const { link } = await letterAbout(visitId, "visit-asked");
    const seen = await asActor(link, (tx) => tx.select({ email: visitAsks.email }).from(visitAsks), "read");
    expect(seen).toHaveLength(1);
  });

  test("signed in, a contact sees what waits and answers it", async () => {
    const { visitId } = await plan(await licensed(), { ask: [contact.contactId] });
    const waiting = (await getPortal(contact.context, {})).visits.find((visit) => visit.id === visitId);
    await answerVisit(contact.context, { askId: waiting?.ask?.id, answer: "declined", note: "exams" });
    const { asks } = await getVisit(w.dispatcher.context, { visitId });
    expect(asks).toMatchObject([{ answer: "declined", channel: "portal", note: "exams" }]);
  });

  test("by telephone, written down by the dispatcher: who, when, how, which permit", async () => {
    const { visitId } = await plan(await licensed());
    await recordAnswer(w.dispatcher.context, {
      visitId,
      name: "Chief engineer Abara",
      answeredLocal: "2026-12-01T10:15",
      channel: "telephone",
      answer: "acknowledged",
      permitNumber: "HW-12",
    });
    const { asks } = await getVisit(w.dispatcher.context, { visitId });
    expect(asks).toMatchObject([
      {
        name: "Chief engineer Abara",
        answeredAt: new Date("2026-12-01T16:15:00Z"),
        channel: "telephone",
        permitNumber: "HW-12",
      },
    ]);
  });

  test("somebody who does not speak for the site cannot be asked", async () => {
    const { visitId } = await plan(await licensed());
    const error = await refusal(askForVisit(w.dispatcher.context, { visitId, contactIds: [w.otherContact.contactId] }));
    expect(error.code).toBe("not_found");
  });
});

describe("moving", () => {
  test("asks anew under the next sequence; the old link ends and says why", async () => {
    const { visitId } = await plan(await licensed(), { ask: [contact.contactId] });
    const old = await letterAbout(visitId, "visit-asked");
    await answerVisit({ actor: old.link, now: NOW }, { answer: "acknowledged" });
    const to = await licensed();
    const move = { visitId, sequence: 0, startsLocal: "2026-12-09T05:30", crew: [to.memberId] };
    await moveVisit(w.dispatcher.context, move);
    const moved = await letterAbout(visitId, "visit-moved");
    expect(moved.props.calendar.sequence).toBe(1);
    expect((await refusal(getAsked({ actor: old.link, now: NOW }, {}))).code).toBe("unauthenticated");
    expect(await endedVisitLink(old.token)).toMatchObject({ reason: "moved", companyName: w.company.name });
    expect((await getAsked({ actor: moved.link, now: NOW }, {})).ask.answer).toBeNull();
    const [block] = await rowsOf((tx) => tx.select().from(liveBlocks).where(eq(liveBlocks.visitId, visitId)));
    expect(block?.startsLocal).toBe("2026-12-09T06:30");
    const crew = await rowsOf((tx) => tx.select().from(visitCrew).where(eq(visitCrew.visitId, visitId)));
    expect(crew.filter((row) => row.releasedAt === null).map((row) => row.memberId)).toEqual([to.memberId]);
    expect(crew).toHaveLength(2);
  });

  test("of a visit that somebody changed meanwhile is refused", async () => {
    const { visitId } = await plan(await licensed());
    await moveVisit(w.dispatcher.context, { visitId, sequence: 0, startsLocal: "2026-12-09T05:00" });
    const error = await refusal(
      moveVisit(w.dispatcher.context, { visitId, sequence: 0, startsLocal: "2026-12-10T05:00" }),
    );
    expect(error).toMatchObject({ code: "conflict", message: expect.stringMatching(/meanwhile/) });
  });

  test("a visit within its own old time is in nobody's way", async () => {
    const { visitId } = await plan(await licensed());
    await moveVisit(w.dispatcher.context, { visitId, sequence: 0, startsLocal: "2026-12-08T05:30" });
    expect((await visitRow(visitId))?.startsLocal).toBe("2026-12-08T05:30");
  });
});

describe("swapping", () => {
  test("two visits at the same time exchange their crews in one step", async () => {
    const [one, other] = [await licensed(), await licensed()];
    const [a, b] = [await plan(one), await plan(other)];
    await swapVisits(w.dispatcher.context, {
      first: { visitId: a.visitId, sequence: 0 },
      second: { visitId: b.visitId, sequence: 0 },
      exchange: "crews",
    });
    const leadOf = async (visitId: string) =>
      (await getVisit(w.dispatcher.context, { visitId })).crew.map((person) => person.memberId);
    expect(await leadOf(a.visitId)).toEqual([other.memberId]);
    expect(await leadOf(b.visitId)).toEqual([one.memberId]);
  });

  test("two visits of one person exchange times, unless they would then overlap", async () => {
    const lead = await licensed();
    const short = await plan(lead, { startsLocal: "2026-12-08T05:00", minutes: 120 });
    const long = await plan(lead, { startsLocal: "2026-12-08T07:00", minutes: 240, liveBlocks: [] });
    const both = { first: { visitId: short.visitId, sequence: 0 }, second: { visitId: long.visitId, sequence: 0 } };
    const error = await refusal(swapVisits(w.dispatcher.context, { ...both, exchange: "times" }));
    expect(error.fieldErrors.crew?.[0]).toMatch(/ is at /);
    expect((await visitRow(short.visitId))?.startsLocal).toBe("2026-12-08T05:00");
  });
});

describe("canceling", () => {
  test("frees the crew, tells who was asked, and ends the link", async () => {
    const lead = await licensed();
    const { visitId, jobId } = await plan(lead, { ask: [contact.contactId] });
    const old = await letterAbout(visitId, "visit-asked");
    const { placing } = await cancelVisit(w.dispatcher.context, { visitId, reason: "The window was withdrawn" });
    const letter = await letterAbout(visitId, "visit-canceled");
    expect(letter.props).toMatchObject({ reason: "The window was withdrawn", calendar: { sequence: 1 } });
    expect(await endedVisitLink(old.token)).toMatchObject({ reason: "canceled" });
    expect(await visitRow(visitId)).toMatchObject({ sequence: 1, cancelReason: "The window was withdrawn" });
    // Undone: the same once more, for the same person at the same time.
    await planVisit(w.dispatcher.context, { jobId, ...placing });
    const crew = await rowsOf((tx) =>
      tx
        .select()
        .from(visitCrew)
        .where(and(eq(visitCrew.memberId, lead.memberId))),
    );
    expect(crew.filter((row) => row.releasedAt === null)).toHaveLength(1);
  });
});
