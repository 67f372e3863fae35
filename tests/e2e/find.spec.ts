import { expect, test } from "./fixtures";
import { signInAs } from "./people";

test("a dispatcher with a caller on the line types a street and sees site, contact, last and next visit", async ({
  page,
}) => {
  await signInAs(page, "dispatcher");
  await expect(page.getByRole("heading", { level: 1 })).toContainText("Run sheet");
  await page.keyboard.press("/");
  await page.getByPlaceholder(/Name, street/).fill("infirmary");
  const site = page.getByRole("option", { name: /Harbor Light Hospital, North Wing/ });
  await expect(site).toContainText("Renata Oduya");
  await expect(site).toContainText(/next \S+/);
  await page.keyboard.press("Enter");
  await expect(page).toHaveURL(/\/sites\//);
});

test("a telephone number finds the contact in any form", async ({ page }) => {
  await signInAs(page, "dispatcher");
  await expect(page.getByRole("heading", { level: 1 })).toContainText("Run sheet");
  await page.keyboard.press("Control+k");
  await page.getByPlaceholder(/Name, street/).fill("(360) 555-0160");
  await expect(page.getByRole("option", { name: /Renata Oduya/ })).toBeVisible();
});
