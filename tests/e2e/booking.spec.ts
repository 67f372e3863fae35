import type { Locator, Page } from "@playwright/test";
import ICAL from "ical.js";
import { simpleParser } from "mailparser";
import { contactAddress } from "../../db/demo/accounts";
import { rows } from "./database";
import { expect, test } from "./fixtures";
import { letterSaying, rawLetter } from "./mail";
import { signInAs } from "./people";

const SITE = "Cold Store No. 2";
const CONTACT = contactAddress("anselcold");

const unlike = (words: string) => `${words} ${Date.now().toString(36)}${Math.floor(Math.random() * 1e6).toString(36)}`;

const BOOKINGS = ["agreed", "in writing", "keyboard"] as const;

/**
 * A Tuesday some weeks ahead on which the site's window opens from five to nine: in weeks of its own for each test and
 * size, so that none meets another's visits.
 */
function ownDay(booking: (typeof BOOKINGS)[number], isMobile: boolean): string {
  const ways = 2 * BOOKINGS.length;
  const week = 3 + ways * Math.floor(Math.random() * 8) + 2 * BOOKINGS.indexOf(booking) + (isMobile ? 1 : 0);
  const day = new Date(Date.now() + 7 * week * 86_400_000);
  day.setUTCDate(day.getUTCDate() + ((2 - day.getUTCDay() + 7) % 7));
  return day.toISOString().slice(0, 10);
}

/** A shutdown test at the cold store, as a caller orders it. */
async function newShutdownTest(page: Page): Promise<string> {
  const title = unlike("Evaporator fans");
  await page.goto("/jobs/new");
  await page.getByRole("combobox", { name: "Site" }).fill("cold store no. 2");
  await page.getByRole("option", { name: /Cold Store No. 2/ }).click();
  await page.getByLabel("What is wrong").fill(title);
  await page.getByRole("button", { name: "Make the job" }).click();
  await expect(page.getByRole("heading", { level: 1, name: title })).toBeVisible();
  const change = page.getByRole("region", { name: "Change" });
  await change.getByRole("checkbox", { name: "Fan shutdown" }).check();
  await change.getByRole("button", { name: "Save", exact: true }).click();
  await expect(change.getByText("Job saved")).toBeVisible();
  return title;
}

const trayButton = (page: Page, title: string): Locator =>
  page.getByRole("region", { name: /To book/ }).getByRole("button", { name: new RegExp(title) });

async function takeUp(page: Page, title: string): Promise<void> {
  await page.getByRole("searchbox", { name: /words of a job/ }).fill(title);
  await trayButton(page, title).click();
  await expect(page.getByText(`In your hand: ${title}, ${SITE}`)).toBeVisible();
}

const cell = (page: Page, clock: string, name = "Dara Whitcomb"): Locator =>
  page.getByRole("gridcell", { name: new RegExp(`^${clock}, ${name}`) });

const blockAt = (page: Page, clock: string): Locator => cell(page, clock).getByRole("button", { name: SITE });

/** A page just loaded shows its visits before its script can open them. */
async function openVisit(page: Page, clock: string): Promise<void> {
  const dialog = page.getByRole("dialog");
  await expect(async () => {
    if (!(await dialog.isVisible())) await blockAt(page, clock).click({ timeout: 2_000 });
    await expect(dialog).toBeVisible({ timeout: 2_000 });
  }).toPass();
}

const visitOf = async (title: string) => {
  const found = await rows(
    (sql) => sql<{ id: string; startsLocal: string; sequence: number; canceled: boolean }[]>`
      select v.id, v.starts_local as "startsLocal", v.sequence, v.canceled_at is not null as canceled
        from visits v join jobs j on j.company_id = v.company_id and j.id = v.job_id where j.title = ${title}`,
  );
  return found[0];
};

