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

test("there is no way in beside the form, whose attempts are counted", async ({ request }) => {
  for (const path of ["callback/password", "signin/password", "signin/email", "csrf", "session"]) {
    expect((await request.post(`/api/auth/${path}`, { form: { email: addressOfRole("owner") } })).status()).toBe(404);
  }
});

test("a password is not guessed: after ten attempts the account stays shut, right password or not", async ({
  page,
}) => {
  const email = `${crypto.randomUUID()}@stillwater.example`;
  await page.goto("/sign-in");
  for (let attempt = 1; attempt <= 11; attempt++) {
    await page.getByLabel("E-mail address").first().fill(email);
    await page.getByLabel("Password").fill(`guess number ${attempt}`);
    const answered = page.waitForResponse((response) => response.request().method() === "POST");
    await page.getByRole("button", { name: "Sign in", exact: true }).click();
    await answered;
  }
  await expect(page.getByText(/Too many attempts/).first()).toBeVisible();
});
