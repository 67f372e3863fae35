import { eq } from "drizzle-orm";
import { asActor } from "@/db/door";
import { members } from "@/db/schema/people";
import type { Role } from "@/lib/domain/shared/roles";
import { listAudit } from "@/lib/services/audit/list-audit";
import type { Context } from "@/lib/services/command";
import { updateCompany } from "@/lib/services/company/update-company";
import { foundCompany } from "@/lib/services/people/found-company";
import { demoAccounts } from "./accounts";
import { agreeWithCustomers } from "./agreements";
import { takeCalls } from "./calls";
import { addCustomers, hireOffice, hireTechnicians } from "./company";
import { planLiveTests } from "./live-visits";
import { DEMO_COMPANY, DEMO_PASSWORD } from "./people";
import { acceptLetter, signedIn } from "./sign-up";
import { recordSiteFacts } from "./site-facts";
import { addDemoSystem } from "./system";
import { planWork } from "./work";

/** The last verb of loading: its audit entry says that the demo company is whole. */
const LAST_VERB = "company.update";

async function state(): Promise<"absent" | "unfinished" | "whole"> {
  const owner = await asMember("owner", new Date()).catch(() => null);
  if (!owner) return "absent";
  return (await listAudit(owner, { q: LAST_VERB })).total > 0 ? "whole" : "unfinished";
}

async function load(now: Date): Promise<void> {
  const { companyId } = DEMO_COMPANY;
  const { userId } = await foundCompany({ actor: { kind: "operator", companyId }, now }, DEMO_COMPANY);
  await acceptLetter(DEMO_COMPANY.ownerEmail, now);
  const owner: Context = { actor: await signedIn(userId, now), now };
  await hireOffice(owner);
  const technicians = await hireTechnicians(owner);
  const siteIds = await addCustomers(owner);
  const dispatcher = await asMember("dispatcher", now);
  const visits = await planWork(dispatcher, technicians, siteIds);
  const tests = await agreeWithCustomers(dispatcher);
  await takeCalls(dispatcher, siteIds);
  await planLiveTests(dispatcher, siteIds);
  await recordSiteFacts(dispatcher, siteIds);
  await addDemoSystem(dispatcher, siteIds[0]);
  const { companyId: _, ownerName, ownerEmail, ...company } = DEMO_COMPANY;
  await updateCompany(owner, company);
  console.log(
    `Demo company ${company.name}: ${technicians.length} technicians, ${siteIds.length} sites, ${visits} visits, ${tests} agreed tests`,
  );
}

async function asMember(role: Role, now: Date): Promise<Context> {
  const { companyId } = DEMO_COMPANY;
  const [member] = await asActor(
    { kind: "worker", companyId },
    (tx) => tx.select({ userId: members.userId }).from(members).where(eq(members.role, role)),
    "read",
  );
  if (!member?.userId) throw new Error(`the demo company has no ${role}`);
  return { actor: await signedIn(member.userId, now), now };
}

const found = await state();
if (found === "unfinished") throw new Error("The demo data was cut off halfway: start again with an empty database");
if (found === "absent") await load(new Date());
console.log(`\nDemo accounts, all with the password ${DEMO_PASSWORD}`);
for (const { role, email } of demoAccounts()) console.log(`  ${role.padEnd(12)}${email}`);
process.exit(0);
