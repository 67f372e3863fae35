import { addDays, calendarDate } from "@/lib/domain/shared/zone";
import type { Context } from "@/lib/services/command";
import { addContact } from "@/lib/services/customers/add-contact";
import { createCustomer } from "@/lib/services/customers/create-customer";
import { inviteContact } from "@/lib/services/customers/invite-contact";
import { inviteStaff } from "@/lib/services/people/invite-staff";
import { recordLicense } from "@/lib/services/people/record-license";
import { setHome } from "@/lib/services/people/set-home";
import { addHolder } from "@/lib/services/sites/add-holder";
import { createSite } from "@/lib/services/sites/create-site";
import { addressOf, contactAddress, PORTAL_CUSTOMERS } from "./accounts";
import { DEMO_COMPANY, OFFICE_PEOPLE, TECHNICIANS } from "./people";
import { CITIES, CUSTOMERS, type DemoCustomer } from "./places";
import { acceptLetter } from "./sign-up";

const phone = (n: number) => `360-555-01${String(n).padStart(2, "0")}`;

export async function hireOffice(owner: Context): Promise<void> {
  for (const person of OFFICE_PEOPLE) {
    await inviteStaff(owner, person);
    await acceptLetter(person.email, owner.now);
  }
}

export async function hireTechnicians(owner: Context): Promise<string[]> {
  const today = calendarDate(owner.now, DEMO_COMPANY.zone);
  const ids: string[] = [];
  for (const [i, { name, mail, licenseDays, ...home }] of TECHNICIANS.entries()) {
    const email = addressOf(mail);
    const { memberId } = await inviteStaff(owner, { name, email, role: "technician", phone: phone(10 + i) });
    await acceptLetter(email, owner.now);
    await setHome(owner, { ...home, memberId, state: "WA", postalCode: CITIES[home.city]?.postalCode ?? "98599" });
    await recordLicense(owner, {
      memberId,
      kind: "Fire alarm technician",
      number: `WA-FA-${4100 + i * 37}`,
      jurisdiction: "WA",
      expiresOn: addDays(today, licenseDays),
    });
    ids.push(memberId);
  }
  return ids;
}

export async function addCustomers(owner: Context): Promise<string[]> {
  const siteIds: string[] = [];
  for (const [i, customer] of CUSTOMERS.entries()) siteIds.push(...(await addCustomer(owner, customer, i)));
  return siteIds;
}

async function addCustomer(owner: Context, customer: DemoCustomer, i: number): Promise<string[]> {
  const city = CITIES[customer.city] ?? { postalCode: "98599", latitude: 46.97, longitude: -123.8 };
  const { customerId } = await createCustomer(owner, {
    name: customer.name,
    phone: phone(30 + i),
    billingStreet: customer.sites[0]?.street,
    billingCity: customer.city,
    billingState: "WA",
    billingPostalCode: city.postalCode,
  });
  const siteIds: string[] = [];
  for (const [k, site] of customer.sites.entries()) {
    const { siteId } = await createSite(owner, {
      name: site.name,
      kind: site.kind,
      street: site.street,
      accessNote: site.access,
      city: customer.city,
      state: "WA",
      postalCode: city.postalCode,
      zone: DEMO_COMPANY.zone,
      authorityName: `${customer.city} Fire Marshal`,
      authorityPhone: "360-555-0199",
      latitude: city.latitude + ((i * 7 + k * 3) % 11) * 0.002,
      longitude: city.longitude + ((i * 5 + k * 2) % 13) * 0.002,
    });
    for (const capacity of ["owner", "bill_to"]) {
      await addHolder(owner, { siteId, customerId, capacity, fromDate: "2019-01-01" });
    }
    siteIds.push(siteId);
  }
  const reach = { customerId, name: customer.contact, title: customer.title, phone: phone(60 + i) };
  const contact = await addContact(owner, { ...reach, email: contactAddress(customer.mail), allSites: true });
  await addContact(owner, {
    customerId,
    name: `Accounts payable, ${customer.name}`,
    title: "Accounts payable",
    email: `payable@${customer.mail}.example`,
    phone: null,
    allSites: false,
    siteIds: siteIds.slice(0, 1),
  });
  if ((PORTAL_CUSTOMERS as readonly number[]).includes(i)) {
    await inviteContact(owner, contact);
    await acceptLetter(contactAddress(customer.mail), owner.now);
  }
  return siteIds;
}
