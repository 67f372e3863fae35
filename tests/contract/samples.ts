import { v7 as uuidv7 } from "uuid";
import type { Actor } from "@/lib/auth/actor";
import { addContact } from "@/lib/services/customers/add-contact";
import { endMembership } from "@/lib/services/people/end-membership";
import { inviteStaff } from "@/lib/services/people/invite-staff";
import { addDocument } from "@/lib/services/sites/add-document";
import { addKey } from "@/lib/services/sites/add-key";
import { addStationAccount } from "@/lib/services/sites/add-station-account";
import { askForVisit } from "@/lib/services/visits/ask";
import { addAttendance } from "@/lib/services/windows/add-attendance";
import { addNoTest } from "@/lib/services/windows/add-no-test";
import { addWindow } from "@/lib/services/windows/add-window";
import { givePassword, secondSession, unique, uniqueAddress } from "../factories/company";
import { deadLetter } from "../factories/messages";
import { bareSystem, newSecret, smallSystem, systemWithMatrix } from "../factories/systems";
import { siteOfToday } from "../factories/today";
import { itemFacts, newItem, newJob, newWait } from "../factories/work";
import { newCustomer, newSite, newVisit, UNLICENSED, type World } from "../factories/world";

const address = { street: "2 Test Street", city: "Chicago", state: "IL", postalCode: "60601" };

const company = () => ({ ...address, name: unique("Company"), phone: "312-555-0100", zone: "America/Chicago" });

let day = 0;
/** A day of its own, so that samples never overlap. */
const nextDay = () =>
  `2027-${String(1 + Math.floor(++day / 27)).padStart(2, "0")}-${String(1 + (day % 27)).padStart(2, "0")}`;

type Sample = (world: World, caller?: Actor) => unknown | Promise<unknown>;

const PASSWORD = "correct horse battery";

