import { expect, test, type Browser, type Page } from "@playwright/test";
import { signIn, watchConsole } from "./people";
import { stored } from "./stored";

const SIZES = [
  { name: "phone", viewport: { width: 360, height: 780 } },
  { name: "bench", viewport: { width: 1440, height: 900 } },
] as const;

async function seniorAt(browser: Browser, viewport: { width: number; height: number }): Promise<Page> {
  const context = await browser.newContext({ viewport });
  const page = await context.newPage();
  watchConsole(page);
  await signIn(page, "senior");
  return page;
}

const way = (page: Page, name: string) => page.getByRole("article", { name, exact: true });
const answer = (page: Page) => page.getByRole("heading", { level: 1 });
const press = (page: Page, name: string) =>
  page.getByRole("button", { name, exact: true }).filter({ visible: true }).first().click();
/** The sum of a way, in whole units. */
const sumOf = async (page: Page, name: string) =>
  Number(/\$([\d,]+)/.exec((await way(page, name).innerText()) ?? "")?.[1]?.replaceAll(",", ""));

/** Brass with copper, nickel and a gold of which only a range is known. */
async function buildStack(page: Page): Promise<void> {
  await page.getByLabel("Base metal", { exact: true }).selectOption({ label: "Brass" });
  await page.getByLabel("Thickness of layer 1, µm").fill("1");
  await press(page, "Add a layer");
  await page.getByLabel("Metal of layer 3").selectOption({ label: "Gold" });
  await page.getByLabel("Thickness of layer 3, µm").fill("0.6");
  await page.getByLabel("Thickness of layer 3 at most, µm", { exact: false }).fill("1.2");
  await page.getByLabel("Parts", { exact: true }).fill("12");
  await page.getByLabel("Part value, each").fill("610");
}

for (const { name, viewport } of SIZES) {
  test(`a senior works out a batch by hand, ${name}`, async ({ browser }, testInfo) => {
    const page = await seniorAt(browser, viewport);
    await page.goto("/costs/strip");
    await expect(answer(page)).toContainText("After nickel, this part costs about $");

    await test.step("builds the stack, and reads the answer and its range", async () => {
      await buildStack(page);
      await expect(answer(page)).toContainText("After gold, these 12 parts cost about $");
      const section = page.getByRole("img", {
        name: /^Section, from the top: 0\.9 µm gold, 5 µm nickel, 1 µm copper, on brass/,
      });
      await expect(section.first()).toBeVisible();
      await expect(
        way(page, "Electrolytic").getByRole("img", { name: /^Estimate: likely \$[\d,.]+, \$[\d,.]+ to \$/ }),
      ).toBeVisible();
      await expect(way(page, "Electrolytic")).toContainText(/\$[\d,.]+ to \$[\d,.]+\. .+ hands-on\./);
      await expect(way(page, "At the strike")).toContainText(/of the price\./);
    });

    await test.step("sees the bath that attacks brass refused with its reason, and no figure", async () => {
      const refused = way(page, "Chemical immersion");
      await expect(refused).toContainText("Not offered: it attacks brass.");
      await expect(refused).toContainText("so nobody can pick it by price");
      await expect(refused).not.toContainText("$");
    });

    await test.step("finds the strong caution with its stop sign beside the steps", async () => {
      const stop = way(page, "Electrolytic").getByText("Never let acid meet cyanide");
      await expect(stop).toBeVisible();
      await expect(way(page, "Electrolytic").getByRole("img", { name: "Stop" }).first()).toBeVisible();
    });

    await test.step("changes the area by a shape, and the figures follow", async () => {
      const before = await sumOf(page, "Polish back");
      await page.getByLabel("Area of one part").selectOption({ label: "Plate, both sides" });
      await page.getByLabel("Length", { exact: true }).fill("20");
      await page.getByLabel("Width", { exact: true }).fill("10");
      // 2 × 20 × 10 cm² is 4 dm².
      await expect(page.getByText("4 dm², 62 in²")).toBeVisible();
      await expect.poll(() => sumOf(page, "Polish back")).toBeGreaterThan(before);
    });

    await test.step("keeps what was typed wrong, beside its reason", async () => {
      await page.getByLabel("Width", { exact: true }).fill("ten");
      await expect(page.getByLabel("Width", { exact: true })).toHaveValue("ten");
      await expect(page.getByText("Write a number such as 4 or 4.5", { exact: false }).first()).toBeVisible();
      await expect(page.getByText("The figures wait for the marked field")).toBeVisible();
      await page.getByLabel("Width", { exact: true }).fill("10");
      await expect(page.getByText("The figures wait for the marked field")).toHaveCount(0);
    });

    await test.step("the address holds all of it: opened again it says the same", async () => {
      await expect(page).toHaveURL(/metal3=Au&thickness3=0\.6&to3=1\.2/);
      await expect(page).toHaveURL(/shape=plate/);
      // The address follows the typing a moment later: the mended width must be in it before it is opened again.
      await expect(page).toHaveURL(/[?&]width=10(&|$)/);
      const said = await answer(page).innerText();
      await page.reload();
      await expect(answer(page)).toHaveText(said);
    });

    await test.step("prints one clean sheet", async () => {
      await page.emulateMedia({ media: "print" });
      const sheet = page.locator(".strip-sheet");
      await expect(sheet).toBeVisible();
      await expect(sheet).toContainText("Estimate, not an offer.");
      await expect(sheet).toContainText("Not offered: it attacks brass.");
      await expect(page.getByRole("button", { name: "Add a layer" })).toBeHidden();
      await testInfo.attach("sheet", { body: await page.screenshot({ fullPage: true }), contentType: "image/png" });
      const pdf = (await page.pdf({ preferCSSPageSize: true })).toString("latin1");
      expect(pdf.match(/\/Type\s*\/Page\b(?!s)/g)).toHaveLength(1);
    });
    await page.context().close();
  });
}

