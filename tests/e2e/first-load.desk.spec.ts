import { gzipSync } from "node:zlib";
import { expect, test, type Page } from "@playwright/test";
import { signIn } from "./people";

const LIMIT_BYTES = 80_000;

/** Bytes of script, gzipped, that the page's own HTML asks for. */
async function firstLoadBytes(page: Page, path: string): Promise<number> {
  const html = await (await page.request.get(path)).text();
  const scripts = new Set(
    [...html.matchAll(/<script[^>]+src="(\/_next\/[^"]+\.js)[^"]*"/g)].map(([, source]) => source ?? ""),
  );
  expect(scripts.size).toBeGreaterThan(0);
  let bytes = 0;
  for (const source of scripts) bytes += gzipSync(await (await page.request.get(source)).body()).length;
  return bytes;
}

test("the snap and the casebook ask for little script on their first load", async ({ page }) => {
  await signIn(page, "plater");
  const empty = await firstLoadBytes(page, "/gallery/empty");
  for (const path of ["/cases/snap", "/cases"]) {
    const bytes = await firstLoadBytes(page, path);
    console.log(`${path}: ${bytes} bytes gzipped, an empty page ${empty}, difference ${bytes - empty}`);
    expect(bytes - empty).toBeLessThanOrEqual(LIMIT_BYTES);
  }
});
