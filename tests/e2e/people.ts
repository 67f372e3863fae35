import { expect, type Page } from "@playwright/test";
import { demoAccounts } from "../../db/demo/accounts";
import { DEMO_PASSWORD } from "../../db/demo/people";
import type { Role } from "../../lib/domain/shared/roles";

export const addressOfRole = (role: Role): string =>
  demoAccounts().find((account) => account.role === role)?.email ?? "";

/** Signs in by hand, as a person would. */
export async function signIn(page: Page, email: string, password: string): Promise<void> {
  await page.goto("/sign-in");
  await page.getByLabel("E-mail address").first().fill(email);
  await page.getByLabel("Password").fill(password);
  await page.getByRole("button", { name: "Sign in", exact: true }).click();
  await expect(page).not.toHaveURL(/sign-in/);
}

export const signInAs = (page: Page, role: Role): Promise<void> => signIn(page, addressOfRole(role), DEMO_PASSWORD);
