import { addContact } from "@/lib/services/customers/add-contact";
import { createCustomer } from "@/lib/services/customers/create-customer";
import { inviteContact } from "@/lib/services/customers/invite-contact";
import { createJob } from "@/lib/services/jobs/create-job";
import { addHolder } from "@/lib/services/sites/add-holder";
import { createSite } from "@/lib/services/sites/create-site";
import { planVisit } from "@/lib/services/visits/plan-visit";
import { type Company, hire, newCompany, type Person, person, unique, uniqueAddress } from "./company";

export async function newCustomer(company: Company): Promise<{ customerId: string; name: string }> {
  const name = unique("Customer");
  const { customerId } = await createCustomer(company.owner.context, { name, note: `internal of ${name}` });
  return { customerId, name };
}

type Span = { fromDate: string; toDate?: string };

export async function newSite(company: Company, customerId: string, span: Span = { fromDate: "2020-01-01" }) {
  const name = unique("Site");
  const { siteId } = await createSite(company.owner.context, {
    name,
    kind: "school",
    street: unique("Street"),
    city: "Chicago",
    state: "IL",
    postalCode: "60601",
    zone: "America/Chicago",
    accessNote: `access of ${name}`,
  });
  const { holderId } = await addHolder(company.owner.context, { siteId, customerId, capacity: "owner", ...span });
  return { siteId, holderId, name };
}

type Reach = { allSites: true } | { siteIds: string[] };

/** A contact who can sign in. */
export async function newContact(company: Company, customerId: string, reach: Reach) {
  const email = uniqueAddress();
  const { contactId } = await addContact(company.owner.context, {
    customerId,
    name: unique("Contact"),
    email,
    phone: "312-555-0101",
    ...reach,
  });
  const { memberId } = await inviteContact(company.owner.context, { contactId });
  return { ...(await person(company.companyId, memberId, email)), contactId };
}

const minutesBetween = (startsLocal: string, endsLocal: string) =>
  (Date.parse(`${endsLocal}Z`) - Date.parse(`${startsLocal}Z`)) / 60_000;

/** Where licenses are not what a test is about. */
export const UNLICENSED = [{ code: "license_missing", note: "not what this is about" }];

/** Hours of a day that no other visit of the same crew takes. */
export async function newVisit(
  company: Company,
  siteId: string,
  crew: Person[],
  startsLocal: string,
  endsLocal: string,
) {
  const { jobId } = await createJob(company.owner.context, { siteId, kind: "test", title: unique("Job") });
  const { visitId } = await planVisit(company.owner.context, {
    jobId,
    startsLocal,
    minutes: minutesBetween(startsLocal, endsLocal),
    crew: crew.map((one) => one.memberId),
    overrides: UNLICENSED,
  });
  return { jobId, visitId };
}

/** One company with everybody and a bit of everything. */
export async function newWorld() {
  const company = await newCompany();
  const dispatcher = await hire(company, "dispatcher");
  const bookkeeper = await hire(company, "bookkeeper");
  const technician = await hire(company, "technician");
  const otherTechnician = await hire(company, "technician");
  const customer = await newCustomer(company);
  const otherCustomer = await newCustomer(company);
  const site = await newSite(company, customer.customerId);
  const secondSite = await newSite(company, customer.customerId);
  const otherSite = await newSite(company, otherCustomer.customerId);
  const contact = await newContact(company, customer.customerId, { siteIds: [site.siteId] });
  const allSitesContact = await newContact(company, customer.customerId, { allSites: true });
  const otherContact = await newContact(company, otherCustomer.customerId, { allSites: true });
  const visit = await newVisit(company, site.siteId, [technician], "2026-12-02T08:00", "2026-12-02T12:00");
  return {
    company,
    owner: company.owner,
    dispatcher,
    bookkeeper,
    technician,
    otherTechnician,
    customer,
    otherCustomer,
    site,
    secondSite,
    otherSite,
    contact,
    allSitesContact,
    otherContact,
    visit,
  };
}
export type World = Awaited<ReturnType<typeof newWorld>>;
