import fs from "node:fs";
import { expect, test, type Page } from "@playwright/test";
import { pageFor } from "./people";
import { stored } from "./stored";

const CAUSE = "dried-between-tanks";
const EDIT = `/library/edit/cause/${CAUSE}`;
/** The publishing button that is on this screen: under the thumb on a phone, last in the form on a desk. */
const publish = (page: Page) =>
  page
    .getByRole("button", { name: /^Publish/ })
    .filter({ visible: true })
    .first()
    .click();

/** Words of this run alone: the library keeps what earlier runs wrote in it. */
const RUN = Date.now().toString(36);
const NAME = `Smoky edges ${RUN}`;

/** Opens an editor and waits for its scripts: a person types no sooner either. */
async function openEditor(page: Page, path: string): Promise<void> {
  await page.goto(path);
  await expect(page.locator("form[data-live]")).toBeVisible();
}

interface StoredRow {
  state: string;
  revision: number;
  body: string;
}
const rowsOf = (shop: string, slug: string) =>
  stored<StoredRow>(
    `select r.state, r.revision, r.body from library_revisions r join shops s on s.id = r.shop_id
     where s.slug = ? and r.slug = ? order by r.id`,
    shop,
    slug,
  );
const wordsOf = (row: StoredRow | undefined) => JSON.parse(row?.body ?? "{}") as { why: string; proof: string };

test("two seniors edit one entry in two browsers: neither loses a word", async ({ browser }) => {
  const ines = await pageFor(browser, "senior");
  const ruth = await pageFor(browser, "owner");
  await openEditor(ines, EDIT);
  await openEditor(ruth, EDIT);
  const why = await ines.getByLabel("Why it happens").inputValue();
  const ruthSays = `Ruth timed the gap at the hoist, ${RUN}.`;
  const inesSays = `Ines saw it in the summer, ${RUN}.`;
  const begun = rowsOf("fernhollow", CAUSE).length;
  const revision = Math.max(...rowsOf("fernhollow", CAUSE).map((row) => row.revision));
  await ruth.getByLabel("Why it happens").fill(`${why} ${ruthSays}`);
  await ruth.getByLabel("Proof").fill(`Ruth’s proof ${RUN}: a stop watch at the hoist.`);
  await publish(ruth);
  await expect(ruth.getByText(`Revision ${revision + 1} is published`)).toBeVisible();

  await ines.getByLabel("Why it happens").fill(`${why} ${inesSays}`);
  await ines.getByLabel("What people also say").fill(`hoist gap ${RUN}`);
  await publish(ines);
  await expect(ines.getByText("published this since you began").first()).toBeVisible();
  await expect(ines.getByText("Only you changed what people also say: yours stand.")).toBeVisible();
  await expect(ines.getByText(/Only .* changed proof: theirs stand/)).toBeVisible();
  await expect(ines.getByText(inesSays).filter({ visible: true }).first()).toBeVisible();
  const kept = rowsOf("fernhollow", CAUSE).slice(begun);
  expect(kept.map((row) => row.state)).toEqual(["published", "draft"]);
  expect(wordsOf(kept[1]).why).toContain(inesSays);

  await ines.getByRole("radio", { name: "Both, one after the other" }).check();
  await publish(ines);
  await expect(ines.getByText(`Revision ${revision + 2} is published`)).toBeVisible();
  const last = wordsOf(rowsOf("fernhollow", CAUSE).at(-1));
  expect(last.why).toContain(ruthSays);
  expect(last.why).toContain(inesSays);
  expect(last.proof).toBe(`Ruth’s proof ${RUN}: a stop watch at the hoist.`);

  // What was published is found at once, and the revision that both began from comes back on top.
  await ines.goto("/library?q=hoist+gap");
  await expect(ines.getByRole("link", { name: /dr(ied|y)/i }).first()).toBeVisible();
  await ines.goto(`${EDIT}/revisions`);
  await ines.getByRole("button", { name: `Bring this one back: Revision ${revision},` }).click();
  await expect(ines.getByText(`Revision ${revision + 3} is published`)).toBeVisible();
  expect(wordsOf(rowsOf("fernhollow", CAUSE).at(-1)).why).toBe(why);
  await ines.context().close();
  await ruth.context().close();
});

test("typing that was never saved is offered again in the same tab", async ({ browser }) => {
  const page = await pageFor(browser, "senior");
  await openEditor(page, "/library/edit/cause/rinse-water-hard");
  const proof = page.getByLabel("Proof");
  const before = await proof.inputValue();
  await proof.fill("A drop on a hot slide.");
  await page.goto("/library");
  await openEditor(page, "/library/edit/cause/rinse-water-hard");
  await expect(proof).toHaveValue(before);
  await page.getByRole("button", { name: "Put it back" }).click();
  await expect(proof).toHaveValue("A drop on a hot slide.");
  await page.context().close();
});

