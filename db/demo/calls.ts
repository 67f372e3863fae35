import { addDays, calendarDate } from "@/lib/domain/shared/zone";
import type { Context } from "@/lib/services/command";
import { createJob } from "@/lib/services/jobs/create-job";
import { setTerms } from "@/lib/services/jobs/set-terms";
import { waitFor } from "@/lib/services/jobs/wait-for";
import { DEMO_COMPANY } from "./people";

/** Calls that came by telephone and are not booked yet; the site counts along the demo company's own. */
const CALLS = [
  { site: 0, title: "Panel shows a ground fault since this morning", urgent: true, caller: "Renata Oduya" },
  { site: 8, title: "Strobe in the gymnasium stays dark", urgent: false, caller: "Lorna Quist" },
  { site: 14, title: "Trouble on loop 2 after the painters were in", urgent: false, caller: "Front desk" },
  { site: 21, title: "Duct detector on AHU-3 alarms when it rains", urgent: true, caller: "Building engineer" },
];

const REPAIRS = [
  {
    site: 4,
    title: "Replace the interface relay of evaporator fan EF-2",
    waitsFor: "parts",
    person: "Parts counter",
    days: 6,
  },
  { site: 11, title: "Move a smoke detector off the diffuser", waitsFor: "access", person: "House manager", days: 12 },
  { site: 17, title: "New batteries and charger board", waitsFor: "approval", person: "Accounts payable", days: -3 },
] as const;

/** What the morning brought: calls to book, and repairs that wait for somebody. */
export async function takeCalls(dispatcher: Context, siteIds: readonly string[]): Promise<void> {
  const today = calendarDate(dispatcher.now, DEMO_COMPANY.zone);
  const siteAt = (i: number) => siteIds[i % siteIds.length];
  for (const { site, title, urgent, caller } of CALLS) {
    await createJob(dispatcher, {
      siteId: siteAt(site),
      kind: "service_call",
      title,
      urgent,
      callerName: caller,
      callerPhone: "360-555-0190",
    });
  }
  for (const [i, { site, title, waitsFor, person, days }] of REPAIRS.entries()) {
    const { jobId } = await createJob(dispatcher, { siteId: siteAt(site), kind: "repair", title, visitMinutes: 180 });
    await waitFor(dispatcher, { jobId, waitsFor, person, untilDate: addDays(today, days) });
    if (i === 0) await setTerms(dispatcher, { jobId, purchaseOrder: "PO 30617", limit: "1,500.00" });
    if (i === 1) await setTerms(dispatcher, { jobId, noneNeeded: "on" });
  }
}
