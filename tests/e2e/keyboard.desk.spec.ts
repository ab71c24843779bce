import path from "node:path";
import { expect, test, type Page } from "@playwright/test";
import { DEMO_PASSWORD } from "@/lib/crew/demo-sign-ins";
import { PEOPLE, watchConsole, type Person } from "./people";
import { stored } from "./stored";

const JPEG = path.resolve("tests/fixtures/part.jpg");

/** Goes on with the Tab key until the wanted control has the focus. Nothing here touches a mouse. */
async function tabTo(
  page: Page,
  wanted: { role: "button" | "link" | "textbox" | "radio" | "checkbox"; name: RegExp },
): Promise<void> {
  const control = page.getByRole(wanted.role, { name: wanted.name }).filter({ visible: true }).first();
  await expect(control).toBeVisible();
  for (let presses = 0; presses < 150; presses += 1) {
    if (await control.evaluate((element) => element === document.activeElement)) return;
    await page.keyboard.press("Tab");
  }
  throw new Error(`The Tab key never reaches ${wanted.name}.`);
}

/** Picks one of a radio group by Tab to the group and the arrow keys. */
async function arrowTo(page: Page, group: RegExp, name: RegExp): Promise<void> {
  const radios = page.getByRole("group", { name: group }).getByRole("radio");
  const wanted = page.getByRole("group", { name: group }).getByRole("radio", { name }).first();
  for (let presses = 0; presses < 150; presses += 1) {
    const inGroup = await radios.evaluateAll((all) => all.some((each) => each === document.activeElement));
    if (inGroup) break;
    await page.keyboard.press("Tab");
  }
  await page.keyboard.press("Space");
  for (let presses = 0; presses < 20 && !(await wanted.isChecked()); presses += 1)
    await page.keyboard.press("ArrowDown");
  await expect(wanted).toBeChecked();
}

async function signInByKeys(page: Page, person: Person): Promise<void> {
  await page.goto("/sign-in");
  await tabTo(page, { role: "textbox", name: /^E-mail/ });
  await page.keyboard.type(PEOPLE[person]);
  await page.keyboard.press("Tab");
  await page.keyboard.type(DEMO_PASSWORD);
  await page.keyboard.press("Enter");
  await expect(page).toHaveURL("/");
}

interface Row {
  state: string;
  round: number;
  closing: string | null;
}
const caseRow = (ref: string) => stored<Row>("select state, round, closing from cases where ref = ?", ref)[0];

test("snap, second look, card and outcome are done by keyboard alone", async ({ browser }) => {
  test.setTimeout(180_000);
  const plater = await (await browser.newContext()).newPage();
  watchConsole(plater);
  await signInByKeys(plater, "otherPlater");

  // "n" is the main action of the day: the snap.
  await plater.keyboard.press("n");
  await expect(plater).toHaveURL("/cases/snap");
  const chooser = plater.waitForEvent("filechooser");
  await tabTo(plater, { role: "button", name: /^Choose from files/ });
  await plater.keyboard.press("Enter");
  await (await chooser).setFiles(JPEG);
  await tabTo(plater, { role: "checkbox", name: /^Dark smut/ });
  await plater.keyboard.press("Space");
  await arrowTo(plater, /^Your call/, /activation/);
  await arrowTo(plater, /^How sure/, /^Certain/);
  await tabTo(plater, { role: "button", name: /^Hang the hold tag/ });
  await plater.keyboard.press("Enter");
  await expect(plater.getByRole("heading", { name: /Hold it/ })).toBeVisible();
  const tag = plater.getByText(/^CT-\d{4}-\d{4}$/).first();
  await expect(tag).toBeVisible();
  const ref = (await tag.textContent()) ?? "";

  const senior = await (await browser.newContext()).newPage();
  watchConsole(senior);
  await signInByKeys(senior, "senior");
  await senior.goto(`/cases/${ref}/second-look`);
  await expect(senior.getByRole("button", { name: /Confirm and send/ }).filter({ visible: true })).toBeVisible();
  // A key for the class, one for the cause, Enter sends.
  await senior.keyboard.press("1");
  await senior.keyboard.press("q");
  await senior.keyboard.press("Enter");
  await expect.poll(() => caseRow(ref)?.state).toBe("confirmed");

  await plater.goto(`/cases/${ref}/rework`);
  for (let step = 1; caseRow(ref)?.state !== "closed" && step <= 12; step += 1) {
    const tick = plater.getByRole("button", { name: new RegExp(`^Tick step ${step}$`) }).filter({ visible: true });
    const outcome = plater.getByRole("group", { name: "Outcome" });
    await expect(tick.or(outcome).first()).toBeVisible();
    if (await outcome.isVisible()) break;
    await tabTo(plater, { role: "button", name: new RegExp(`^Tick step ${step}$`) });
    await plater.keyboard.press("Enter");
    await expect(tick).toHaveCount(0);
  }
  await arrowTo(plater, /^Outcome/, /^Sound/);
  await tabTo(plater, { role: "textbox", name: /^Note/ });
  await plater.keyboard.type("Tape clean, no camera at hand");
  await tabTo(plater, { role: "button", name: /^Close as sound/ });
  await plater.keyboard.press("Enter");
  await expect.poll(() => caseRow(ref)).toEqual({ state: "closed", round: 1, closing: "sound" });
});

test("the line strip, the casebook's search and the library answer to keys", async ({ page }) => {
  watchConsole(page);
  await signInByKeys(page, "trainee");
  await page.keyboard.press("/");
  await expect(page).toHaveURL(/\/cases/);
  await page.goto("/cases");
  await tabTo(page, { role: "link", name: /^Activate/ });
  await page.keyboard.press("Enter");
  await expect(page).toHaveURL(/station=activate/);
  await page.goto("/library");
  const field = page.getByRole("combobox").or(page.getByRole("searchbox")).first();
  for (
    let presses = 0;
    presses < 60 && !(await field.evaluate((element) => element === document.activeElement));
    presses += 1
  ) {
    await page.keyboard.press("Tab");
  }
  await page.keyboard.type("pizza delivery");
  await expect(page.getByText("Nothing in the library answers “pizza delivery”.")).toBeVisible();
  await page.keyboard.press("Escape");
  await expect(field).toHaveValue("");
  await expect(field).toBeFocused();
  await page.keyboard.type("smutt");
  const hits = page.getByRole("list", { name: "What the library found" }).getByRole("link");
  await expect(hits.first()).toContainText("Overactivation");
  await expect(hits.first().locator("mark").first()).toHaveText(/smut/i);
  await page.keyboard.press("ArrowDown");
  await expect(hits.first()).toBeFocused();
  await page.keyboard.press("ArrowUp");
  await expect(field).toBeFocused();
  await page.keyboard.press("ArrowDown");
  await page.keyboard.press("Enter");
  await expect(page).toHaveURL(/\/library\/overactivation/);
});
