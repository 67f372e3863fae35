import { and, eq } from "drizzle-orm";
import { v7 as uuidv7 } from "uuid";
import type { Tx } from "@/db/client";
import { visitAsks, visits } from "@/db/schema/visits";
import type { Entered } from "@/lib/auth/actor";
import type { MailTemplate } from "@/lib/domain/messages/events";
import { paths } from "@/lib/domain/shared/paths";
import type { VisitLetter } from "@/lib/domain/visits/letter";
import { AppError, notFound } from "@/lib/errors";
import { makeLink, withdrawLinks } from "@/lib/services/links";
import { mail } from "@/lib/services/outbox";
import { contactsOfSites } from "@/lib/services/sites/site-contacts";
import { letterOf } from "./letter";

type Visit = typeof visits.$inferSelect;
type Ask = typeof visitAsks.$inferSelect;
type Letter = Omit<VisitLetter, "contactName">;
type Wording = (letter: VisitLetter) => MailTemplate;

export const asksAt = (tx: Tx, visitId: string, sequence: number): Promise<Ask[]> =>
  tx
    .select()
    .from(visitAsks)
    .where(and(eq(visitAsks.visitId, visitId), eq(visitAsks.sequence, sequence)));

/** A link of one ask, good until the visit is over, in a letter; those without an address are called. */
async function send(tx: Tx, who: Entered, ask: Pick<Ask, "id" | "name" | "email">, letter: Letter, word: Wording) {
  if (!ask.email) return;
  const expiresAt = new Date(letter.calendar.endsAt);
  const token = await makeLink(tx, who, { grant: "visit:answer", subjectId: ask.id, expiresAt });
  await mail(tx, who, ask.email, word({ ...letter, contactName: ask.name }), paths.visitLink(token));
}

const asked: Wording = (letter) => ({ template: "visit-asked", ...letter });

/**
 * Asks those who speak for the site to agree to the visit as it stands. Who has been asked and has not answered gets a
 * new letter, whose link takes the place of the one before; who has answered is left in peace.
 */
export async function askContacts(tx: Tx, who: Entered, visitId: string, contactIds: string[] | undefined, now: Date) {
  const [visit] = await tx.select().from(visits).where(eq(visits.id, visitId)).for("update");
  if (!visit) throw notFound("visit");
  if (visit.canceledAt) throw new AppError("conflict", "This visit is canceled");
  if (visit.endsAt <= now) throw new AppError("blocked", "This visit is over");
  const speakers = await contactsOfSites(tx, [visit.siteId], now);
  const contacts = contactIds ? speakers.filter(({ id }) => contactIds.includes(id)) : speakers;
  if (contactIds && contacts.length !== new Set(contactIds).size)
    throw new AppError("not_found", "One of them does not speak for this site", { ask: ["Choose who speaks for it"] });
  if (contacts.length === 0) throw new AppError("blocked", "Nobody speaks for this site yet: add a contact first");
  const before = await asksAt(tx, visitId, visit.sequence);
  const askOf = (contactId: string) => before.find((ask) => ask.contactId === contactId);
  const open = contacts.filter(({ id }) => !askOf(id)?.answer);
  if (open.length === 0) throw new AppError("conflict", "Everybody has answered already");
  const rows = open.map(({ id, name, email }) => ({
    id: askOf(id)?.id ?? uuidv7(),
    companyId: who.companyId,
    visitId,
    sequence: visit.sequence,
    contactId: id,
    name,
    email,
  }));
  await tx.insert(visitAsks).values(rows).onConflictDoNothing();
  await withdrawLinks(
    tx,
    rows.map(({ id }) => id),
    "visit:answer",
    now,
  );
  const letter = await letterOf(tx, visitId, now);
  for (const row of rows) await send(tx, who, row, letter, asked);
  return rows.map(({ id, name, email }) => ({ askId: id, name, byMail: email !== null }));
}

/** A visit that has changed: what was asked before counts no longer, and everybody is asked anew. */
export async function askAgain(tx: Tx, who: Entered, before: Visit, now: Date): Promise<void> {
  const old = await asksAt(tx, before.id, before.sequence);
  if (old.length === 0) return;
  await withdrawLinks(
    tx,
    old.map(({ id }) => id),
    "visit:answer",
    now,
  );
  const rows = old.map(({ companyId, visitId, contactId, name, email }) => ({
    id: uuidv7(),
    companyId,
    visitId,
    sequence: before.sequence + 1,
    contactId,
    name,
    email,
  }));
  await tx.insert(visitAsks).values(rows);
  const letter = await letterOf(tx, before.id, now);
  const moved: Wording = (to) => ({
    template: "visit-moved",
    ...to,
    before: { startsLocal: before.startsLocal, endsLocal: before.endsLocal },
  });
  for (const row of rows) await send(tx, who, row, letter, moved);
}

/** Before the visit itself is canceled: everybody who was asked hears that it does not take place. */
export async function tellCanceled(tx: Tx, who: Entered, visit: Visit, reason: string, now: Date): Promise<void> {
  const old = await asksAt(tx, visit.id, visit.sequence);
  if (old.length === 0) return;
  await withdrawLinks(
    tx,
    old.map(({ id }) => id),
    "visit:answer",
    now,
  );
  const { calendar, ...letter } = await letterOf(tx, visit.id, now);
  for (const { email, name: contactName } of old) {
    if (!email) continue;
    const canceled = { ...calendar, sequence: visit.sequence + 1 };
    const props = { ...letter, contactName, calendar: canceled, reason };
    await mail(tx, who, email, { template: "visit-canceled", ...props }, paths.home);
  }
}
