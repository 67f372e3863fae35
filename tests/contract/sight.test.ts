import { and, eq, isNull } from "drizzle-orm";
import { beforeAll, describe, expect, test } from "vitest";
import { asActor } from "@/db/door";
import { licenses } from "@/db/schema/people";
import { visitCrew } from "@/db/schema/visits";
import { recordLicense } from "@/lib/services/people/record-license";
import { setHome } from "@/lib/services/people/set-home";
import { cancelVisit } from "@/lib/services/visits/cancel-visit";
import { hire, NOW, type Person } from "../factories/company";
import { deadLetter } from "../factories/messages";
import { rowsSeen, seen } from "../factories/sight";
import { newContact, newCustomer, newSite, newVisit, newWorld, type World } from "../factories/world";

/** What is the company's own business: how it earns, whom it trusts, what it wrote down about others. */
const INTERNAL = ["customer_notes", "audit_entries", "outbox", "messages", "message_secrets", "links", "series"];

let w: World;
beforeAll(async () => {
  w = await newWorld();
  await recordLicense(w.owner.context, {
    memberId: w.otherTechnician.memberId,
    kind: "Fire alarm technician",
    number: "IL-1",
    jurisdiction: "IL",
    expiresOn: "2027-06-30",
  });
  await setHome(w.owner.context, {
    memberId: w.otherTechnician.memberId,
    street: "9 Home Street",
    city: "Chicago",
    state: "IL",
    postalCode: "60601",
  });
  await deadLetter(w.company.companyId);
});

test("there is something in every internal table that could be seen", async () => {
  for (const table of INTERNAL.filter((name) => name !== "message_secrets")) {
    expect(await rowsSeen(w.owner.actor, table), table).not.toEqual([]);
  }
});

describe("a technician", () => {
  test("sees the site, visit, job and customer of assigned work, and no others", async () => {
    const { actor } = w.technician;
    expect(await seen(actor, "sites")).toEqual([w.site.siteId]);
    expect(await seen(actor, "visits")).toEqual([w.visit.visitId]);
    expect(await seen(actor, "jobs")).toEqual([w.visit.jobId]);
    expect(await seen(actor, "customers")).toEqual([w.customer.customerId]);
    expect(await seen(actor, "site_access", "site_id")).toEqual([w.site.siteId]);
    expect(await seen(actor, "site_holders", "site_id")).toEqual([w.site.siteId]);
  });

  test("sees the contacts who speak for the site, and no others", async () => {
    const elsewhere = await newContact(w.company, w.customer.customerId, { siteIds: [w.secondSite.siteId] });
    const ids = await seen(w.technician.actor, "contacts");
    expect(ids).toEqual([w.contact.contactId, w.allSitesContact.contactId].sort());
    expect(ids).not.toContain(elsewhere.contactId);
  });

  test("without work sees nothing of any customer", async () => {
    for (const table of ["sites", "visits", "jobs", "customers", "contacts", "site_access", "site_holders"]) {
      expect(await rowsSeen(w.otherTechnician.actor, table), table).toEqual([]);
    }
  });

  test("sees nothing internal, and of colleagues the name alone", async () => {
    const { actor, memberId } = w.technician;
    for (const table of INTERNAL) expect(await rowsSeen(actor, table), table).toEqual([]);
    expect(await seen(actor, "member_details", "member_id")).toEqual([memberId]);
    expect(await rowsSeen(actor, "licenses")).toEqual([]);
    expect(await seen(actor, "members")).toContain(w.otherTechnician.memberId);
  });

  test("does not meet customers' people among the colleagues", async () => {
    const members = await seen(w.technician.actor, "members");
    for (const contact of [w.contact, w.otherContact]) expect(members).not.toContain(contact.memberId);
  });

  test("keeps sight of work that went to somebody else, with what is needed for it", async () => {
    const [first, second] = [await hire(w.company, "technician"), await hire(w.company, "technician")];
    const { visitId } = await newVisit(w.company, w.otherSite.siteId, [first], "2026-12-03T08:00", "2026-12-03T10:00");
    await handOver(visitId, first, second);
    for (const one of [first, second]) {
      expect(await seen(one.actor, "visits")).toEqual([visitId]);
      expect(await seen(one.actor, "sites")).toEqual([w.otherSite.siteId]);
      expect(await seen(one.actor, "customers")).toEqual([w.otherCustomer.customerId]);
    }
  });

  test("keeps sight of a visit that was canceled", async () => {
    const technician = await hire(w.company, "technician");
    const { visitId } = await newVisit(
      w.company,
      w.otherSite.siteId,
      [technician],
      "2026-12-04T08:00",
      "2026-12-04T10:00",
    );
    await cancelVisit(w.owner.context, { visitId, reason: "The building is closed" });
    expect(await seen(technician.actor, "visits")).toEqual([visitId]);
  });

  test("does not see who held the site before", async () => {
    const former = await newCustomer(w.company);
    const site = await newSite(w.company, former.customerId, { fromDate: "2015-01-01", toDate: "2020-12-31" });
    const technician = await hire(w.company, "technician");
    await newVisit(w.company, site.siteId, [technician], "2026-12-05T08:00", "2026-12-05T10:00");
    expect(await seen(technician.actor, "sites")).toEqual([site.siteId]);
    expect(await seen(technician.actor, "customers")).toEqual([]);
  });

  test("cannot change what is only seen", async () => {
    const changed = await asActor(
      w.technician.actor,
      (tx) => tx.update(visitCrew).set({ lead: false }).returning(),
      "write",
    );
    expect(changed).toEqual([]);
    const added = asActor(
      w.technician.actor,
      (tx) =>
        tx.insert(licenses).values({
          companyId: w.company.companyId,
          memberId: w.technician.memberId,
          kind: "Master",
          number: "forged",
          jurisdiction: "IL",
          expiresOn: "2099-01-01",
        }),
      "write",
    );
    await expect(added).rejects.toMatchObject({ cause: { code: "42501" } });
  });
});

