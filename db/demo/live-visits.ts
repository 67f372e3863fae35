import { addDays, calendarDate, toLocalTime } from "@/lib/domain/shared/zone";
import type { SystemFunction } from "@/lib/domain/systems/words";
import type { Context } from "@/lib/services/command";
import { createJob } from "@/lib/services/jobs/create-job";
import { getPlaces } from "@/lib/services/planning/get-places";
import { askForVisit } from "@/lib/services/visits/ask";
import { planVisit } from "@/lib/services/visits/plan-visit";
import { recordAnswer } from "@/lib/services/visits/record-answer";
import { addWindow } from "@/lib/services/windows/add-window";
import { DEMO_COMPANY } from "./people";

type LiveTest = {
  /** Which of the company's sites. */
  site: number;
  title: string;
  functions: SystemFunction[];
  crewSize?: number;
  /** Where the site has recorded none yet. */
  window: { startsLocal: string; endsLocal: string; noticeHours: number };
  becomes: "acknowledged" | "declined" | "asked" | "to book";
};

const EARLY = { startsLocal: "05:00", endsLocal: "09:00", noticeHours: 24 };
const LATE = { startsLocal: "16:00", endsLocal: "22:00", noticeHours: 72 };

const TESTS: readonly LiveTest[] = [
  {
    site: 0,
    title: "Shutdown test, air handlers 1 to 4",
    functions: ["fan_shutdown", "damper_close"],
    window: LATE,
    becomes: "acknowledged",
  },
  {
    site: 5,
    title: "Evaporator fan shutdown test",
    functions: ["fan_shutdown"],
    window: EARLY,
    becomes: "acknowledged",
  },
  {
    site: 9,
    title: "Horns, strobes and door release",
    functions: ["notification", "door_release"],
    window: LATE,
    becomes: "asked",
  },
  { site: 12, title: "Elevator recall test", functions: ["elevator_recall"], window: EARLY, becomes: "declined" },
  {
    site: 1,
    title: "Smoke-control start, both stairs",
    functions: ["smoke_control_start"],
    crewSize: 2,
    window: LATE,
    becomes: "to book",
  },
  {
    site: 7,
    title: "Shutdown test, roof units",
    functions: ["fan_shutdown", "damper_close"],
    window: EARLY,
    becomes: "to book",
  },
  { site: 14, title: "Horns and strobes, all floors", functions: ["notification"], window: LATE, becomes: "to book" },
];

const WORKDAYS = [1, 2, 3, 4, 5];
const FIRST_DAY = 4;
const DAYS = 7;

/** Tests in which functions really operate: booked where windows allow it, and asked of the building; some wait. */
export async function planLiveTests(dispatcher: Context, siteIds: string[]): Promise<void> {
  const today = calendarDate(dispatcher.now, DEMO_COMPANY.zone);
  for (const test of TESTS) {
    const siteId = siteIds[test.site % siteIds.length];
    const { title, functions, crewSize = 1 } = test;
    const { jobId } = await createJob(dispatcher, {
      siteId,
      kind: "test",
      title,
      functions,
      crewSize,
      visitMinutes: 180,
    });
    const look = () => getPlaces(dispatcher, { jobId, date: addDays(today, FIRST_DAY), days: DAYS });
    let places = await look();
    if (places.windows.length === 0) {
      await addWindow(dispatcher, { siteId, functions, weekdays: WORKDAYS, ...test.window });
      places = await look();
    }
    if (test.becomes !== "to book") await book(dispatcher, jobId, places, test.becomes);
  }
}

async function book(
  dispatcher: Context,
  jobId: string,
  places: Awaited<ReturnType<typeof getPlaces>>,
  becomes: Exclude<LiveTest["becomes"], "to book">,
): Promise<void> {
  const free = places.columns.flatMap(({ memberId, bands }) =>
    bands.filter((band) => band.reasons.length === 0).map((band) => ({ memberId, at: band.from.getTime() })),
  );
  const first = free.sort((a, b) => a.at - b.at)[0];
  const start = places.starts.find(({ at }) => at.getTime() === first?.at);
  if (!first || !start) return;
  const liveBlocks = start.liveBlocks.map((block) => ({ ...block, attendees: ["building engineer"] }));
  const { visitId } = await planVisit(dispatcher, {
    jobId,
    startsLocal: start.local,
    minutes: places.minutes,
    crew: [first.memberId],
    liveBlocks,
  });
  const { asked } = await askForVisit(dispatcher, { visitId });
  if (becomes === "asked") return;
  await recordAnswer(dispatcher, {
    visitId,
    askId: asked[0]?.askId,
    answer: becomes,
    channel: "telephone",
    answeredLocal: toLocalTime(dispatcher.now, places.site.zone),
    permitNumber: becomes === "acknowledged" ? "SD-0412" : null,
    note: becomes === "declined" ? "The elevator contractor cannot stand by that week" : null,
  });
}