test("a senior takes a held case to the estimator and puts a way on it", async ({ browser }) => {
  const page = await seniorAt(browser, { width: 1440, height: 900 });
  const held = stored<{ ref: string }>(
    `select c.ref from cases c join shops s on s.id = c.shop_id
     where s.slug = 'fernhollow' and c.state = 'held' and c.strip_method is null order by c.id limit 1`,
  )[0];
  const ref = held?.ref ?? "none";
  await page.goto(`/cases/${ref}`);
  await page.getByRole("link", { name: "Work out the strip" }).click();
  await expect(page).toHaveURL(`/costs/strip?case=${ref}`);
  await expect(page.getByRole("link", { name: new RegExp(`^${ref}, `) })).toBeVisible();
  await expect(page.getByText("Filled in from the case and its job.", { exact: false })).toBeVisible();
  await press(page, "Put this on the case");
  await expect(page.getByText(`is on ${ref}`, { exact: false })).toBeVisible();
  const method = stored<{ strip_method: string | null }>(
    "select c.strip_method from cases c join shops s on s.id = c.shop_id where s.slug = 'fernhollow' and c.ref = ?",
    ref,
  )[0]?.strip_method;
  expect(["polish-back", "chemical", "electrolytic"]).toContain(method);
  await page.context().close();
});

test("without script the estimator is a form that answers", async ({ browser }) => {
  const signedIn = await seniorAt(browser, { width: 1440, height: 900 });
  const context = await browser.newContext({
    javaScriptEnabled: false,
    storageState: await signedIn.context().storageState(),
  });
  const page = await context.newPage();
  await page.goto("/costs/strip?base=brass");
  await page.getByLabel("Parts", { exact: true }).fill("3");
  await press(page, "Add a layer");
  await expect(page).toHaveURL(/parts=3/);
  await expect(page.getByLabel("Metal of layer 3")).toHaveValue("Au");
  await expect(answer(page)).toContainText("After gold, these 3 parts cost about $");
  await press(page, "Use this one");
  await expect(way(page, "Polish back")).toContainText("Picked");
  await context.close();
  await signedIn.context().close();
});

test("a plater is told who may work out a strip", async ({ browser }) => {
  const context = await browser.newContext();
  const page = await context.newPage();
  await signIn(page, "plater");
  const answered = await page.goto("/costs/strip");
  expect(answered?.status()).toBe(403);
  await expect(page.getByText("$")).toHaveCount(0);
  await context.close();
});
