import { FIRST_SCREEN, ROLES } from "../../lib/domain/shared/roles";
import { expect, test } from "./fixtures";
import { addressOfRole, signInAs } from "./people";

for (const role of ROLES) {
  test(`a ${role} lands on the first screen of that role`, async ({ page }) => {
    await signInAs(page, role);
    await expect(page).toHaveURL(new RegExp(`${FIRST_SCREEN[role]}$`));
    await expect(page.getByRole("heading", { level: 1 })).toBeVisible();
  });
}

test("a stranger and a wrong password hear the same words", async ({ page }) => {
  const answers: (string | null)[] = [];
  for (const email of ["nobody@nowhere.example", addressOfRole("owner")]) {
    await page.goto("/sign-in");
    await page.getByLabel("E-mail address").first().fill(email);
    await page.getByLabel("Password").fill("not the password");
    await page.getByRole("button", { name: "Sign in", exact: true }).click();
    const refusal = page.getByText("E-mail address or password is not right");
    await expect(refusal.first()).toBeVisible();
    answers.push(await refusal.first().textContent());
    await expect(page.getByLabel("E-mail address").first()).toHaveValue(email);
  }
  expect(answers[0]).toBe(answers[1]);
});

test("a page asked for before signing in is shown after it", async ({ page }) => {
  await page.goto("/people");
  await expect(page).toHaveURL(/sign-in\?next=/);
  await page.getByLabel("E-mail address").first().fill(addressOfRole("owner"));
  await page.getByLabel("Password").fill("coast-down-demo");
  await page.getByRole("button", { name: "Sign in", exact: true }).click();
  await expect(page).toHaveURL(/\/people$/);
});

test("a technician does not get into the office, nor a customer", async ({ page }) => {
  await signInAs(page, "technician");
  await page.goto("/people");
  await expect(page.getByText("Marisol")).toHaveCount(0);
});
