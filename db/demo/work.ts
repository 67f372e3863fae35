import type { JobKind } from "@/lib/domain/jobs/words";
import { addDays, calendarDate } from "@/lib/domain/shared/zone";
import type { Context } from "@/lib/services/command";
import { createJob } from "@/lib/services/jobs/create-job";
import { planVisit } from "@/lib/services/visits/plan-visit";
import { DEMO_COMPANY } from "./people";

const FROM_DAY = -7;
const TO_DAY = 10;

const SLOTS = [
  { starts: "07:00", minutes: 240 },
  { starts: "12:30", minutes: 180 },
] as const;

/** One technician's license has just ended. */
const RENEWAL = [{ code: "license_expired", note: "Renewal is filed, the state’s receipt is in the office" }];

const WORK: readonly { kind: JobKind; title: string }[] = [
  { kind: "test", title: "Yearly fan shutdown test" },
  { kind: "test", title: "Semiannual waterflow and valve test" },
  { kind: "repair", title: "Replace a duct detector that reads dirty" },
  { kind: "test", title: "Yearly test of smoke and heat detectors" },
  { kind: "service_call", title: "Ground fault comes and goes" },
  { kind: "test", title: "Door release and elevator recall test" },
  { kind: "repair", title: "Batteries at the end of their life" },
];

const isWeekday = (date: string) => ![0, 6].includes(new Date(`${date}T00:00Z`).getUTCDay());

/** Three working weeks around today: every technician twice a day, pairs now and then. */
export async function planWork(dispatcher: Context, technicians: string[], siteIds: string[]): Promise<number> {
  const today = calendarDate(dispatcher.now, DEMO_COMPANY.zone);
  let count = 0;
  for (let day = FROM_DAY; day <= TO_DAY; day++) {
    const date = addDays(today, day);
    if (!isWeekday(date)) continue;
    for (const [slot, { starts, minutes }] of SLOTS.entries()) {
      for (let i = 0; i < technicians.length; i++) {
        const paired = (i + day + slot + 70) % 6 === 0 && i + 1 < technicians.length;
        const work = WORK[(count * 3 + i) % WORK.length];
        const siteId = siteIds[(count * 7 + i * 5) % siteIds.length];
        const job = await createJob(dispatcher, { siteId, ...work });
        const crew = technicians.slice(i, paired ? i + 2 : i + 1);
        await planVisit(dispatcher, {
          jobId: job.jobId,
          startsLocal: `${date}T${starts}`,
          minutes,
          crew,
          overrides: RENEWAL,
        });
        if (paired) i++;
        count++;
      }
    }
  }
  return count;
}
