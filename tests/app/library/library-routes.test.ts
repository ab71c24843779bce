import { NextRequest } from "next/server";
import { and, eq } from "drizzle-orm";
import { beforeEach, describe, expect, it, vi } from "vitest";
import { GET as getClass } from "@/app/api/library/[class]/route";
import { GET as getEntries } from "@/app/api/library/entries/route";
import { GET as getHits } from "@/app/api/library/route";
import type { Db } from "@/db/open";
import { libraryClasses, libraryRevisions } from "@/db/schema";
import { shelf } from "@/db/seed/library/shelf";
import { SHELF_CLASSES } from "@/lib/cases/case-words";
import { buildLibrarySearch } from "@/lib/library/library-search";
import { librarySearchFor } from "@/lib/server/library/search-index";
import { TEST_NOW } from "@/tests/fixtures/crew-factory";
import { emptyDatabase, makeShop, type TestShop } from "@/tests/fixtures/shop-factory";

const world = vi.hoisted(() => ({ db: null as unknown, member: null as unknown }));
vi.mock("@/db/client", () => ({ getDb: () => world.db }));
vi.mock("@/lib/server/session", () => ({ currentMember: async () => world.member }));

let db: Db;
let shop: TestShop;

beforeEach(async () => {
  db = emptyDatabase();
  shop = await makeShop(db);
  Object.assign(world, { db, member: shop.members.trainee });
});

async function get(handler: typeof getHits, path: string, params = {}, headers = {}) {
  const request = new NextRequest(`http://localhost:3000${path}`, { headers });
  const answer = await handler(request, { params: Promise.resolve(params) });
  const text = await answer.text();
  return { status: answer.status, headers: answer.headers, body: text ? JSON.parse(text) : null };
}

/** What a senior's edit will do: the new words, and a revision that keeps them. */
function publish(of: TestShop, slug: string, synonyms: string[]): void {
  const { shopId } = of;
  db.update(libraryClasses)
    .set({ synonyms })
    .where(and(eq(libraryClasses.shopId, shopId), eq(libraryClasses.slug, slug)))
    .run();
  const revision = { shopId, entry: "class", slug, revision: 2, state: "published", body: {}, at: TEST_NOW } as const;
  db.insert(libraryRevisions).values(revision).run();
}

describe("GET /api/library", () => {
  it("answers a misspelt word of the shop's with its class, and says what matched", async () => {
    const { status, body } = await get(getHits, "/api/library?q=sleepy+bras");
    expect(status).toBe(200);
    expect(Object.keys(body)).toEqual(["hits"]);
    expect(body.hits[0]).toEqual({
      slug: "underactivation",
      title: "Underactivation",
      kind: "class",
      classes: ["underactivation"],
      score: expect.any(Number),
      matched: "sleepy brass",
      parts: [
        { text: "sleepy", isMatch: true },
        { text: " ", isMatch: false },
        { text: "brass", isMatch: true },
      ],
    });
  });

  it("without a question gives no hits and the classes of the shelf", async () => {
    for (const path of ["/api/library", "/api/library?q=", "/api/library?q=++"]) {
      const { body } = await get(getHits, path);
      expect(body.hits).toEqual([]);
      expect(body.classes.map((each: { slug: string }) => each.slug)).toEqual([...SHELF_CLASSES]);
    }
  });

  it("refuses a stranger and a question as long as a book", async () => {
    expect(await get(getHits, `/api/library?q=${"x".repeat(500)}`)).toMatchObject({ status: 400 });
    world.member = null;
    expect(await get(getHits, "/api/library?q=smut")).toMatchObject({ status: 401, body: { code: "signed-out" } });
  });
});

describe("GET /api/library/[class]", () => {
  it("gives the class with causes, fixes, cautions and sources", async () => {
    const { status, body } = await get(getClass, "/api/library/peeling", { class: "peeling" });
    expect(status).toBe(200);
    expect(Object.keys(body)).toEqual(["class", "causes", "fixes", "cautions", "sources"]);
    const causes = shelf.causes.filter((cause) => cause.classSlugs.includes("peeling"));
    expect(body.class).toMatchObject({ slug: "peeling", revision: 1 });
    expect(body.causes).toHaveLength(causes.length);
    expect(body.causes[0]).not.toHaveProperty("id");
  });

  it("says not found for a class that the shelf does not hold", async () => {
    const { status, body } = await get(getClass, "/api/library/nope", { class: "nope" });
    expect([status, body.code]).toEqual([404, "not-found"]);
  });
});

describe("GET /api/library/entries", () => {
  it("lets a browser search as the server does", async () => {
    const { body } = await get(getEntries, "/api/library/entries");
    const inBrowser = buildLibrarySearch(body);
    for (const typed of ["sleepy brass", "smoky edges", "C360", "watr spots"]) {
      expect(inBrowser(typed), typed).toEqual(librarySearchFor(db, shop.shopId)(typed));
    }
  });

  it("is kept by the browser until something is published, and by nobody in between", async () => {
    const first = await get(getEntries, "/api/library/entries");
    const etag = first.headers.get("etag") ?? "";
    expect(first.headers.get("cache-control")).toBe("private, no-cache");
    expect(await get(getEntries, "/api/library/entries", {}, { "if-none-match": etag })).toMatchObject({
      status: 304,
      body: null,
    });
    publish(shop, "peeling", ["onion skin"]);
    expect(await get(getEntries, "/api/library/entries", {}, { "if-none-match": etag })).toMatchObject({ status: 200 });
  });
});

describe("the search kept in the server", () => {
  it("is built once for a shop, and again after something is published in its library", () => {
    const first = librarySearchFor(db, shop.shopId);
    expect(librarySearchFor(db, shop.shopId)).toBe(first);
    publish(shop, "peeling", ["onion skin"]);
    const second = librarySearchFor(db, shop.shopId);
    expect(second).not.toBe(first);
    expect(second("onion skin")[0]).toMatchObject({ slug: "peeling", matched: "onion skin" });
  });

  it("answers each shop from its own library", async () => {
    const other = await makeShop(db);
    publish(other, "peeling", ["onion skin"]);
    expect(librarySearchFor(db, other.shopId)("onion skin")[0]).toMatchObject({ matched: "onion skin" });
    expect(librarySearchFor(db, shop.shopId)("onion skin").map((hit) => hit.matched)).not.toContain("onion skin");
  });
});
