import { expect, type Browser, type Page } from "@playwright/test";
import { DEMO_PASSWORD } from "@/lib/crew/demo-sign-ins";

export const PEOPLE = {
  plater: "tobias@fernhollow.example",
  otherPlater: "marisol@fernhollow.example",
  trainee: "dara@fernhollow.example",
  senior: "ines@fernhollow.example",
  owner: "ruth@fernhollow.example",
  otherShopOwner: "owner@quarrylane.example",
} as const;
export type Person = keyof typeof PEOPLE;

/** Signs a person in on this page, as they would. */
export async function signIn(page: Page, person: Person): Promise<void> {
  await page.goto("/sign-in");
  await page.getByLabel("E-mail").fill(PEOPLE[person]);
  await page.getByLabel("Password", { exact: true }).fill(DEMO_PASSWORD);
  await page.getByRole("button", { name: "Sign in" }).click();
  await expect(page).toHaveURL("/");
}

/** A browser of their own for one person. A console error fails the test that watches it. */
export async function pageFor(browser: Browser, person: Person): Promise<Page> {
  const context = await browser.newContext();
  const page = await context.newPage();
  watchConsole(page);
  await signIn(page, person);
  return page;
}

/** Nothing may go wrong unseen: an error in the browser's console fails the test. */
export function watchConsole(page: Page): void {
  page.on("pageerror", (error) => {
    throw error;
  });
  page.on("console", (message) => {
    if (message.type() === "error")
      throw new Error(`Console error on ${page.url()}: ${message.text()} ${message.location().url}`);
  });
}
