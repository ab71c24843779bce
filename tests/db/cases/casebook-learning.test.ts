import { randomUUID } from "node:crypto";
import { eq } from "drizzle-orm";
import { beforeAll, describe, expect, it } from "vitest";
import type { Db } from "@/db/open";
import { listAlikeCandidates } from "@/db/queries/alike-cases";
import { countCasebook, listCasebook, listIdsByRef } from "@/db/queries/casebook";
import { requireCase } from "@/db/queries/cases";
import { listSavedSearches } from "@/db/queries/saved-searches";
import { listExemplars } from "@/db/queries/second-look-against";
import { cases, photos, savedSearches } from "@/db/schema";
import type { CasebookFilter } from "@/lib/cases/casebook-filter";
import { FaultError } from "@/lib/fault";
import { chooseExemplar } from "@/lib/server/cases/choose-exemplar";
import { keepSearch, removeSearch, renameSearch } from "@/lib/server/cases/saved-searches";
import { longScans } from "../../bench/long-scans";
import { TEST_NOW } from "../../fixtures/crew-factory";
import { confirmFor, emptyDatabase, makeCase, makeShop, type TestShop } from "../../fixtures/shop-factory";

const DAY = 86_400_000;
let db: Db;
let shop: TestShop;
let other: TestShop;

beforeAll(async () => {
  db = emptyDatabase();
  shop = await makeShop(db);
  other = await makeShop(db);
});

/** A confirmed case whose snap has a ready photo. */
function withPhoto(of: TestShop, classSlug: string, now: number) {
  const photoId = randomUUID();
  const row = confirmFor(db, of, makeCase(db, of, { photoIds: [photoId], now }), { classSlug }, now + 60_000);
  db.update(photos).set({ state: "ready" }).where(eq(photos.id, photoId)).run();
  return { ...row, photoId };
}
const listed = (filter: CasebookFilter) =>
  listCasebook(db, shop.shopId, { filter, order: "newest", from: null, limit: 50, isDense: false }).map(
    (row) => row.id,
  );
const doing = (member = shop.members.senior) => ({ db, member, now: TEST_NOW });
const code = (run: () => unknown): string => {
  try {
    run();
  } catch (error) {
    if (error instanceof FaultError) return error.fault.code;
    throw error;
  }
  return "ok";
};

describe("exemplars in the casebook", () => {
  it("are found by themselves, and gone when withdrawn or when the case became another class", () => {
    const first = withPhoto(shop, "peeling", TEST_NOW);
    const second = withPhoto(shop, "peeling", TEST_NOW + DAY);
    const foreign = withPhoto(other, "peeling", TEST_NOW);
    withPhoto(shop, "peeling", TEST_NOW + 2 * DAY);
    for (const { ref, photoId } of [first, second]) chooseExemplar(doing(), { ref, photoId, chosen: true });
    chooseExemplar(
      { db, member: other.members.senior, now: TEST_NOW },
      { ref: foreign.ref, photoId: foreign.photoId, chosen: true },
    );
    expect(listed({ exemplars: "only" })).toEqual([second.id, first.id]);
    expect(listed({ exemplars: "only", classSlug: "dewetting" })).toEqual([]);
    expect(countCasebook(db, shop.shopId, { exemplars: "only" }).count).toBe(2);

    chooseExemplar(doing(), { ref: first.ref, photoId: first.photoId, chosen: false });
    db.update(cases).set({ confirmedClass: "dewetting" }).where(eq(cases.id, second.id)).run();
    expect(listed({ exemplars: "only" })).toEqual([]);
    expect(listExemplars(db, shop.shopId, ["peeling", "dewetting"])).toEqual([]);
    db.update(cases).set({ confirmedClass: "peeling" }).where(eq(cases.id, second.id)).run();
  });
});

describe("the days on which cases were opened", () => {
  it("narrow the book from the first moment to before the last", () => {
    const at = TEST_NOW + 400 * DAY;
    const rows = [0, 1, 2].map((days) => makeCase(db, shop, { now: at + days * DAY }));
    const ids = listed({ openedFromAt: at, openedUntilAt: at + 2 * DAY });
    expect(ids).toEqual([rows[1]?.id, rows[0]?.id]);
    const paged = listCasebook(db, shop.shopId, {
      filter: { openedFromAt: at, openedUntilAt: at + 3 * DAY },
      order: "newest",
      from: { kind: "on", at: at + 2 * DAY, id: rows[2]?.id ?? 0 },
      limit: 50,
      isDense: false,
    });
    expect(paged.map((row) => row.id)).toEqual([rows[1]?.id, rows[0]?.id]);
  });
});

