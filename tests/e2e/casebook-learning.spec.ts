import { expect, test, type Page } from "@playwright/test";
import { pageFor } from "./people";

/** Moves the focus on until it is on this, as somebody without a mouse does. */
async function tabTo(page: Page, target: ReturnType<Page["locator"]>, most = 90): Promise<void> {
  for (let press = 0; press < most; press += 1) {
    if (await target.evaluate((element) => element === document.activeElement)) return;
    await page.keyboard.press("Tab");
  }
  throw new Error("The keyboard does not lead there.");
}

const zoomOf = (page: Page) =>
  page
    .locator(".compare .stage")
    .evaluateAll((stages) => stages.map((stage) => getComputedStyle(stage).getPropertyValue("--zoom")));
const placeOf = (page: Page) =>
  page
    .locator(".compare .stage")
    .evaluateAll((stages) => stages.map((stage) => getComputedStyle(stage).getPropertyValue("--at-x")));

test("a trainee sets two look-alikes side by side and zooms both in step, by keyboard", async ({ browser }) => {
  const page = await pageFor(browser, "trainee");
  await page.goto("/cases?status=sound");
  const ticks = page.getByRole("checkbox", { name: /^Set beside/ });
  await expect(ticks.first()).toBeEnabled();
  const names = await ticks.evaluateAll((boxes) => boxes.slice(0, 2).map((box) => (box as HTMLInputElement).value));

  for (const name of names) {
    const tick = page.getByRole("checkbox", { name: `Set beside ${name}` });
    await tick.focus();
    await page.keyboard.press("Space");
    await expect(tick).toBeChecked();
  }
  await expect(page).toHaveURL(new RegExp(`beside=${names.join("(%2C|,)")}`));
  await expect(page.getByRole("region", { name: "Side by side" })).toContainText("2 of 4");

  await test.step("the picks outlast another view of the list", async () => {
    await page.getByRole("link", { name: "Table", exact: true }).click();
    await expect(page.getByRole("table")).toBeVisible();
    await expect(page.getByRole("checkbox", { name: `Set beside ${names[0]}` })).toBeChecked();
  });

  const compare = page.getByRole("button", { name: "Compare 2 in step" }).filter({ visible: true });
  await compare.focus();
  await page.keyboard.press("Enter");
  await expect(page).toHaveURL(/\/cases\/compare\?refs=/);
  await expect(page.getByRole("article").filter({ has: page.locator(".stage") })).toHaveCount(2);

  await test.step("zoom and pan go together", async () => {
    await page.keyboard.press("z");
    await expect.poll(() => zoomOf(page)).toEqual(["2", "2"]);
    await page.keyboard.press("ArrowRight");
    // A fifth of what is seen at 2×: 0.5 + 0.2 / 2.
    await expect.poll(() => placeOf(page)).toEqual(["0.6", "0.6"]);
  });
  await test.step("out of step only one moves", async () => {
    await page.keyboard.press("0");
    await page.keyboard.press("s");
    await page.keyboard.press("z");
    await expect.poll(async () => (await zoomOf(page)).toSorted()).toEqual(["1", "2"]);
  });
});

test("a trainee keeps a search and finds it again", async ({ browser }) => {
  const page = await pageFor(browser, "trainee");
  const name = `Brass that waits ${Date.now()}`;
  await page.goto("/cases?metal=brass");
  await tabTo(page, page.locator(".saved-keep > summary"));
  await page.keyboard.press("Enter");
  await page.getByLabel("Name it").focus();
  await page.keyboard.type(name);
  await page.keyboard.press("Enter");

  const kept = page.getByRole("navigation", { name: "Searches you keep" });
  await expect(kept.getByRole("link", { name })).toHaveAttribute("aria-current", "page");
  await expect(page.locator(".saved-keep")).toHaveCount(0);

  await page.goto("/cases");
  await kept.getByRole("link", { name }).focus();
  await page.keyboard.press("Enter");
  await expect(page).toHaveURL(/\/cases\?metal=brass$/);
  await expect(page.getByRole("heading", { level: 1 })).toContainText("on brass");

  await test.step("a second one by that name is refused, and what was typed stays", async () => {
    await page.goto("/cases?metal=steel");
    await page.locator(".saved-keep > summary").click();
    await page.getByLabel("Name it").fill(name.toUpperCase());
    await page.getByRole("button", { name: "Keep it" }).click();
    await expect(page.getByLabel("Name it")).toHaveAttribute("aria-invalid", "true");
    await expect(page.getByLabel("Name it")).toHaveValue(name.toUpperCase());
  });
  await test.step("and removed it is gone", async () => {
    await page.getByText("Rename or remove").click();
    await page.getByRole("button", { name: `Remove ${name}` }).click();
    await expect(kept.getByRole("link", { name })).toHaveCount(0);
  });
});

test("without script ticks and tray are a plain form", async ({ browser }) => {
  const signedIn = await pageFor(browser, "trainee");
  const context = await browser.newContext({
    javaScriptEnabled: false,
    storageState: await signedIn.context().storageState(),
  });
  const page = await context.newPage();
  await page.goto("/cases?status=sound");
  const ticks = page.getByRole("checkbox", { name: /^Set beside/ });
  await ticks.nth(0).check({ force: true });
  await ticks.nth(1).check({ force: true });
  await page.getByRole("button", { name: "Compare in step" }).filter({ visible: true }).click();
  await expect(page).toHaveURL(/\/cases\/compare\?refs=CT-\d{4}-\d+(%2C|,)CT-\d{4}-\d+$/);
  await expect(page.getByRole("heading", { level: 1 })).not.toHaveText("Side by side");
});
