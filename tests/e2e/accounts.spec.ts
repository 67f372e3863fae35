import { randomUUID } from "node:crypto";
import type { Browser, Page } from "@playwright/test";
import { expect, test } from "./fixtures";
import { newestId, nextLetter } from "./mail";
import { signIn, signInAs } from "./people";

const PASSWORD = "a quiet fan coasts down";

const someone = () => ({
  name: `Robin ${randomUUID().slice(0, 8)}`,
  email: `${randomUUID().slice(0, 12)}@stillwater.example`,
});

/** The owner invites somebody; answers the address in the letter. */
async function invite(page: Page, person: { name: string; email: string }, role: string): Promise<string> {
  await page.goto("/people/new");
  await page.getByLabel("Name").fill(person.name);
  await page.getByLabel("E-mail address").fill(person.email);
  await page.getByLabel("Role").selectOption({ label: role });
  await page.getByRole("button", { name: "Send invitation" }).click();
  await expect(page.getByRole("heading", { name: person.name })).toBeVisible();
  const letter = await nextLetter(person.email, "0");
  expect(letter.text).toContain("Stillwater Alarm Service");
  const link = letter.links[0];
  if (!link) throw new Error("the invitation has no link");
  return link;
}

async function accept(browser: Browser, link: string): Promise<Page> {
  const page = await (await browser.newContext()).newPage();
  await page.goto(link);
  await page.getByLabel("Password").fill(PASSWORD);
  await page.getByRole("button", { name: "Accept" }).click();
  await expect(page).toHaveURL(/sign-in/);
  return page;
}

test("an invited person opens the letter, chooses a password and lands on the first screen", async ({
  page,
  browser,
}) => {
  await signInAs(page, "owner");
  const person = someone();
  const link = await invite(page, person, "Dispatcher");
  const theirs = await accept(browser, link);
  await signIn(theirs, person.email, PASSWORD);
  await expect(theirs).toHaveURL(/run-sheet/);
  // The link works once.
  await theirs.goto(link);
  await theirs.getByLabel("Password").fill(PASSWORD);
  await theirs.getByRole("button", { name: "Accept" }).click();
  await expect(theirs.getByRole("main").getByRole("alert")).toBeVisible();
});

test("ending somebody's access takes effect at that person's next click", async ({ page, browser }) => {
  await signInAs(page, "owner");
  const person = someone();
  const theirs = await accept(browser, await invite(page, person, "Dispatcher"));
  await signIn(theirs, person.email, PASSWORD);
  await theirs.goto("/sites");
  await expect(theirs.getByRole("heading", { name: "Sites" })).toBeVisible();
  await page.getByRole("button", { name: "End access now" }).click();
  await expect(page.getByRole("button", { name: "Give access again" })).toBeVisible();
  await theirs.getByRole("link", { name: "Jobs" }).first().click();
  await expect(theirs).toHaveURL(/sign-in/);
});

test("a forgotten password is replaced by letter, and every session ends", async ({ page, browser }) => {
  await signInAs(page, "owner");
  const person = someone();
  const theirs = await accept(browser, await invite(page, person, "Technician"));
  await signIn(theirs, person.email, PASSWORD);
  const other = await (await browser.newContext()).newPage();
  const before = await newestId(person.email);
  await other.goto("/forgot");
  await other.getByLabel("E-mail address").fill(person.email);
  await other.getByRole("button", { name: "Send me a letter" }).click();
  await expect(other.getByRole("status")).toContainText("If we know that address");
  const letter = await nextLetter(person.email, before);
  await other.goto(letter.links[0] ?? "");
  await other.getByLabel("Password").fill("another quiet fan");
  await other.getByRole("button", { name: "Save the new password" }).click();
  await expect(other).toHaveURL(/sign-in/);
  await signIn(other, person.email, "another quiet fan");
  await expect(other).toHaveURL(/field/);
  await theirs.goto("/account");
  await expect(theirs).toHaveURL(/sign-in/);
});

test("a link by e-mail signs in once, and only by the button", async ({ page, browser }) => {
  await signInAs(page, "owner");
  const person = someone();
  await accept(browser, await invite(page, person, "Bookkeeper"));
  const before = await newestId(person.email);
  const theirs = await (await browser.newContext()).newPage();
  await theirs.goto("/sign-in");
  await theirs.getByText("Sign in by a link instead").click();
  await theirs.getByLabel("Where should the link go?").fill(person.email);
  await theirs.getByRole("button", { name: "Send me a link" }).click();
  await expect(theirs.getByText("If we know that address")).toBeVisible();
  const link = (await nextLetter(person.email, before)).links[0] ?? "";
  // A mail scanner opens the address first; that spends nothing.
  expect((await fetch(link)).status).toBe(200);
  await theirs.goto(link);
  await theirs.getByRole("button", { name: "Sign in" }).click();
  await expect(theirs).toHaveURL(/customers/);
  await theirs.context().clearCookies();
  await theirs.goto(link);
  await theirs.getByRole("button", { name: "Sign in" }).click();
  await expect(theirs.getByText("That link no longer works")).toBeVisible();
});

test("too many wrong passwords shut the account's door for a while", async ({ page }) => {
  const email = `${randomUUID().slice(0, 12)}@stillwater.example`;
  await page.goto("/sign-in");
  await page.getByLabel("E-mail address").first().fill(email);
  for (let attempt = 0; attempt <= 10; attempt++) {
    await page.getByLabel("Password").fill(`wrong ${attempt}`);
    const answered = page.waitForResponse((response) => response.request().method() === "POST");
    await page.getByRole("button", { name: "Sign in", exact: true }).click();
    await answered;
  }
  await expect(page.getByText(/Too many attempts/).first()).toBeVisible();
});

test("signing out everywhere ends the other browser too", async ({ page, browser }) => {
  await signInAs(page, "owner");
  const person = someone();
  const one = await accept(browser, await invite(page, person, "Dispatcher"));
  await signIn(one, person.email, PASSWORD);
  const two = await (await browser.newContext()).newPage();
  await signIn(two, person.email, PASSWORD);
  await one.goto("/account");
  await one.getByRole("button", { name: "Sign out everywhere" }).click();
  await expect(one).toHaveURL(/sign-in/);
  await two.goto("/jobs");
  await expect(two).toHaveURL(/sign-in/);
});