test("a visit is booked where its fans may stop, agreed to by the letter's link, moved and canceled", async ({
  page,
  browser,
  isMobile,
}) => {
  test.setTimeout(180_000);
  await signInAs(page, "dispatcher");
  const title = await newShutdownTest(page);
  const date = ownDay("agreed", isMobile);
  await page.goto(`/run-sheet?date=${date}`);
  await takeUp(page, title);
  await expect(cell(page, "06:00")).toHaveAttribute("data-place", "free");
  await expect(cell(page, "06:00")).toHaveAccessibleName(/Can go here, about \d+ min from/);
  await expect(cell(page, "12:00")).toHaveAccessibleName(/Only with a reason, .*outside every window/);
  await cell(page, "06:00").click();
  const panel = page.getByRole("dialog", { name: "Book the visit" });
  await expect(panel.getByLabel("Start")).toHaveValue(`${date}T06:00`);
  await expect(panel.getByRole("checkbox", { name: /Viktor Haas/ })).toBeChecked();
  await panel.getByRole("button", { name: "Book it" }).click();
  await expect(panel).toBeHidden();
  const visit = await visitOf(title);
  expect(visit).toMatchObject({ startsLocal: `${date}T06:00`, sequence: 0 });
  const live = await rows(
    (sql) => sql<{ startsLocal: string; functions: string[] }[]>`
      select starts_local as "startsLocal", functions from live_blocks where visit_id = ${visit?.id ?? ""}`,
  );
  expect(live).toEqual([{ startsLocal: `${date}T06:00`, functions: ["fan_shutdown"] }]);

  const asked = await letterSaying(CONTACT, "Please confirm", title);
  const first = await calendarEntry(asked.id);
  expect(first).toMatchObject({ method: "REQUEST", uid: visit?.id, sequence: "0" });
  const guest = await (await browser.newContext()).newPage();
  const link = asked.links.find((url) => url.includes("/visits/")) ?? "";
  await guest.goto(link);
  await expect(guest.getByRole("heading", { level: 1 })).toHaveText("Can this visit take place?");
  await expect(guest.getByText("Fan shutdown")).toBeVisible();
  await expect(guest.getByText("Dara Whitcomb")).toBeVisible();
  await guest.getByLabel(/Permit or approval number/).fill("SD-77");
  await guest.getByRole("button", { name: "Acknowledge" }).click();
  await expect(guest.getByRole("heading", { level: 1 })).toHaveText("Thank you");
  await expect(guest.getByText("Acknowledged")).toBeVisible();
  const answers = await rows(
    (sql) => sql<{ answer: string; channel: string; permit: string }[]>`
      select answer, channel, permit_number as permit from visit_asks
       where visit_id = ${visit?.id ?? ""} and answer is not null`,
  );
  expect(answers).toEqual([{ answer: "acknowledged", channel: "link", permit: "SD-77" }]);

  await page.reload();
  await expect(blockAt(page, "06:00")).toContainText("acknowledged");
  await openVisit(page, "06:00");
  await expect(page.getByRole("dialog")).toContainText("permit SD-77");
  await page.getByRole("dialog").getByRole("button", { name: "Move", exact: true }).click();
  await expect(cell(page, "07:00")).toHaveAttribute("data-place", "free");
  await cell(page, "07:00").click();
  await page.getByRole("dialog").getByRole("button", { name: "Move it here" }).click();
  await expect(page.getByRole("dialog")).toBeHidden();
  const moved = await letterSaying(CONTACT, "Changed", title);
  const second = await calendarEntry(moved.id);
  expect(second).toMatchObject({ method: "REQUEST", uid: visit?.id, sequence: "1" });
  expect(second.start.getTime() - first.start.getTime()).toBe(3_600_000);
  await guest.goto(link);
  await expect(guest.getByRole("heading", { level: 1 })).toHaveText("This visit has changed");
  await expect(guest.getByRole("link", { name: "360-555-0100" })).toBeVisible();

  await page.reload();
  await openVisit(page, "07:00");
  await page.getByText("Cancel the visit").first().click();
  await page.getByLabel("Reason").fill("The cold chain cannot wait");
  await page.getByRole("dialog").getByRole("button", { name: "Cancel the visit" }).click();
  const canceled = await letterSaying(CONTACT, "Canceled", title);
  expect(canceled.text).toContain("The cold chain cannot wait");
  expect(await calendarEntry(canceled.id)).toMatchObject({ method: "CANCEL", uid: visit?.id, sequence: "2" });
  expect(await visitOf(title)).toMatchObject({ canceled: true, sequence: 2 });
});