test("typing put back after somebody published still meets what they published", async ({ browser }) => {
  const slug = "rinse-dirty";
  const ines = await pageFor(browser, "senior");
  const ruth = await pageFor(browser, "owner");
  await openEditor(ines, `/library/edit/cause/${slug}`);
  await ines.getByLabel("Proof").fill("Ines’s proof, never saved.");
  await ines.goto("/library");
  await openEditor(ruth, `/library/edit/cause/${slug}`);
  await ruth.getByLabel("Proof").fill(`Ruth’s proof, published ${RUN}.`);
  await publish(ruth);
  await expect(ruth.getByText(/Revision \d+ is published/)).toBeVisible();
  await openEditor(ines, `/library/edit/cause/${slug}`);
  await expect(ines.getByLabel("Proof")).toHaveValue(`Ruth’s proof, published ${RUN}.`);
  await ines.getByRole("button", { name: "Put it back" }).click();
  await publish(ines);
  await expect(ines.getByText("Proof: you both changed it")).toBeVisible();
  await ines.context().close();
  await ruth.context().close();
});

test("a class of the shop’s own: made, called at the snap, taken to the other shop as a file", async ({ browser }) => {
  const page = await pageFor(browser, "senior");
  await openEditor(page, "/library/edit/class");
  await page.getByLabel("Name", { exact: true }).fill(NAME);
  await page.getByLabel("In one line").fill("A grey veil along the edges.");
  await publish(page);
  await expect(page.getByText("Not saved")).toBeVisible();
  await expect(page.getByLabel("In one line")).toHaveValue("A grey veil along the edges.");
  await page.getByLabel("At the strike").fill("A grey veil that wipes to a stain.");
  await page.getByLabel("Later, in the final plate").fill("Dull nickel at the edges.");
  await page.getByLabel("What taking it off means").fill("Polish it back and strike again.");
  await page.getByText("A source that is not listed").click();
  await page.getByLabel("Kind of source").selectOption("from-memory");
  await page.getByLabel("Citation").fill("From memory: Ines, 2026");
  await page.getByRole("button", { name: "Keep as my draft" }).click();
  await expect(page.getByText("Your draft is kept")).toBeVisible();
  await publish(page);
  await expect(page.getByText("Revision 1 is published")).toBeVisible();
  const slug = `smoky-edges-${RUN}`;
  await page.goto(`/library/${slug}`);
  await expect(page.getByRole("heading", { level: 1, name: NAME })).toBeVisible();

  const waiting = page.waitForEvent("download");
  await page.goto("/library/port");
  await page.getByRole("link", { name: "Take the library out" }).click();
  const file = await (await waiting).path();
  expect(JSON.parse(fs.readFileSync(file, "utf8"))).toMatchObject({ format: "coppertell-library", version: 1 });

  const other = await pageFor(browser, "otherShopOwner");
  await other.goto("/library/port");
  await other.getByLabel("Library file").setInputFiles({
    name: "hostile.json",
    mimeType: "application/json",
    buffer: Buffer.from("[".repeat(5_000)),
  });
  await other.getByRole("button", { name: "Look at it first" }).click();
  await expect(other.getByText("nests deeper than")).toBeVisible();
  await other.getByLabel("Library file").setInputFiles({
    name: "library.json",
    mimeType: "application/json",
    buffer: fs.readFileSync(file),
  });
  await other.getByRole("button", { name: "Look at it first" }).click();
  await expect(other.getByRole("checkbox", { name: NAME })).toBeChecked();
  expect(rowsOf("quarry-lane", slug)).toEqual([]);
  await other.getByRole("radio", { name: "Publish at once" }).first().check();
  await other.getByRole("button", { name: "Bring in what is ticked" }).first().click();
  await expect(other.getByText("Brought in").first()).toBeVisible();
  expect(rowsOf("quarry-lane", slug).map((row) => row.state)).toEqual(["published"]);
  await other.context().close();

  const plater = await pageFor(browser, "plater");
  await plater.goto("/cases/snap");
  await plater.getByRole("button", { name: "Another" }).last().click();
  await plater.getByRole("radio", { name: new RegExp(NAME, "i") }).check();
  await expect(plater.getByRole("radio", { name: new RegExp(NAME, "i") }).first()).toBeChecked();
  await plater.context().close();
  await page.context().close();
});

test("an entry that cases point at says so instead of being removed", async ({ browser }) => {
  const page = await pageFor(browser, "senior");
  await page.goto("/library/edit/class/underactivation");
  await expect(page.getByText("It cannot be removed while these point at it.")).toBeVisible();
  await expect(page.getByRole("link", { name: /cases? stands? under it/ })).toHaveAttribute(
    "href",
    "/cases?class=underactivation",
  );
  await expect(page.getByRole("button", { name: "Remove from the library" })).toHaveCount(0);
  await page.context().close();
});
