import { stepsFrom } from "@/lib/domain/agreements/due-window";
import { type Frequency, FUNCTIONS_OF_TEST, type TestKind } from "@/lib/domain/agreements/words";
import { addDays, calendarDate } from "@/lib/domain/shared/zone";
import { addItem } from "@/lib/services/agreements/add-item";
import { createAgreement } from "@/lib/services/agreements/create-agreement";
import type { Context } from "@/lib/services/command";
import { getCustomer } from "@/lib/services/customers/get-customer";
import { listCustomers } from "@/lib/services/customers/list-customers";
import { getSite } from "@/lib/services/sites/get-site";
import { DEMO_COMPANY } from "./people";

type Test = { testKind: TestKind; frequency: Frequency; visitMinutes: number; crewSize: number; price: string };

const YEARLY: readonly Test[] = [
  { testKind: "fan_shutdown", frequency: "annual", visitMinutes: 300, crewSize: 2, price: "1,850.00" },
  { testKind: "detectors", frequency: "annual", visitMinutes: 420, crewSize: 2, price: "2,400.00" },
  { testKind: "whole_system", frequency: "annual", visitMinutes: 480, crewSize: 2, price: "3,150.00" },
];
const MORE: readonly Test[] = [
  { testKind: "waterflow", frequency: "semiannual", visitMinutes: 90, crewSize: 1, price: "320.00" },
  { testKind: "batteries", frequency: "semiannual", visitMinutes: 60, crewSize: 1, price: "185.50" },
  { testKind: "visual", frequency: "quarterly", visitMinutes: 120, crewSize: 1, price: "240.00" },
];

/** Days since the last one, as a part of the step: long past, in the window, about to open, just done, not known. */
const SINCE = [1.32, 0.95, 0.88, 0.7, 0.3, 0.08, null] as const;
const DAYS: Partial<Record<Frequency, number>> = { annual: 365, semiannual: 182, quarterly: 91 };

/** An agreement with every customer, at every stage of its year. */
export async function agreeWithCustomers(dispatcher: Context): Promise<number> {
  const today = calendarDate(dispatcher.now, DEMO_COMPANY.zone);
  const { rows } = await listCustomers(dispatcher, { pageSize: 1000 });
  let count = 0;
  for (const [i, { id: customerId, name }] of rows.entries()) {
    const { holdings } = await getCustomer(dispatcher, { customerId });
    const siteIds = [...new Set(holdings.map(({ site }) => site.id))];
    const { agreementId } = await createAgreement(dispatcher, {
      customerId,
      name: `Testing, ${name}`,
      startsOn: "2024-01-01",
      // One runs out before its next test, one asks for a purchase order each time, one gave one for all.
      endsOn: i === 3 ? addDays(today, 20) : null,
      purchaseOrderNeeded: i % 4 === 1,
      purchaseOrder: i === 5 ? "BPO-2024-118" : null,
    });
    for (const [k, siteId] of siteIds.entries()) {
      const { kind } = await getSite(dispatcher, { siteId });
      for (const test of [YEARLY[(i + k) % YEARLY.length], MORE[(i * 2 + k) % MORE.length]]) {
        if (!test) continue;
        await addItem(dispatcher, { agreementId, siteId, ...facts(test, count, kind === "hospital", today) });
        count++;
      }
    }
  }
  return count;
}

function facts(test: Test, count: number, isHospital: boolean, today: string) {
  const since = SINCE[count % SINCE.length] ?? null;
  const lastDoneOn = since === null ? null : addDays(today, -Math.round(since * (DAYS[test.frequency] ?? 365)));
  return {
    ...test,
    functions: [...FUNCTIONS_OF_TEST[test.testKind]],
    rule: isHospital ? "hospital_by_day" : "nfpa_72",
    anchor: count % 3 === 0 ? "last_done" : "fixed",
    anchorOn: lastDoneOn ? stepsFrom(lastDoneOn, test.frequency, 1) : addDays(today, 30),
    lastDoneOn,
  };
}
