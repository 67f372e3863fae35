import AxeBuilder from "@axe-core/playwright";
import type { Page } from "@playwright/test";
import type { Role } from "../../lib/domain/shared/roles";
import { expect, test } from "./fixtures";
import { signInAs } from "./people";

/** WCAG 2.2, levels A and AA, and what axe calls best practice. */
const RULES = ["wcag2a", "wcag2aa", "wcag21a", "wcag21aa", "wcag22aa", "best-practice"];

const OF_EVERYBODY = ["/sign-in", "/forgot", "/invitation/forged", "/reset/forged", "/no-such-page"];
const OF_ROLES: Partial<Record<Role, readonly string[]>> = {
  owner: ["/overview", "/audit", "/settings", "/settings/deliveries", "/people", "/people/new", "/account"],
  dispatcher: ["/run-sheet", "/jobs", "/sites", "/sites/new", "/customers", "/customers/new"],
  technician: ["/field"],
  customer: ["/portal"],
};

/** What sticks out of the screen where it cannot be scrolled to. */
const cutOff = (page: Page): Promise<string[]> =>
  page.evaluate((width) => {
    const scrolls = (element: Element | null): boolean =>
      element !== null && (/auto|scroll/.test(getComputedStyle(element).overflowX) || scrolls(element.parentElement));
    const outside = [...document.querySelectorAll("main *, header *")].filter(
      (element) => element.getBoundingClientRect().right > width + 1 && !(element instanceof SVGElement),
    );
    return outside.filter((element) => !scrolls(element)).map((element) => element.outerHTML.slice(0, 120));
  }, page.viewportSize()?.width ?? 0);

async function findings(page: Page, path: string): Promise<string[]> {
  await page.goto(path);
  await expect(page.getByRole("heading", { level: 1 })).toBeVisible();
  await expect(page.getByRole("status").filter({ has: page.locator("[data-slot=skeleton]") })).toHaveCount(0);
  const found: string[] = [];
  for (const theme of ["light", "dark"] as const) {
    await page.evaluate((name) => document.documentElement.setAttribute("data-theme", name), theme);
    // The other theme changes nothing but colors.
    const axe = new AxeBuilder({ page });
    const { violations } = await (theme === "light" ? axe.withTags(RULES) : axe.withRules("color-contrast")).analyze();
    for (const { id, nodes } of violations) {
      found.push(...nodes.map((node) => `${path} ${theme} ${id}: ${node.html.slice(0, 160)}`));
    }
  }
  found.push(...(await cutOff(page)).map((text) => `${path} does not fit: ${text}`));
  return found;
}

// Many pages, each examined twice, on a small machine.
test.slow();

// A color on its way from one theme to the other is neither.
test.use({ contextOptions: { reducedMotion: "reduce" } });

const walk = async (page: Page, paths: readonly string[]) => {
  const found: string[] = [];
  for (const path of paths) found.push(...(await findings(page, path)));
  return found;
};

test("everybody's pages keep WCAG 2.2 AA in both themes and fit the screen", async ({ page }) => {
  expect(await walk(page, OF_EVERYBODY)).toEqual([]);
});

for (const [role, paths] of Object.entries(OF_ROLES)) {
  test(`the ${role}'s pages keep WCAG 2.2 AA in both themes and fit the screen`, async ({ page }) => {
    await signInAs(page, role as Role);
    expect(await walk(page, paths)).toEqual([]);
  });
}

test("a site, a customer and a person, opened from their lists, keep it too", async ({ page }) => {
  await signInAs(page, "owner");
  const found: string[] = [];
  for (const list of ["/sites", "/customers", "/people"]) {
    await page.goto(list);
    const href = await page
      .getByRole("table")
      .getByRole("link")
      .and(page.locator(`[href^="${list}/"]`))
      .first()
      .getAttribute("href");
    found.push(...(await findings(page, href ?? "missing")));
  }
  expect(found).toEqual([]);
});
