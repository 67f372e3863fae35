import type { Role } from "@/lib/domain/shared/roles";
import { DEMO_COMPANY, DEMO_PASSWORD, OFFICE_PEOPLE, TECHNICIANS } from "./people";
import { CUSTOMERS } from "./places";

export const addressOf = (mail: string): string => `${mail}@stillwater.example`;
export const contactAddress = (mail: string): string => `facilities@${mail}.example`;

/** Contacts who can sign in: one sees all sites of the customer, one a single site. */
export const PORTAL_CUSTOMERS = [0, 2, 5] as const;

/** One account of each role, for the sign-in page in demo mode and for the launcher's last lines. */
export function demoAccounts(): { role: Role; email: string; password: string }[] {
  const of = (role: Role) => OFFICE_PEOPLE.find((person) => person.role === role)?.email ?? "";
  const accounts: { role: Role; email: string }[] = [
    { role: "dispatcher", email: of("dispatcher") },
    { role: "technician", email: addressOf(TECHNICIANS[0]?.mail ?? "") },
    { role: "bookkeeper", email: of("bookkeeper") },
    { role: "owner", email: DEMO_COMPANY.ownerEmail },
    { role: "customer", email: contactAddress(CUSTOMERS[0]?.mail ?? "") },
  ];
  return accounts.map((account) => ({ ...account, password: DEMO_PASSWORD }));
}