/** An input that works, for every verb and read, made of rows of the given world, and of the caller's own where those count. */
export const SAMPLES: Record<string, Sample> = {
  "account.change-password": async (w, caller) => {
    await givePassword(caller ?? w.owner.actor, PASSWORD);
    return { currentPassword: PASSWORD, password: "another quiet evening" };
  },
  "account.end-session": async (w, caller) => ({ sessionId: await secondSession(caller ?? w.owner.actor) }),
  "account.enter-company": (w) => ({ companyId: w.company.companyId }),
  "account.get": () => ({}),
  "account.send-password-reset": (w) => ({ requestId: uuidv7(), memberId: w.technician.memberId }),
  "account.send-sign-in-link": (w) => ({ requestId: uuidv7(), memberId: w.technician.memberId }),
  "account.sign-out-everywhere": () => ({}),
  "agreement.add-item": async (w) => ({
    ...itemFacts(w),
    agreementId: (await newItem(w)).agreementId,
    lastDoneOn: "2026-03-15",
  }),
  "agreement.change-item": async (w) => ({
    ...itemFacts(w),
    itemId: (await newItem(w)).itemId,
    frequency: "semiannual",
  }),
  "agreement.create": (w) => ({ customerId: w.customer.customerId, name: unique("Agreement"), startsOn: "2026-01-01" }),
  "agreement.end": async (w) => ({ agreementId: (await newItem(w)).agreementId, endsOn: "2026-12-31" }),
  "agreement.end-item": async (w) => ({ itemId: (await newItem(w)).itemId }),
  "agreement.get": async (w) => ({ agreementId: (await newItem(w)).agreementId }),
  "agreement.list": () => ({}),
  "agreement.record-completion": async (w) => ({ itemId: (await newItem(w)).itemId, doneOn: "2026-11-30" }),
  "agreement.update": async (w) => ({
    agreementId: (await newItem(w)).agreementId,
    name: unique("Agreement"),
    startsOn: "2026-01-01",
    purchaseOrderNeeded: "on",
  }),
  "audit.list": () => ({}),
  "company.found": () => ({
    ...company(),
    companyId: uuidv7(),
    ownerName: unique("Owner"),
    ownerEmail: uniqueAddress(),
  }),
  "company.frame": () => ({}),
  "company.get": () => ({}),
  "company.overview": () => ({}),
  "company.update": company,
  "contact.add": (w) => ({
    customerId: w.customer.customerId,
    name: unique("Contact"),
    email: uniqueAddress(),
    siteIds: [w.site.siteId],
  }),
  "contact.end": async (w) => ({ contactId: await freshContact(w) }),
  "customer.choices": () => ({}),
  "customer.create": () => ({ name: unique("Customer"), note: "internal" }),
  "customer.get": (w) => ({ customerId: w.customer.customerId }),
  "customer.list": () => ({}),
  "customer.update": (w) => ({ customerId: w.customer.customerId, name: unique("Customer") }),
  "delivery.list-dead": () => ({}),
  "delivery.retry": async (w) => ({ outboxId: await deadLetter(w.company.companyId) }),
  "due.list": async (w) => {
    await newItem(w);
    return {};
  },
  "due.sweep": () => ({}),
  "field.day": () => ({}),
  "find.all": () => ({ q: "Site" }),
  "find.site": (w) => ({ siteId: w.site.siteId }),
  "job.cancel": async (w) => ({ jobId: await newJob(w), reason: "The building closes" }),
  "job.create": (w) => ({ siteId: w.site.siteId, kind: "test", title: unique("Job") }),
  "job.end-wait": async (w) => ({ waitId: await newWait(w) }),
  "job.get": (w) => ({ jobId: w.visit.jobId }),
  "job.list": () => ({}),
  "job.make-due": async (w) => ({ itemId: (await newItem(w)).itemId }),
  "job.record-done": async (w) => ({ jobId: await newJob(w), doneOn: "2026-11-30" }),
  "job.set-terms": async (w) => ({ jobId: await newJob(w), purchaseOrder: "PO 4711", limit: "1,250.00" }),
  "job.update": async (w) => ({ jobId: await newJob(w), kind: "repair", title: unique("Job"), urgent: "on" }),
  "job.wait": async (w) => ({ jobId: await newJob(w), waitsFor: "parts", person: "Parts counter" }),
  "password.reset": () => ({ password: PASSWORD }),
  "person.accept-invitation": () => ({ password: PASSWORD }),
  "person.change-role": async (w) => ({ memberId: await freshMember(w), role: "dispatcher" }),
  "person.end": async (w) => ({ memberId: await freshMember(w) }),
  "person.get": (w) => ({ memberId: w.technician.memberId }),
  "person.invite": () => ({ name: unique("Person"), email: uniqueAddress(), role: "technician" }),
  "person.invite-contact": async (w) => ({ contactId: await freshContact(w) }),
  "person.list": () => ({}),
  "person.record-license": (w) => ({
    memberId: w.technician.memberId,
    kind: "Fire alarm technician",
    number: unique("IL"),
    jurisdiction: "IL",
    expiresOn: "2027-06-30",
  }),
  "person.resend-invitation": (w) => ({ memberId: w.technician.memberId }),
  "person.restore": async (w) => {
    const memberId = await freshMember(w);
    await endMembership(w.owner.context, { memberId });
    return { memberId };
  },
  "person.set-home": (w) => ({ memberId: w.technician.memberId, ...address }),
  "portal.home": () => ({}),
  "matrix.get": async (w) => ({ systemId: (await systemWithMatrix(w)).systemId, version: "1" }),
  "matrix.save": async (w) => {
    const { systemId, cell } = await systemWithMatrix(w);
    return { systemId, basedOn: 1, note: "As found", removed: [cell], added: [{ ...cell, source: "as_found" }] };
  },
  "matrix.versions": async (w) => ({ systemId: (await systemWithMatrix(w)).systemId }),
  "secret.add": (w) => ({ siteId: w.site.siteId, kind: "door_code", label: unique("Door"), secret: "1234" }),
  "secret.end": async (w) => ({ secretId: await newSecret(w) }),
  "secret.look": async (w) => ({ secretId: await newSecret(w, await siteOfToday(w)) }),
  "site.add-document": (w) => ({ siteId: w.site.siteId, kind: "drawing", title: "As built", keptWhere: "Panel room" }),
  "site.add-holder": async (w) => ({
    siteId: w.site.siteId,
    customerId: (await newCustomer(w.company)).customerId,
    capacity: "occupant",
    fromDate: "2026-01-01",
  }),
  "site.add-key": (w) => ({ siteId: w.site.siteId, kind: "key", label: "Panel", keptBy: "Office, hook 7" }),
  "site.add-station-account": (w) => stationAccount(w),
  "site.create": () => ({ ...address, name: unique("Site"), kind: "office", zone: "America/Chicago" }),
  "site.end-document": async (w) => ({
    documentId: (
      await addDocument(w.owner.context, {
        siteId: w.site.siteId,
        kind: "program",
        title: unique("Program"),
        keptWhere: "File 7",
      })
    ).documentId,
  }),
  "site.end-holder": async (w) => ({
    holderId: (await newSite(w.company, w.customer.customerId)).holderId,
    toDate: "2026-12-31",
  }),
  "site.end-key": async (w) => ({ keyId: await newKey(w) }),
  "site.end-station-account": async (w) => ({
    stationAccountId: (await addStationAccount(w.owner.context, stationAccount(w))).stationAccountId,
  }),
  "site.facts": (w) => ({ siteId: w.site.siteId }),
  "site.hand-over-key": async (w) => ({ keyId: await newKey(w), keptBy: "Van 3" }),
  "site.get": (w) => ({ siteId: w.site.siteId }),
  "site.list": () => ({}),
  "site.update": (w) => ({
    ...address,
    siteId: w.site.siteId,
    name: w.site.name,
    kind: "school",
    zone: "America/Chicago",
  }),
  "system.add": (w) => ({ siteId: w.site.siteId, key: unique("S"), name: "Main panel" }),
  "system.change": async (w) => ({ systemId: await bareSystem(w), key: unique("S"), name: "Main panel, tower" }),
  "system.get": async (w) => ({ systemId: await bareSystem(w) }),
  "system.import": async (w) => ({ systemId: await bareSystem(w), files: [deviceFile] }),
  "system.list-points": async (w) => ({ systemId: (await smallSystem(w)).systemId, proof: "never", sort: "proven" }),
  "system.outputs": async (w) => ({ systemId: (await smallSystem(w)).systemId }),
  "system.preview-import": async (w) => ({ systemId: await bareSystem(w), files: [deviceFile] }),
  "system.put-back": async (w) => {
    const { systemId, pointId } = await smallSystem(w);
    return { systemId, entry: "point", id: pointId };
  },
  "system.remove": async (w) => {
    const { systemId, equipmentId } = await smallSystem(w);
    return { systemId, entry: "equipment", id: equipmentId, removedOn: "2026-12-01" };
  },
  "system.save-equipment": async (w) => {
    const { systemId, outputId, equipmentId } = await smallSystem(w);
    return { systemId, id: equipmentId, outputId, tag: "AHU-7", kind: "fan", action: "start", longestOffMinutes: "15" };
  },
  "system.save-group": async (w) => ({
    systemId: await bareSystem(w),
    key: "D",
    name: "Doors",
    function: "door_release",
  }),
  "system.save-output": async (w) => {
    const { systemId, groupId } = await smallSystem(w);
    return { systemId, groupId, address: "R2", kind: "relay", label: "AHU 2" };
  },
  "system.save-point": async (w) => {
    const { systemId, zoneId } = await smallSystem(w);
    return { systemId, zoneId, address: "1-002", kind: "heat", label: "Kitchen", walkOrder: "2" };
  },
  "system.save-zone": async (w) => ({ systemId: await bareSystem(w), key: "7", name: "Attic" }),
  "system.script": async (w) => ({ systemId: (await systemWithMatrix(w)).systemId }),
  "visit.cancel": async (w) => {
    const date = nextDay();
    const { visitId } = await newVisit(w.company, w.site.siteId, [w.technician], `${date}T08:00`, `${date}T09:00`);
    return { visitId, reason: "The building is closed" };
  },
  "visit.answer": async (w) => ({ askId: await freshAsk(w), answer: "acknowledged", permitNumber: "HW-7" }),
  "visit.ask": async (w) => ({ visitId: await freshVisit(w), contactIds: [w.contact.contactId] }),
  "visit.asked": async (w) => ({ askId: await freshAsk(w) }),
  "visit.get": (w) => ({ visitId: w.visit.visitId }),
  "visit.move": async (w) => ({
    visitId: await freshVisit(w),
    sequence: 0,
    startsLocal: `${nextDay()}T10:00`,
    overrides: UNLICENSED,
  }),
  "visit.places": (w) => ({ jobId: w.visit.jobId, date: "2026-12-02" }),
  "visit.plan": (w) => ({
    jobId: w.visit.jobId,
    startsLocal: `${nextDay()}T08:00`,
    minutes: 240,
    crew: [w.technician.memberId],
    overrides: UNLICENSED,
  }),
  "visit.reasons": (w) => ({
    jobId: w.visit.jobId,
    startsLocal: "2026-12-02T08:00",
    minutes: 60,
    crew: w.technician.memberId,
  }),
  "visit.record-answer": async (w) => ({
    visitId: await freshVisit(w),
    name: unique("Engineer"),
    answeredLocal: "2026-12-01T09:00",
    channel: "telephone",
    answer: "declined",
    note: "Exams that week",
  }),
  "visit.run-sheet": () => ({ date: "2026-12-02" }),
  "visit.swap": async (w) => ({
    first: { visitId: await freshVisit(w), sequence: 0 },
    second: { visitId: await freshVisit(w), sequence: 0 },
    exchange: "times",
    overrides: UNLICENSED,
  }),
  "window.add": (w) => window(w),
  "window.add-attendance": (w) => attendance(w),
  "window.add-no-test": (w) => noTest(w),
  "window.end": async (w) => ({ windowId: (await addWindow(w.owner.context, window(w))).windowId }),
  "window.end-attendance": async (w) => ({
    attendanceId: (await addAttendance(w.owner.context, attendance(w))).attendanceId,
  }),
  "window.end-no-test": async (w) => ({ noTestId: (await addNoTest(w.owner.context, noTest(w))).noTestId }),
};

