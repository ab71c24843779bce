import { expect, test, type Page } from "@playwright/test";
import { pageFor } from "./people";
import { stored } from "./stored";

interface StoredRow {
  id: number;
  rates: string;
  valid_from_at: number;
}
const newestRow = () =>
  stored<StoredRow>(
    "select r.* from shop_rates r join shops s on s.id = r.shop_id where s.slug = 'fernhollow' order by r.id desc limit 1",
  )[0];

/** The field of a rate, by its own name: labels carry notes. */
const field = (page: Page, name: string) => page.locator(`#rates-form input[name="${name}"]`);
/** What a field holds, raised by a factor. */
async function raised(page: Page, name: string, factor: number): Promise<string> {
  return (Number(await field(page, name).inputValue()) * factor).toFixed(2);
}
const cellOf = (page: Page, row: RegExp, column: number) =>
  page.getByRole("row", { name: row }).first().getByRole("cell").nth(column);
const save = (page: Page) => page.getByRole("button", { name: /^Save/ }).filter({ visible: true }).first().click();

test("an owner sees what labour and gold do to a rework before the rates are saved", async ({ browser }) => {
  const page = await pageFor(browser, "owner");
  await page.goto("/costs/rates");
  await expect(page.getByRole("heading", { level: 1 })).toContainText("These rates hold since");
  const before = newestRow();
  const labour = await raised(page, "labour", 1.1);
  await field(page, "labour").fill(labour);
  await expect(page.getByRole("heading", { level: 1 })).toContainText("One rate changes today");
  // A tenth more an hour is a tenth more in the line of labour, to the cent that rounding costs.
  const cents = async (column: number) =>
    Math.round(Number(((await cellOf(page, /^Labour,/, column).textContent()) ?? "").replace(/[$,]/g, "")) * 100);
  await expect.poll(async () => (await cents(1)) / (await cents(0))).toBeCloseTo(1.1, 1);
  const gold = await raised(page, "price-Au", 1.05);
  await field(page, "price-Au").fill(gold);
  await expect(page.getByRole("heading", { level: 1 })).toContainText("Two rates change today");
  await expect(page.locator(".rate-row--moved")).toHaveCount(2);
  await expect(page.getByText("+5%")).toBeVisible();
  expect(newestRow()?.id, "nothing is saved while it is typed").toBe(before?.id);

  await field(page, "source").fill("wage round and price list");
  await save(page);
  await expect(page.getByText("The rates are set")).toBeVisible();
  const after = newestRow();
  const rates = JSON.parse(after?.rates ?? "{}") as { labourCentsPerHour: number; source: string };
  expect(after?.id).toBeGreaterThan(before?.id ?? 0);
  expect(rates.labourCentsPerHour).toBe(Math.round(Number(labour) * 100));
  expect(rates.source).toBe("wage round and price list");
  await expect(page.getByRole("heading", { level: 1 })).toContainText("These rates hold since");
  await page.context().close();
});

test("a bad figure stays as it was typed; the preview says which figure it waits for", async ({ browser }) => {
  const page = await pageFor(browser, "owner");
  await page.goto("/costs/rates");
  const before = newestRow();
  await field(page, "labour").fill("5six");
  await field(page, "source").fill("by ear");
  await expect(page.getByRole("heading", { level: 1 })).toContainText("Labour is no number yet.");
  await save(page);
  await expect(page.getByText("Not saved")).toBeVisible();
  await expect(field(page, "labour")).toHaveValue("5six");
  await expect(field(page, "source")).toHaveValue("by ear");
  await expect(field(page, "labour")).toHaveAttribute("aria-invalid", "true");
  await expect(page.getByRole("heading", { level: 1 })).toContainText("Labour is no number yet.");
  expect(newestRow()?.id).toBe(before?.id);
  await page.context().close();
});

test("rates are tried on a closed case by its reference", async ({ browser }) => {
  const page = await pageFor(browser, "owner");
  await page.goto("/costs/rates");
  await page.getByRole("radio", { name: /Another closed case/ }).check();
  const choice = page.getByLabel("Case", { exact: true });
  const ref = /CT-\d{4}-\d{4}/.exec((await choice.locator("option").nth(1).textContent()) ?? "")?.[0] ?? "";
  await choice.selectOption({ index: 1 });
  await expect(page.getByText(`Example: ${ref} priced again`)).toBeVisible();
  await page.context().close();
});
