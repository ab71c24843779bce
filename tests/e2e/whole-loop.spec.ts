import path from "node:path";
import { expect, test, type Browser, type Page } from "@playwright/test";
import sharp from "sharp";
import { pageFor } from "./people";
import { bytesOf, fileOf, sizesOf, stored } from "./stored";

const FIXTURES = path.resolve("tests/fixtures");
const JPEG = path.join(FIXTURES, "part.jpg");
const HEIC = path.join(FIXTURES, "part.heic");
const NOTE = "Verdigris creeping by the keyway";

const press = (page: Page, name: string | RegExp) =>
  page.getByRole("button", { name }).filter({ visible: true }).click();
const choose = (page: Page, group: string, name: RegExp) =>
  page.getByRole("group", { name: group }).getByLabel(name).first().check();

interface StoredCase {
  state: string;
  round: number;
  closing: string | null;
  called_class: string | null;
  confirmed_class: string | null;
  cost_basis: string;
  cost_cents: number;
}
const caseRow = (ref: string) => stored<StoredCase>("select * from cases where ref = ?", ref)[0];

/** The plater's part: two photos, what is seen, a call, the tag. Returns the reference. */
async function snap(page: Page): Promise<string> {
  await page.goto("/cases/snap");
  await page.getByLabel("Photo files").setInputFiles([JPEG, HEIC]);
  const began = Date.now();
  await choose(page, "What do you see?", /^Patchy, hazy/);
  await choose(page, "Your call", /^Dewetting/);
  await choose(page, "How sure", /^Fairly sure/);
  await page.getByText("Add a note").click();
  await page.getByRole("textbox", { name: "Note" }).fill(NOTE);
  await press(page, "Hang the hold tag");
  await expect(page.getByRole("heading", { name: /Hold it/ })).toBeVisible();
  expect(Date.now() - began, "a plater is done within 20 s of the photo").toBeLessThan(20_000);
  const tag = page.getByText(/^CT-\d{4}-\d{4}$/).first();
  await expect(tag).toBeVisible();
  return (await tag.textContent()) ?? "";
}

/** The senior's second look: the class is not what was called. */
async function confirm(browser: Browser, ref: string): Promise<void> {
  const page = await pageFor(browser, "senior");
  await page.goto("/cases/second-look");
  await expect(page.getByText(ref).first()).toBeVisible();
  await page.goto(`/cases/${ref}/second-look`);
  const underactivation = page.getByRole("radio", { name: "Underactivation" });
  if (!(await underactivation.isVisible())) await page.getByText("All classes").click();
  await choose(page, "Class", /Underactivation/);
  await choose(page, "Cause", /Activator past its day/);
  await press(page, /Confirm and send the card/);
  await expect(page).not.toHaveURL(new RegExp(`${ref}/second-look`));
  await page.context().close();
}

/** Ticks every step of the card, as planned, and says how the re-strike came out. */
async function doCard(page: Page, ref: string, outcome: RegExp, button: string): Promise<void> {
  await page.goto(`/cases/${ref}/rework`);
  const steps = stored<{ cautions: string }>(
    `select s.cautions from rework_steps s join rework_cards k on k.id = s.card_id join cases c on c.id = k.case_id
     where c.ref = ? and k.round = c.round order by s.position`,
    ref,
  ).map((step) => JSON.parse(step.cautions) as { text: string }[]);
  expect(steps.flat().length, "the card warns of something").toBeGreaterThan(0);
  for (const [index, cautions] of steps.entries()) {
    const tick = `Tick step ${index + 1}`;
    await expect(page.getByRole("button", { name: tick, exact: true }).filter({ visible: true })).toBeVisible();
    for (const { text } of cautions) await expect(page.getByText(text).first()).toBeVisible();
    await press(page, tick);
    await expect(page.getByRole("button", { name: tick, exact: true })).toHaveCount(0);
  }
  await page.getByLabel("Photo files").setInputFiles(JPEG);
  await choose(page, "Outcome", outcome);
  await press(page, button);
}

