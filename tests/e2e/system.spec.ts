import { randomUUID } from "node:crypto";
import type { Locator, Page } from "@playwright/test";
import { expect, test } from "./fixtures";
import { signInAs } from "./people";

const dialog = (page: Page): Locator => page.getByRole("dialog");

/** Opens a small form, fills it and waits until it has closed by itself. */
async function fillIn(page: Page, opener: string, fields: Record<string, string>, submit: string): Promise<void> {
  await page.getByRole("button", { name: opener, exact: true }).first().click();
  for (const [label, value] of Object.entries(fields)) {
    const field = dialog(page).getByLabel(label);
    if ((await field.evaluate((element) => element.tagName)) === "SELECT") await field.selectOption({ label: value });
    else await field.fill(value);
  }
  await dialog(page).getByRole("button", { name: submit, exact: true }).click();
  await expect(dialog(page)).toBeHidden();
}

/** A site of this test's own with a system that has nothing on it yet. */
async function systemFromNothing(page: Page): Promise<void> {
  const name = `Trial Hall ${randomUUID().slice(0, 8)}`;
  await page.goto("/sites/new");
  await page.getByLabel("Name", { exact: true }).fill(name);
  await page.getByLabel("Kind").selectOption("office");
  await page.getByLabel("Street").fill("1 Trial Lane");
  await page.getByLabel("City").fill("Millrace");
  await page.getByLabel("State").selectOption("WA");
  await page.getByLabel("Postal code").fill("98598");
  await page.getByRole("button", { name: "Add site" }).click();
  await expect(page.getByRole("heading", { level: 1, name })).toBeVisible();
  await page.getByRole("link", { name: "Add system" }).click();
  await page.getByLabel("Name", { exact: true }).fill("Main panel");
  await page.getByLabel("Key", { exact: true }).fill("FACU-1");
  await page.getByRole("button", { name: "Add system" }).click();
  await expect(page.getByText("No device yet")).toBeVisible();
}

const tab = async (page: Page, name: string) => {
  await page.getByRole("navigation", { name: "Parts of the system" }).getByRole("link", { name }).click();
};

test("a system grows from nothing; its matrix is written by keyboard, in versions", async ({ page }) => {
  await signInAs(page, "dispatcher");
  await systemFromNothing(page);
  await tab(page, "Script");
  await expect(page.getByText("add its devices while walking")).toBeVisible();

  await tab(page, "Devices");
  await fillIn(page, "Add zone", { Key: "1", Name: "Lobby" }, "Add zone");
  await fillIn(
    page,
    "Add device",
    { Address: "L1-001", "Text at the panel": "Lobby ceiling", Zone: "1 Lobby" },
    "Add device",
  );
  await expect(page.getByRole("cell").filter({ hasText: /^L1-001$/ })).toBeVisible();
  await expect(page.getByRole("cell", { name: "Never proven" })).toBeVisible();
  await page.getByRole("button", { name: "Add device", exact: true }).click();
  await dialog(page).getByLabel("Address").fill("L1-001");
  await dialog(page).getByLabel("Text at the panel").fill("The same again");
  await dialog(page).getByRole("button", { name: "Add device", exact: true }).click();
  await expect(dialog(page).getByLabel("Address")).toHaveAccessibleDescription(/already a device at that address/);
  await dialog(page).getByRole("button", { name: "Close" }).click();

  await tab(page, "Outputs and equipment");
  await fillIn(page, "Add group", { Key: "AHU", Name: "Fans", Function: "Fan shutdown" }, "Add group");
  await fillIn(page, "Add group", { Key: "NAC", Name: "Horns", Function: "Notification" }, "Add group");
  await fillIn(page, "Add output", { Address: "R1", "Text at the panel": "Fan relay" }, "Add output");
  await fillIn(page, "Add equipment", { Tag: "AHU-1", "Longest off, minutes": "30" }, "Add equipment");
  await expect(page.getByText("off at most 30 min")).toBeVisible();

  await tab(page, "Matrix");
  const grid = page.getByRole("grid", { name: "Input and output matrix" });
  const fans = grid.getByRole("gridcell", { name: /Zone 1 Lobby, Fans/ });
  const horns = grid.getByRole("gridcell", { name: /Zone 1 Lobby, Horns/ });
  await fans.focus();
  await page.keyboard.press("Space");
  await expect(fans).toHaveAccessibleName(/Alarm, approved sequence, not saved; never proven/);
  await page.keyboard.press("ArrowRight");
  await expect(horns).toBeFocused();
  await page.keyboard.press("Enter");
  await expect(page.getByRole("status").filter({ hasText: "changes not saved" })).toContainText("2");
  await page.keyboard.press("Control+z");
  await expect(horns).toHaveAccessibleName(/operates nothing/);
  await saveVersion(page, "From the drawings", 1);

  await page.getByLabel("As found").check();
  await page.getByLabel("Delay, seconds").fill("20");
  await horns.focus();
  await page.keyboard.press("Space");
  await saveVersion(page, "Seen on the walk", 2);
  await expect(horns).toHaveAccessibleName(/as found, after 20 s; never proven/);

  await tab(page, "Versions");
  await expect(page.getByRole("listitem").filter({ hasText: "Version 2, in force" })).toContainText("Seen on the walk");
  await page.getByText("What changed (1)").first().click();
  await expect(page.getByText("Added: Alarm of zone 1 operates Horns (as found after 20 s)")).toBeVisible();
  await page.getByRole("link", { name: "Look at version 1" }).click();
  await expect(page.getByText("Version 1, not in force")).toBeVisible();
  await expect(horns).toHaveAccessibleName(/operates nothing/);
  await expect(fans).toHaveAccessibleName(/approved sequence/);

  await tab(page, "Script");
  await expect(page.getByText("A magnet alone proves the electronics")).toBeVisible();
  await expect(page.getByRole("listitem").filter({ hasText: "AHU-1 stops" }).first()).toContainText(
    "off at most 30 min",
  );
});

