import { readFile } from "node:fs/promises";
import type { Page } from "@playwright/test";
import Papa from "papaparse";
import { expect, test } from "./fixtures";
import { signInAs } from "./people";

/** The first column as shown. */
const names = (page: Page) =>
  page.getByRole("table").getByRole("row").locator("[role=cell]:first-child").allInnerTexts();

async function exported(page: Page): Promise<Record<string, string>[]> {
  const coming = page.waitForEvent("download");
  await page.getByRole("link", { name: "Export CSV" }).click();
  const text = await readFile(await (await coming).path(), "utf8");
  return Papa.parse<Record<string, string>>(text, { header: true, skipEmptyLines: true }).data;
}

test("a list is filtered, sorted and exported by its address", async ({ page }) => {
  await signInAs(page, "dispatcher");
  await page.goto("/sites");
  await page.getByLabel("Kind").selectOption({ label: "School" });
  await page.getByRole("button", { name: "Search", exact: true }).click();
  await expect(page).toHaveURL(/kind=school/);
  await page.getByRole("link", { name: "Name" }).click();
  await page.getByRole("link", { name: "Name" }).and(page.locator("[aria-sort=ascending] a")).click();
  await expect(page).toHaveURL(/sort=-name/);
  await expect(page.locator("[aria-sort=descending]")).toHaveText("Name");
  const shown = await names(page);
  expect(shown.length).toBeGreaterThan(1);
  expect(shown).toEqual([...shown].sort().reverse());
  const rows = await exported(page);
  expect(rows.map((row) => row.Name)).toEqual(shown);
  expect(new Set(rows.map((row) => row.Kind))).toEqual(new Set(["School"]));
});

test("what a spreadsheet would run leaves the house as text", async ({ page }) => {
  const name = `=HYPERLINK("http://evil.example") ${Date.now()}`;
  await signInAs(page, "bookkeeper");
  await page.goto("/customers/new");
  await page.getByLabel("Name").fill(name);
  await page.getByRole("button", { name: "Add customer" }).click();
  await expect(page.getByRole("heading", { level: 1, name })).toBeVisible();
  await page.goto(`/customers?q=${encodeURIComponent(name)}`);
  await expect(page.getByRole("cell", { name })).toBeVisible();
  expect((await exported(page)).map((row) => row.Name)).toEqual([`'${name}`]);
});

test("a search without a match says so, and leads back to the whole list", async ({ page }) => {
  await signInAs(page, "dispatcher");
  await page.goto("/sites?q=no-such-building&sort=city");
  await expect(page.getByText("Nothing fits this search")).toBeVisible();
  await expect(page.getByText("No sites yet")).toHaveCount(0);
  await page.getByRole("link", { name: "Show the whole list" }).click();
  await expect(page).toHaveURL(/\/sites\?sort=city$/);
  await expect(page.getByRole("table")).toBeVisible();
});

test("nobody is shown the way to what they may not do", async ({ page }) => {
  await signInAs(page, "bookkeeper");
  for (const [path, shown, hidden] of [
    ["/customers", "New customer", "New site"],
    ["/sites", "Export CSV", "New site"],
    ["/people", "Export CSV", "Invite somebody"],
  ] as const) {
    await page.goto(path);
    await expect(page.getByRole("link", { name: shown })).toBeVisible();
    await expect(page.getByRole("link", { name: hidden })).toHaveCount(0);
  }
  const refused = await page.request.get("/audit/export.csv");
  expect(refused.status()).toBe(403);
  expect(refused.headers()["content-type"]).toContain("application/problem+json");
});

test("the page of specimens is for whoever builds the product", async ({ page }) => {
  const answer = await page.goto("/design");
  expect(answer?.status()).toBe(404);
  await expect(page.getByRole("heading", { level: 1, name: "Nothing is here" })).toBeVisible();
});