describe("cases by their references", () => {
  it("come in the order asked for, the shop's own alone", () => {
    const [a, b] = [makeCase(db, shop), makeCase(db, shop)];
    expect(listIdsByRef(db, shop.shopId, [b.ref, "CT-9999-9999", a.ref])).toEqual([b.id, a.id]);
    expect(listIdsByRef(db, shop.shopId, [])).toEqual([]);
  });
});

describe("candidates that may be alike", () => {
  it("are confirmed cases of the class or on the metal, never another shop's and never the case itself", () => {
    const own = withPhoto(shop, "burning", TEST_NOW);
    const sameClass = confirmFor(db, shop, makeCase(db, shop, { baseMetal: "steel" }), { classSlug: "burning" });
    const sameMetal = confirmFor(db, shop, makeCase(db, shop, { baseMetal: "pewter" }), { classSlug: "handling" });
    const held = makeCase(db, shop, { baseMetal: "pewter" });
    confirmFor(db, other, makeCase(db, other, { baseMetal: "pewter" }), { classSlug: "burning" });
    const row = db.select().from(cases).where(eq(cases.id, own.id)).get();
    if (!row) throw new Error("no case");
    const ids = listAlikeCandidates(db, shop.shopId, { ...row, baseMetal: "pewter" }).map((each) => each.id);
    expect(ids.toSorted((a, b) => a - b)).toEqual([sameClass.id, sameMetal.id].toSorted((a, b) => a - b));
    expect(ids).not.toContain(held.id);
    expect(requireCase(db, shop.shopId, held.ref).state).toBe("held");
  });
  it("are read without walking or sorting the book", () => {
    const of = {
      id: 1,
      baseMetal: "brass",
      method: "bath",
      stageFound: "at-strike",
      symptoms: [],
      calledClass: null,
    } as const;
    const fresh = emptyDatabase();
    expect(longScans(fresh, () => listAlikeCandidates(fresh, 1, { ...of, confirmedClass: "peeling" }))).toEqual([]);
  });
});

describe("searches that somebody keeps", () => {
  const search = { name: "Brass haze", query: "class=underactivation&metal=brass" };

  it("are theirs alone, found by name, renamed and removed", () => {
    const { trainee, plater } = shop.members;
    const { id } = keepSearch(doing(trainee), search);
    keepSearch(doing(trainee), { name: "alpha", query: "metal=brass" });
    keepSearch(doing(plater), search);
    expect(listSavedSearches(db, trainee).map((each) => each.name)).toEqual(["alpha", "Brass haze"]);
    renameSearch(doing(trainee), { id, name: "Zinc after all" });
    expect(listSavedSearches(db, trainee).map((each) => each.name)).toEqual(["alpha", "Zinc after all"]);
    expect(listSavedSearches(db, plater).map((each) => each.name)).toEqual(["Brass haze"]);
    removeSearch(doing(trainee), { id });
    expect(listSavedSearches(db, trainee)).toHaveLength(1);
  });
  it("have one name each, whatever its capitals", () => {
    const { owner } = shop.members;
    const { id } = keepSearch(doing(owner), search);
    expect(code(() => keepSearch(doing(owner), { ...search, name: "BRASS haze" }))).toBe("conflict");
    const second = keepSearch(doing(owner), { ...search, name: "Another" });
    expect(code(() => renameSearch(doing(owner), { id: second.id, name: "brass HAZE" }))).toBe("conflict");
    // Its own name with other capitals is no clash.
    expect(code(() => renameSearch(doing(owner), { id, name: "Brass Haze" }))).toBe("ok");
  });
  it("are out of reach for everybody else", () => {
    const { id } = keepSearch(doing(shop.members.senior), search);
    for (const member of [shop.members.owner, other.members.senior]) {
      expect(code(() => renameSearch(doing(member), { id, name: "Mine now" }))).toBe("not-found");
      expect(code(() => removeSearch(doing(member), { id }))).toBe("not-found");
    }
  });
  it("are forty at most, and the forty-first is refused", () => {
    const { otherPlater } = shop.members;
    for (let number = 1; number <= 40; number += 1) keepSearch(doing(otherPlater), { ...search, name: `No ${number}` });
    expect(code(() => keepSearch(doing(otherPlater), { ...search, name: "No 41" }))).toBe("conflict");
    expect(db.select().from(savedSearches).where(eq(savedSearches.memberId, otherPlater.memberId)).all()).toHaveLength(
      40,
    );
  });
});