async function saveVersion(page: Page, note: string, number: number): Promise<void> {
  await page.getByRole("button", { name: `Save as version ${number}` }).click();
  await dialog(page).getByLabel("Why, and by what paper").fill(note);
  await dialog(page).getByRole("button", { name: "Save version" }).click();
  await expect(page.getByText(`: ${note}`)).toBeVisible();
  await expect(dialog(page)).toBeHidden();
}

test("the arrow keys open a zone, and reach what is out of sight", async ({ page }) => {
  await signInAs(page, "dispatcher");
  await page.goto("/sites?q=North+Wing");
  await page.getByRole("link", { name: "Harbor Light Hospital, North Wing" }).click();
  await page.getByRole("link", { name: "Main panel" }).click();
  await tab(page, "Matrix");
  const grid = page.getByRole("grid");
  await grid.getByRole("gridcell").first().focus();
  await page.keyboard.press("Home");
  await page.keyboard.press("Enter");
  await expect(grid.getByRole("rowheader", { name: /Zone 1/ })).toHaveAttribute("aria-expanded", "true");
  await page.keyboard.press("ArrowDown");
  await expect(grid.getByRole("rowheader", { name: /L1-001/ })).toBeFocused();
  await page.keyboard.press("Control+End");
  const last = grid.getByRole("gridcell", { name: /Zone 4.*Stair pressurization/ });
  await expect(last).toBeFocused();
  await expect(last).toBeInViewport();
});

test("a code shows itself on being asked, and each look is in the audit trail", async ({ page }) => {
  await signInAs(page, "owner");
  await page.goto("/sites?q=North+Wing");
  await page.getByRole("link", { name: "Harbor Light Hospital, North Wing" }).click();
  const entry = page.getByRole("listitem").filter({ hasText: "Passcode for the station" });
  await expect(entry).not.toContainText(/harbor \d{4}/);
  await entry.getByRole("button", { name: "Show code" }).click();
  const shown = entry.getByRole("status").first();
  await expect(shown).toHaveText(/harbor \d{4}/);
  const code = (await shown.textContent()) ?? "";
  await entry.getByRole("button", { name: "Hide" }).click();
  await expect(page.getByText(code)).toBeHidden();
  await page.goto("/audit?q=secret.look");
  await expect(page.getByRole("cell", { name: "secret.look" }).first()).toBeVisible();
  await expect(page.getByText(code)).toBeHidden();
});
