import { expect, test } from "./fixtures";
import { signInAs } from "./people";

/** Words of this run alone: the demo company is shared by all tests. */
const unlike = (words: string) => `${words} ${Date.now().toString(36)}${Math.floor(Math.random() * 1e6).toString(36)}`;

test("what is agreed stands on the due list with its window and obstacles; one click makes the job", async ({
  page,
}) => {
  await signInAs(page, "dispatcher");
  await page.goto("/agreements/new");
  const name = unlike("Recall tests");
  await page.getByLabel("Customer").selectOption({ label: "Meridian Tower Associates" });
  await page.getByLabel("Name", { exact: true }).fill(name);
  await page.getByLabel("No work without a purchase order").check();
  await page.getByRole("button", { name: "Add agreement" }).click();
  await expect(page.getByRole("heading", { level: 1, name })).toBeVisible();
  const agreement = new URL(page.url()).pathname;
  const row = page.getByRole("row").filter({ has: page.locator(`a[href="${agreement}"]`) });

  await page.getByRole("combobox", { name: "Site" }).fill("foundry");
  await page.getByRole("option", { name: /Meridian Annex/ }).click();
  await page.getByLabel("Kind of test").selectOption({ label: "Elevator recall test" });
  await expect(page.getByRole("checkbox", { name: "Elevator recall" })).toBeChecked();
  await page.getByLabel("How often").selectOption({ label: "Every 5 years" });
  // NFPA 72 does not define five years: that rule is not offered.
  await expect(page.getByLabel("By which rule").getByRole("option", { name: /NFPA 72/ })).toHaveCount(0);
  await page.getByLabel("By which rule").selectOption({ label: "As the agreement says" });
  await page.getByLabel("Days either way").fill("20");
  await page.getByLabel("First target date").fill("2031-05-31");
  await page.getByLabel("Price of each, in dollars").fill("12,5");
  await page.getByRole("button", { name: "Add to the agreement" }).click();
  const price = page.getByLabel("Price of each, in dollars");
  await expect(price).toHaveAttribute("aria-invalid", "true");
  await expect(page.getByText("An amount in dollars, like 1,250.00").first()).toBeVisible();
  await price.fill("1,250.00");
  await page.getByRole("button", { name: "Add to the agreement" }).click();
  await expect(page.getByText("May 11, 2031 to Jun 20, 2031, target May 31, 2031")).toBeVisible();
  await expect(page.getByText("$1,250.00")).toBeVisible();

  await page.goto("/due-list?q=meridian+annex&kind=elevators&when=early");
  await expect(row).toContainText("2031-05-31");
  await expect(row).toContainText("2031-05-11");
  await expect(row).toContainText("Too early");
  await expect(row.getByRole("link", { name: "No purchase order yet" })).toBeVisible();
  await row.getByRole("button", { name: "Make the job" }).click();

  await expect(page).toHaveURL(/\/jobs\/[0-9a-f-]{36}$/);
  const job = page.url();
  await expect(page.getByRole("heading", { level: 1 })).toContainText("Every 5 years: elevator recall test");
  await expect(page.getByText("To book").first()).toBeVisible();
  await expect(page.getByText("gives no work without a purchase order")).toBeVisible();
  const terms = page.locator("#terms");
  await terms.getByRole("textbox", { name: /^Purchase order/ }).fill("PO 4711");
  await terms.getByRole("button", { name: "Save" }).click();
  await expect(page.getByText("Purchase order PO 4711, no limit")).toBeVisible();

  await page.goto("/due-list?q=meridian+annex&kind=elevators&when=early");
  await row.getByRole("link", { name: /^Job \d+$/ }).click();
  await expect(page).toHaveURL(job);
});

test("the telephone rings: site by a few letters, what is wrong, Enter, and it is a job", async ({ page }) => {
  await signInAs(page, "dispatcher");
  await expect(page.getByRole("heading", { level: 1 })).toContainText("Run sheet");
  await page.keyboard.press("c");
  await expect(page).toHaveURL(/\/jobs\/new$/);
  const site = page.getByRole("combobox", { name: "Site" });
  await expect(site).toBeFocused();
  await site.fill("cold store no. 1");
  await expect(page.getByRole("option", { name: /Cold Store No. 1/ })).toBeVisible();
  await page.keyboard.press("Enter");
  const atHand = page.getByRole("region", { name: "The site" });
  await expect(atHand).toContainText("Viktor Haas");
  await expect(atHand).toContainText(/last visit \d{4}-/);
  await expect(atHand).toContainText("Replace the interface relay of evaporator fan EF-2");
  await atHand.getByRole("button", { name: "This is who calls" }).last().click();
  await expect(page.getByLabel("Who calls")).toHaveValue("Viktor Haas");

  const words = unlike("Horn does not stop");
  await page.getByLabel("Urgent").check();
  await page.getByLabel("What is wrong").fill(words);
  await page.keyboard.press("Enter");
  await expect(page.getByRole("heading", { level: 1, name: words })).toBeVisible();
  await expect(page.getByText("To book").first()).toBeVisible();
  await expect(page.getByText("Urgent").first()).toBeVisible();
  await expect(page.getByText("Viktor Haas").first()).toBeVisible();

  await page.goto(`/jobs?q=${encodeURIComponent(words)}`);
  await expect(page.getByRole("row").filter({ hasText: words })).toContainText("Service call");
});

test("a job waits for parts by a name and a date, and goes on when they have come", async ({ page }) => {
  await signInAs(page, "dispatcher");
  await page.goto("/jobs/new");
  await page.getByRole("combobox", { name: "Site" }).fill("lyric play");
  await page.getByRole("option", { name: /Lyric Playhouse/ }).click();
  const words = unlike("Replace the winch relay");
  await page.getByLabel("What is wrong").fill(words);
  await page.getByRole("button", { name: "Make the job" }).click();
  await expect(page.getByRole("heading", { level: 1, name: words })).toBeVisible();
  await page.getByText("Wait for something").click();
  await page.getByLabel("From whom").fill("Parts counter");
  await page.getByLabel("Until").fill("2099-12-31");
  await page.getByRole("button", { name: "Wait", exact: true }).click();
  await expect(page.getByText("Waiting", { exact: true })).toBeVisible();
  await page.getByRole("button", { name: "It has come" }).click();
  await expect(page.getByText("To book", { exact: true })).toBeVisible();
  await page.getByLabel("Why it is canceled").fill("The owner did it");
  await page.getByRole("button", { name: "Cancel the job" }).click();
  await expect(page.getByText("Canceled", { exact: true }).first()).toBeVisible();
});