test("outside the window it is refused with the reason, until somebody says in writing why", async ({
  page,
  isMobile,
}) => {
  await signInAs(page, "dispatcher");
  const title = await newShutdownTest(page);
  await page.goto(`/run-sheet?date=${ownDay("in writing", isMobile)}`);
  await takeUp(page, title);
  await expect(cell(page, "13:00")).toHaveAttribute("data-place", "override");
  await cell(page, "13:00").click();
  const panel = page.getByRole("dialog", { name: "Book the visit" });
  await panel.getByRole("button", { name: "Book it" }).click();
  await expect(panel.getByRole("alert")).toContainText("The visit cannot stand there");
  expect(await visitOf(title)).toBeUndefined();
  await panel.getByLabel("Book it all the same, because").fill("The plant is empty that afternoon");
  await panel.getByRole("button", { name: "Book it" }).click();
  await expect(panel).toBeHidden();
  const visit = await visitOf(title);
  const kept = await rows(
    (sql) => sql<{ reason: string; note: string }[]>`
      select reason, note from visit_overrides where visit_id = ${visit?.id ?? ""}`,
  );
  expect(kept).toEqual([{ reason: "outside_window", note: "The plant is empty that afternoon" }]);
});

test("the keyboard alone suffices: take up, walk, put back, take up again, book", async ({ page, isMobile }) => {
  test.skip(isMobile, "a phone has no keyboard");
  await signInAs(page, "dispatcher");
  const title = await newShutdownTest(page);
  await page.goto(`/run-sheet?date=${ownDay("keyboard", isMobile)}`);
  await page.getByRole("searchbox", { name: /words of a job/ }).fill(title);
  await page.keyboard.press("Tab");
  await expect(trayButton(page, title)).toBeFocused();
  await page.keyboard.press("Enter");
  await expect(page.locator("[role=grid] td:focus")).toHaveAttribute("data-place", "free");
  await page.keyboard.press("Escape");
  await expect(trayButton(page, title)).toBeFocused();
  await page.keyboard.press("Enter");
  const focused = page.locator("[role=grid] td:focus");
  await expect(focused).toHaveAccessibleName(/^06:00, Dara Whitcomb: Can go here/);
  await page.keyboard.press("ArrowRight");
  await expect(focused).toHaveAccessibleName(/^06:00, Ezra Kalani/);
  await page.keyboard.press("ArrowDown");
  await expect(focused).toHaveAccessibleName(/^06:30, Ezra Kalani: Can go here/);
  await page.keyboard.press("Enter");
  await expect(page.getByRole("button", { name: "Book it" })).toBeFocused();
  await page.keyboard.press("Enter");
  await expect(page.getByRole("dialog")).toBeHidden();
  await expect.poll(async () => (await visitOf(title))?.startsLocal.slice(11)).toBe("06:30");
});

/** The letter's calendar file as an independent reader understands it (RFC 5545). */
async function calendarEntry(letterId: string) {
  const mail = await simpleParser(await rawLetter(letterId));
  const file = mail.attachments.find(({ filename }) => filename === "visit.ics");
  const calendar = new ICAL.Component(ICAL.parse(file?.content.toString("utf8") ?? ""));
  const event = new ICAL.Event(calendar.getFirstSubcomponent("vevent") ?? undefined);
  return {
    method: calendar.getFirstPropertyValue("method"),
    uid: event.uid,
    sequence: String(event.sequence),
    start: event.startDate.toJSDate(),
  };
}