const deviceFile = { name: "points.csv", content: "address,kind,label\r\n1-001,smoke,Lobby\r\n1-002,pull,Stair\r\n" };

const stationAccount = (w: World) => ({
  siteId: w.site.siteId,
  station: "Lakeside Central",
  phone: "312-555-0170",
  accountNumber: unique("A"),
});

const newKey = async (w: World) =>
  (await addKey(w.owner.context, { siteId: w.site.siteId, kind: "badge", label: unique("Badge"), keptBy: "Desk" }))
    .keyId;

const fans = (w: World) => ({ siteId: w.site.siteId, functions: ["fan_shutdown"] });
const window = (w: World) => ({ ...fans(w), weekdays: ["1"], startsLocal: "22:00", endsLocal: "06:00" });
const noTest = (w: World) => ({ ...fans(w), fromDate: "2026-12-14", toDate: "2026-12-18", reason: "Exams" });
const attendance = (w: World) => ({ ...fans(w), party: "Building engineer", contactId: w.contact.contactId });

const freshMember = async (w: World) =>
  (await inviteStaff(w.owner.context, { name: unique("Person"), email: uniqueAddress(), role: "technician" })).memberId;

const freshContact = async (w: World) =>
  (
    await addContact(w.owner.context, {
      customerId: w.customer.customerId,
      name: unique("Contact"),
      email: uniqueAddress(),
    })
  ).contactId;

async function freshVisit(w: World): Promise<string> {
  const date = nextDay();
  return (await newVisit(w.company, w.site.siteId, [w.technician], `${date}T08:00`, `${date}T09:00`)).visitId;
}

async function freshAsk(w: World): Promise<string> {
  const visitId = await freshVisit(w);
  const { asked } = await askForVisit(w.owner.context, { visitId, contactIds: [w.contact.contactId] });
  return asked[0]?.askId ?? "";
}
