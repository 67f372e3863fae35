import { addDays, calendarDate } from "@/lib/domain/shared/zone";
import type { Context } from "@/lib/services/command";
import { addDocument } from "@/lib/services/sites/add-document";
import { addKey } from "@/lib/services/sites/add-key";
import { addSecret } from "@/lib/services/sites/add-secret";
import { addStationAccount } from "@/lib/services/sites/add-station-account";
import { addAttendance } from "@/lib/services/windows/add-attendance";
import { addNoTest } from "@/lib/services/windows/add-no-test";
import { addWindow } from "@/lib/services/windows/add-window";
import { DEMO_COMPANY } from "./people";

const STATIONS = [
  { station: "Breakwater Central Station", phone: "360-555-0190" },
  { station: "Cascade Signal Watch", phone: "360-555-0191" },
] as const;
const EVERY_DAY = [1, 2, 3, 4, 5, 6, 7];
const WORKDAYS = [1, 2, 3, 4, 5];

/** What every building has: an account, a key, codes; what some have: nights for fans, days when nothing may sound. */
export async function recordSiteFacts(dispatcher: Context, siteIds: readonly string[]): Promise<void> {
  const today = calendarDate(dispatcher.now, DEMO_COMPANY.zone);
  for (const [i, siteId] of siteIds.entries()) {
    await letIn(dispatcher, siteId, i);
    if (i % 2 === 0) await agreeTimes(dispatcher, siteId, today, i);
    if (i % 3 === 0) await keepPapers(dispatcher, siteId, today);
  }
}

async function letIn(dispatcher: Context, siteId: string, i: number): Promise<void> {
  await addStationAccount(dispatcher, {
    siteId,
    ...STATIONS[i % STATIONS.length],
    accountNumber: `${20 + (i % 7)}-${String(4100 + i * 13)}`,
    note: i % 4 === 0 ? "Longer than a day on test needs the fire department’s word in writing" : null,
  });
  await addKey(dispatcher, {
    siteId,
    kind: i % 5 === 0 ? "badge" : "key",
    label: i % 5 === 0 ? "Staff entrance" : "Panel and annunciator",
    keptBy: i % 3 === 0 ? "Key box at the main door" : `Office, hook ${i + 1}`,
  });
  const pin = (n: number) => String((i * 7919 + n * 104_729) % 10_000).padStart(4, "0");
  await addSecret(dispatcher, {
    siteId,
    kind: "station_passcode",
    label: "Passcode for the station",
    secret: `harbor ${pin(1)}`,
  });
  if (i % 3 === 0)
    await addSecret(dispatcher, { siteId, kind: "key_box_code", label: "Key box, main door", secret: pin(2) });
}

async function agreeTimes(dispatcher: Context, siteId: string, today: string, i: number): Promise<void> {
  await addWindow(dispatcher, {
    siteId,
    functions: ["fan_shutdown", "damper_close"],
    weekdays: WORKDAYS,
    startsLocal: "22:00",
    endsLocal: "06:00",
    noticeHours: 72,
    note: "One air handler at a time",
  });
  await addWindow(dispatcher, {
    siteId,
    functions: ["notification", "door_release", "elevator_recall"],
    weekdays: i % 4 === 0 ? [6] : EVERY_DAY,
    startsLocal: "07:00",
    endsLocal: "09:30",
    noticeHours: 24,
  });
  await addNoTest(dispatcher, {
    siteId,
    functions: ["notification", "fan_shutdown"],
    fromDate: addDays(today, 20),
    toDate: addDays(today, 24),
    reason: i % 4 === 0 ? "Accreditation visit" : "Stocktaking",
  });
  await addAttendance(dispatcher, {
    siteId,
    functions: ["fan_shutdown"],
    party: "Building engineer, restarts each fan",
  });
  if (i % 4 === 0) {
    await addAttendance(dispatcher, {
      siteId,
      functions: ["elevator_recall"],
      party: "Elevator contractor",
      phone: "360-555-0195",
    });
  }
}

async function keepPapers(dispatcher: Context, siteId: string, today: string): Promise<void> {
  await addDocument(dispatcher, {
    siteId,
    kind: "sequence",
    title: "Sequence of operation, revision C",
    dated: addDays(today, -900),
    keptWhere: "Document cabinet beside the panel",
  });
  await addDocument(dispatcher, {
    siteId,
    kind: "record",
    title: "Last year’s record of inspection and testing",
    dated: addDays(today, -360),
    keptWhere: "Office, binder of the site",
  });
}
