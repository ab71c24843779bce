import { expect, test, type Page, type Response } from "@playwright/test";
import { pageFor } from "./people";
import { stored } from "./stored";

interface Part {
  ref: string;
  case_id: number;
  photo_id: string;
  file_name: string;
  placeholder: string | null;
  note: string;
  snap_key: string;
  class_slug: string;
  number: string;
  paths: string;
}

/** What is really behind a question, read from the server's database. */
function partOf(questionId: string): Part {
  const [part] = stored<Part>(
    `select c.ref, c.id case_id, p.id photo_id, p.file_name, p.placeholder, c.note, c.snap_key, c.confirmed_class class_slug,
            w.number, (select group_concat(path, '|') from photo_sizes s where s.photo_id = p.id) paths
     from practice_questions q join cases c on c.id = q.case_id join photos p on p.id = q.photo_id
     join work_orders w on w.id = c.work_order_id where q.id = ?`,
    questionId,
  );
  if (!part) throw new Error("No such question is stored.");
  return part;
}

const secretsOf = (part: Part) =>
  [
    part.ref,
    part.photo_id,
    part.photo_id.slice(0, 8),
    part.snap_key,
    part.file_name,
    part.placeholder,
    part.note,
    part.number,
  ]
    .concat(part.paths.split("|"))
    .filter((each): each is string => typeof each === "string" && each.length > 3);

const idOf = (page: Page) => new URL(page.url()).pathname.split("/").at(-1) ?? "";
const press = (page: Page, name: RegExp) => page.getByRole("button", { name }).filter({ visible: true }).click();
const pick = async (page: Page, slug: string) => {
  const radio = page.locator(`input[name="calledClass"][value="${slug}"]`);
  if (!(await radio.isVisible())) await page.getByText(/^Show all/).click();
  await radio.check();
};

/** Everything that came over the network while a page was opened: addresses, headers, and what is text. */
async function heard(responses: readonly Response[]): Promise<string[]> {
  return Promise.all(
    responses.map(async (response) => {
      const headers = JSON.stringify(await response.allHeaders());
      const type = response.headers()["content-type"] ?? "";
      const body = await response.body().catch(() => Buffer.from(""));
      const text = type.startsWith("image/") ? body.toString("latin1") : body.toString("utf8");
      return `${response.url()}\n${headers}\n${text}`;
    }),
  );
}

async function startQuestion(page: Page): Promise<void> {
  await page.goto("/practice");
  await press(page, /^(Call a photo|Practise ahead)$/);
  await expect(page.getByRole("heading", { name: "What would you call it?" })).toBeVisible();
}