test("a suspect part goes from the snap through a failed round to a closed case that everybody finds again", async ({
  browser,
}) => {
  test.setTimeout(240_000);
  const plater = await pageFor(browser, "plater");
  const ref = await snap(plater);

  await test.step("both photos are stored in three sizes, upright, without where they were taken", async () => {
    await expect.poll(() => sizesOf(ref, "suspect", 1).length, { timeout: 60_000 }).toBe(6);
    for (const size of sizesOf(ref, "suspect", 1)) {
      expect(bytesOf(size)).toBe(size.bytes);
      const picture = await sharp(fileOf(size)).metadata();
      expect(picture.exif).toBeUndefined();
      expect([picture.width, picture.height]).toEqual([size.width, size.height]);
    }
    // The fixture JPEG is 1600 × 1200 with orientation 6: upright it stands. The HEIC lies, 1200 × 900.
    const originals = sizesOf(ref, "suspect", 1).filter((size) => size.size === "original");
    expect(originals.map((size) => [size.width, size.height])).toEqual([
      [1200, 1600],
      [1200, 900],
    ]);
    expect(
      stored(
        "select p.id from photos p join cases c on c.id = p.case_id where c.ref = ? and p.taken_at is not null",
        ref,
      ),
    ).toHaveLength(2);
  });
  expect(caseRow(ref)).toMatchObject({ state: "held", called_class: "dewetting", round: 1 });

  await confirm(browser, ref);
  expect(caseRow(ref)).toMatchObject({
    state: "confirmed",
    confirmed_class: "underactivation",
    cost_basis: "estimate",
  });

  await doCard(plater, ref, /^Same fault/, "Back to second look");
  await expect(plater.getByRole("heading", { name: "Back on hold" })).toBeVisible();
  expect(caseRow(ref)).toMatchObject({ state: "held", round: 2 });

  await confirm(browser, ref);
  await doCard(plater, ref, /^Sound/, "Close as sound");
  await expect(plater.getByRole("heading", { name: "Closed as sound" })).toBeVisible();
  expect(caseRow(ref)).toMatchObject({ state: "closed", closing: "sound", round: 2, cost_basis: "recorded" });
  await expect
    .poll(() => sizesOf(ref, "re-strike", 1).length + sizesOf(ref, "re-strike", 2).length, { timeout: 60_000 })
    .toBe(6);

  await test.step("its history is whole", () => {
    const events = stored<{ event: string }>(
      "select e.event from case_events e join cases c on c.id = e.case_id where c.ref = ? order by e.id",
      ref,
    );
    expect(events.map((row) => row.event)).toEqual([
      "opened",
      "confirmed",
      "rework-started",
      "re-strike-failed",
      "confirmed",
      "rework-started",
      "re-strike-sound",
    ]);
    const said = stored<{ kind: string; class_slug: string }>(
      "select k.kind, k.class_slug from calls k join cases c on c.id = k.case_id where c.ref = ? order by k.id",
      ref,
    );
    expect(said.map((row) => `${row.kind} ${row.class_slug}`)).toEqual([
      "first dewetting",
      "second-look underactivation",
      "second-look underactivation",
    ]);
  });

  await test.step("a trainee finds it by a misspelt word, and sees no money", async () => {
    const trainee = await pageFor(browser, "trainee");
    await trainee.goto("/cases?q=verdigirs+keyway");
    await trainee
      .getByRole("link", { name: new RegExp(ref) })
      .first()
      .click();
    await expect(trainee).toHaveURL(`/cases/${ref}`);
    await expect(trainee.getByText("Closed, sound in round 2").first()).toBeVisible();
    await expect(trainee.getByText("$")).toHaveCount(0);
    await trainee.context().close();
  });

  await test.step("the owner sees its cost under the cause, and gets from the bar to the case", async () => {
    const owner = await pageFor(browser, "owner");
    await owner.goto("/costs");
    await owner
      .getByRole("link", { name: /^Activator past its day: / })
      .filter({ visible: true })
      .first()
      .click();
    await expect(owner.getByText(ref).first()).toBeVisible();
    const ledger = (await (await owner.request.get("/api/ledger?by=cause")).json()) as {
      rows: { label: string; cost: number }[];
    };
    const sum = stored<{ cents: number }>(
      `select sum(c.cost_cents) as cents from cases c join library_causes k on k.id = c.confirmed_cause_id join shops s on s.id = c.shop_id
       where s.slug = 'fernhollow' and k.title = 'Activator past its day' and c.state = 'closed' and c.closed_at > ?`,
      Date.now() - 29 * 86_400_000,
    )[0];
    expect(ledger.rows.find((row) => row.label === "Activator past its day")?.cost).toBeGreaterThanOrEqual(
      sum?.cents ?? Infinity,
    );
    await owner.goto(`/cases/${ref}`);
    const cents = caseRow(ref)?.cost_cents ?? 0;
    await expect(owner.getByText(`$${(cents / 100).toFixed(2)}`).first()).toBeVisible();
    await owner.context().close();
  });

  await test.step("nobody of another shop sees any of it", async () => {
    const stranger = await pageFor(browser, "otherShopOwner");
    expect((await stranger.request.get(`/api/cases/${ref}`)).status()).toBe(404);
    const photo = sizesOf(ref, "suspect", 1)[0]?.photo_id;
    expect((await stranger.request.get(`/api/photos/${photo}/view`)).status()).toBe(404);
    // Words that only this case has find nothing of it there, though shops may share a reference.
    const found = await (await stranger.request.get("/api/cases?q=verdigris+creeping+keyway")).text();
    expect(found).not.toContain("Verdigris creeping");
    expect(found).not.toContain("Tobias");
    await stranger.context().close();
  });
  await plater.context().close();
});
