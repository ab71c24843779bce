import fs from "node:fs";
import os from "node:os";
import path from "node:path";
import { afterEach, beforeEach, expect, it } from "vitest";
import { databaseFile, openDatabase } from "@/db/open";
import { cases, photos, photoSizes } from "@/db/schema";
import { backUp, restore } from "@/db/scripts/copy-shop";
import { TEST_NOW } from "@/tests/fixtures/crew-factory";
import { makeCase, makeShop } from "@/tests/fixtures/shop-factory";

let home: string;
beforeEach(() => {
  home = fs.mkdtempSync(path.join(os.tmpdir(), "coppertell-backup-"));
});
afterEach(() => fs.rmSync(home, { recursive: true }));

it("a backup made while the shop works brings everything back after all is lost", async () => {
  const places = { dataDir: path.join(home, "data"), uploadsDir: path.join(home, "uploads") };
  const target = path.join(home, "backup");
  const db = openDatabase(databaseFile(places.dataDir));
  const shop = await makeShop(db);
  const photoId = "0b7ef3f2-6f0e-4f56-9d3e-1f2f5d7c9a01";
  const held = makeCase(db, shop, { photoIds: [photoId] });
  const stored = {
    shopId: shop.shopId,
    photoId,
    size: "thumb" as const,
    path: "1/0b/a.thumb.webp",
    mime: "image/webp",
    bytes: 3,
    width: 1,
    height: 1,
  };
  db.insert(photoSizes).values(stored).run();
  fs.mkdirSync(path.join(places.uploadsDir, "1/0b"), { recursive: true });
  fs.writeFileSync(path.join(places.uploadsDir, "1/0b/a.thumb.webp"), "abc");
  // Accepted, its sizes not made yet: it must not be lost either.
  fs.writeFileSync(path.join(places.uploadsDir, "1/0b/b.received"), "raw");

  const copying = backUp({ ...places, target });
  makeCase(db, shop);
  const made = await copying;
  expect(made).toEqual({ photos: 1, missing: 0 });
  db.$client.close();

  fs.rmSync(places.dataDir, { recursive: true });
  fs.rmSync(places.uploadsDir, { recursive: true });
  const back = restore({ ...places, source: target, now: TEST_NOW });
  expect(back.photos).toBe(1);
  expect(back.aside).toBeNull();

  const again = openDatabase(databaseFile(places.dataDir));
  expect(again.select({ ref: cases.ref }).from(cases).all()).toContainEqual({ ref: held.ref });
  expect(again.select({ id: photos.id }).from(photos).all()).toContainEqual({ id: photoId });
  expect(
    again.$client.prepare("select count(*) from case_search where case_search match 'ref:CT'").pluck().get(),
  ).toBeGreaterThan(0);
  expect(fs.readFileSync(path.join(places.uploadsDir, "1/0b/a.thumb.webp"), "utf8")).toBe("abc");
  expect(fs.readFileSync(path.join(places.uploadsDir, "1/0b/b.received"), "utf8")).toBe("raw");
  again.$client.close();
});

it("a restore keeps what it replaces, and refuses a folder without a backup before it moves anything", async () => {
  const places = { dataDir: path.join(home, "data"), uploadsDir: path.join(home, "uploads") };
  const target = path.join(home, "backup");
  openDatabase(databaseFile(places.dataDir)).$client.close();
  await backUp({ ...places, target });
  expect(() => restore({ ...places, source: home, now: TEST_NOW })).toThrow(/holds no coppertell.db/);
  expect(fs.existsSync(databaseFile(places.dataDir))).toBe(true);
  const back = restore({ ...places, source: target, now: TEST_NOW });
  expect(fs.existsSync(path.join(back.aside ?? "", "coppertell.db"))).toBe(true);
});