test("a trainee calls a photo that nothing on the wire gives away, and then sees what it was", async ({ browser }) => {
  test.setTimeout(180_000);
  const page = await pageFor(browser, "trainee");
  const responses: Response[] = [];
  page.on("response", (response) => responses.push(response));
  await startQuestion(page);
  const id = idOf(page);
  await page.reload();
  await expect(page.locator(".practice-look img")).toHaveJSProperty("complete", true);

  const part = partOf(id);
  const secrets = secretsOf(part);
  expect(secrets.length).toBeGreaterThan(6);
  const all = [...(await heard(responses)), await page.content(), await page.title()];
  const leaks = secrets.filter((secret) => all.some((text) => text.includes(secret)));
  expect(leaks).toEqual([]);
  // The class stands once among the choices, as every class does, and nowhere else.
  const named = await page.locator(`[value="${part.class_slug}"]`).count();
  expect(named).toBe(1);
  const elsewhere = (await page.locator("main").innerHTML()).replaceAll(/<form.*<\/form>/gs, "");
  expect(elsewhere).not.toContain(part.class_slug);

  const wrong = part.class_slug === "dewetting" ? "underactivation" : "dewetting";
  await pick(page, wrong);
  await press(page, /^That's my call/);
  await expect(page.getByText("Say how sure you are.").first()).toBeVisible();
  await page.getByRole("radio", { name: "Fairly sure" }).check();
  await press(page, /^That's my call/);
  await expect(page.getByRole("heading", { level: 1, name: /^Missed: it is / })).toBeVisible();
  await expect(page.getByRole("heading", { name: "How the shop split" })).toBeVisible();
  await expect(page.getByRole("link", { name: part.ref })).toBeVisible();
  expect(stored("select called_class, confirmed_class from practice_answers where question_id = ?", id)).toEqual([
    { called_class: wrong, confirmed_class: part.class_slug },
  ]);

  await press(page, /^(Next photo|Go on practising)/);
  await expect(page.getByRole("heading", { name: "What would you call it?" })).toBeVisible();
  expect(partOf(idOf(page)).case_id).not.toBe(part.case_id);
  await page.context().close();
});

test("of two tabs with the same photo the first call counts, and the second is told so", async ({ browser }) => {
  const first = await pageFor(browser, "trainee");
  await startQuestion(first);
  const id = idOf(first);
  const second = await first.context().newPage();
  await startQuestion(second);
  expect(idOf(second)).toBe(id);
  for (const page of [first, second]) {
    await pick(page, page === first ? "peeling" : "burning");
    await page.getByRole("radio", { name: "A guess" }).check();
  }
  await press(first, /^That's my call/);
  await expect(first.getByRole("heading", { name: "How the shop split" })).toBeVisible();
  await press(second, /^That's my call/);
  await expect(second.getByText(/Your first call stays/)).toBeVisible();
  expect(stored("select called_class from practice_answers where question_id = ?", id)).toEqual([
    { called_class: "peeling" },
  ]);
  await first.context().close();
});

test("a photo is called by keys alone: class, how sure, Enter, and N for the next", async ({ browser }) => {
  const page = await pageFor(browser, "trainee");
  await startQuestion(page);
  const id = idOf(page);
  await page.keyboard.press("w");
  await page.keyboard.press("3");
  await page.keyboard.press("Enter");
  await expect(page.getByRole("heading", { name: "How the shop split" })).toBeVisible();
  const [answer] = stored<{ sure: number }>("select sure from practice_answers where question_id = ?", id);
  expect(answer?.sure).toBe(3);
  await page.context().close();
});

test("practice works as plain forms before script has loaded, or without it", async ({ browser }) => {
  const signedIn = await pageFor(browser, "otherPlater");
  const context = await browser.newContext({
    storageState: await signedIn.context().storageState(),
    javaScriptEnabled: false,
  });
  const page = await context.newPage();
  await startQuestion(page);
  const id = idOf(page);
  await page.locator('input[name="calledClass"][value="cant-tell"]').check();
  await press(page, /^That's my call/);
  await expect(page.getByRole("heading", { name: "How the shop split" })).toBeVisible();
  expect(stored("select called_class from practice_answers where question_id = ?", id)).toEqual([
    { called_class: null },
  ]);
  await context.close();
  await signedIn.context().close();
});

test("a senior sets a drill, the trainee does it, the senior sees how it went and withdraws it", async ({
  browser,
}) => {
  test.setTimeout(180_000);
  const senior = await pageFor(browser, "senior");
  await senior.goto("/practice/drills");
  const name = `Bare or faded ${Date.now()}`;
  await senior.getByRole("textbox", { name: /^Name/ }).fill(name);
  await senior.getByRole("checkbox", { name: /^Dewetting/ }).check();
  await senior.getByRole("checkbox", { name: /^Underactivation/ }).check();
  await senior.getByRole("textbox", { name: /^Photos/ }).fill("2");
  await senior.getByRole("checkbox", { name: /^Dara/ }).check();
  await press(senior, /^Set the drill$/);
  await expect(senior.getByText("The drill is set")).toBeVisible();

  const trainee = await pageFor(browser, "trainee");
  await trainee.goto("/practice");
  await trainee.getByRole("button", { name: `Begin: ${name}` }).click();
  for (const place of [1, 2]) {
    await expect(trainee.getByText(`Photo ${place} of 2`)).toBeVisible();
    const { class_slug } = partOf(idOf(trainee));
    expect(["dewetting", "underactivation"]).toContain(class_slug);
    await pick(trainee, class_slug);
    await trainee.getByRole("radio", { name: "Certain" }).check();
    await press(trainee, /^That's my call/);
    await expect(trainee.getByRole("heading", { level: 1, name: /^Right: / })).toBeVisible();
    if (place === 1) await press(trainee, /^Next photo/);
  }
  await trainee.goto("/practice");
  await expect(trainee.getByText("Done: 2 of 2 right").first()).toBeVisible();

  await senior.reload();
  const drill = senior.getByRole("article").filter({ hasText: name });
  await expect(drill.getByText("Done: 2 of 2 right")).toBeVisible();
  await drill.getByRole("button", { name: `Withdraw ${name}` }).click();
  await expect(drill.getByText("withdrawn")).toBeVisible();
  await trainee.reload();
  await expect(trainee.getByText(name)).toHaveCount(0);
  await trainee.context().close();
  await senior.context().close();
});
