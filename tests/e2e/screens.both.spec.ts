import AxeBuilder from "@axe-core/playwright";
import { expect, test, type Browser, type Page } from "@playwright/test";
import { signIn, watchConsole, type Person } from "./people";
import { SCREENS } from "./pages";

type Refs = Record<"held" | "card" | "closed", string>;

/** A question put to whoever is signed in: each person has their own. */
async function askQuestion(page: Page): Promise<string> {
  const answer = await page.request.post("/api/practice/questions", { data: {} });
  return ((await answer.json()) as { id: string }).id;
}

/** A reference in each state, asked of the app itself. */
async function findRefs(browser: Browser): Promise<Refs> {
  const context = await browser.newContext();
  const page = await context.newPage();
  await signIn(page, "senior");
  const refOf = async (status: string) => {
    const answer = (await (await page.request.get(`/api/cases?status=${status}`)).json()) as {
      cases: { ref: string }[];
    };
    const ref = answer.cases[0]?.ref;
    if (!ref) throw new Error(`No case is ${status}.`);
    return ref;
  };
  const refs = { held: await refOf("held"), card: await refOf("confirmed"), closed: await refOf("closed") };
  await context.close();
  return refs;
}

const pathWith = (path: string, refs: Refs) =>
  path.replace(/\{(held|card|closed)\}/g, (_, state: keyof Refs) => refs[state]);

/** On night shift only colours differ: only what rests on colour is looked at again. */
async function expectClean(page: Page, where: string, isNight: boolean): Promise<void> {
  const axe = new AxeBuilder({ page });
  const { violations } = await (isNight ? axe.withRules(["color-contrast"]) : axe).analyze();
  const found = violations.map((each) => `${where}: ${each.id}: ${each.nodes[0]?.html.slice(0, 160)}`);
  expect(found).toEqual([]);
}

const people = [...new Set(SCREENS.map((screen) => screen.as))];

for (const person of people) {
  test(`screens of ${person ?? "a stranger"} are clean by day and on night shift, and nothing scrolls sideways`, async ({
    browser,
  }) => {
    test.setTimeout(300_000);
    const refs = await findRefs(browser);
    for (const colorScheme of ["light", "dark"] as const) {
      const context = await browser.newContext({ colorScheme });
      const page = await context.newPage();
      watchConsole(page);
      if (person) await signIn(page, person satisfies Person);
      for (const screen of SCREENS.filter((each) => each.as === person)) {
        const path = screen.path.includes("{question}")
          ? screen.path.replace("{question}", await askQuestion(page))
          : pathWith(screen.path, refs);
        await page.goto(path);
        await expect(page.locator("h1").first()).toBeVisible();
        const sideways = await page.evaluate(
          () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
        );
        expect(sideways, `${path} scrolls sideways`).toBeLessThanOrEqual(0);
        await expectClean(page, `${path} (${colorScheme})`, colorScheme === "dark");
      }
      await context.close();
    }
  });
}