/** As a change of crew does it: the row of the one is released, the other gets a row. */
const handOver = (visitId: string, from: Person, to: Person) =>
  asActor(
    w.dispatcher.actor,
    async (tx) => {
      const released = await tx
        .update(visitCrew)
        .set({ releasedAt: NOW })
        .where(and(eq(visitCrew.visitId, visitId), eq(visitCrew.memberId, from.memberId), isNull(visitCrew.releasedAt)))
        .returning();
      for (const { id: _, releasedAt: __, memberId: ___, ...row } of released)
        await tx.insert(visitCrew).values({ ...row, memberId: to.memberId });
    },
    "write",
  );

describe("a contact", () => {
  test("with a site set sees those sites, what happens there and who comes", async () => {
    const { actor } = w.contact;
    expect(await seen(actor, "sites")).toEqual([w.site.siteId]);
    expect(await seen(actor, "visits")).toContain(w.visit.visitId);
    expect(await seen(actor, "visits", "site_id")).toEqual([w.site.siteId]);
    expect(await seen(actor, "jobs", "site_id")).toEqual([w.site.siteId]);
    expect(await seen(actor, "site_holders", "site_id")).toEqual([w.site.siteId]);
    expect(await seen(actor, "members")).toEqual([w.contact.memberId, w.technician.memberId].sort());
  });

  test("for all sites sees every site that the customer holds, and no other customer's", async () => {
    const sites = await seen(w.allSitesContact.actor, "sites");
    expect(sites).toEqual([w.site.siteId, w.secondSite.siteId].sort());
    expect(await seen(w.allSitesContact.actor, "customers")).toEqual([w.customer.customerId]);
    expect(await seen(w.otherContact.actor, "sites")).toEqual([w.otherSite.siteId]);
  });

  test("sees nothing internal", async () => {
    const { actor, memberId, contactId } = w.allSitesContact;
    for (const table of [...INTERNAL, "site_access", "licenses"])
      expect(await rowsSeen(actor, table), table).toEqual([]);
    expect(await seen(actor, "member_details", "member_id")).toEqual([memberId]);
    expect(await seen(actor, "contacts")).toEqual([contactId]);
  });

  test("cannot widen the site set", async () => {
    const widened = asActor(
      w.contact.actor,
      (tx) =>
        tx.execute(
          `insert into contact_sites values ('${w.company.companyId}', '${w.contact.contactId}', '${w.otherSite.siteId}')`,
        ),
      "write",
    );
    await expect(widened).rejects.toMatchObject({ cause: { code: "42501" } });
  });
});
