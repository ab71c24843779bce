import { randomUUID } from "node:crypto";
import { beforeEach, describe, expect, it } from "vitest";
import type { Db } from "@/db/open";
import { acceptPhoto, claimPhotos, listCasePhotos, listPhotosOfCases, refusePhoto } from "@/db/queries/photos";
import { TEST_NOW } from "@/tests/fixtures/crew-factory";
import { emptyDatabase, makeCase, makeShop, type TestShop } from "@/tests/fixtures/shop-factory";

let db: Db;
let shop: TestShop;

beforeEach(async () => {
  db = emptyDatabase();
  shop = await makeShop(db);
});

function comeIn(id: string, by = shop.members.plater) {
  const facts = {
    fileName: "part.jpg",
    bytes: 9,
    format: "jpeg",
    width: 4,
    height: 3,
    takenAt: null,
    placeholder: "AAAA",
  };
  return acceptPhoto(db, { id, shopId: by.shopId, memberId: by.memberId, purpose: "suspect", ...facts, now: TEST_NOW });
}

function claim(caseId: number, ids: string[], by = shop.members.plater, round = 1) {
  const { shopId, memberId } = by;
  claimPhotos(db, { shopId, memberId, caseId, round, purpose: "suspect", ids, now: TEST_NOW });
}

describe("photos of a case", () => {
  it("may come in before the snap is sent or after it, and keep the order in which they were taken", () => {
    const [early, late] = [randomUUID(), randomUUID()];
    comeIn(early);
    const { id } = makeCase(db, shop, { photoIds: [late, early] });
    expect(listCasePhotos(db, shop.shopId, id)).toMatchObject([
      { id: late, state: "awaited", position: 0 },
      { id: early, state: "processing", position: 1 },
    ]);
    expect(comeIn(late)).toBe(true);
    expect(listCasePhotos(db, shop.shopId, id)[0]).toMatchObject({ id: late, state: "processing", caseId: id });
  });

  it("are the same when the snap is sent twice", () => {
    const id = randomUUID();
    const { id: caseId } = makeCase(db, shop, { photoIds: [id] });
    comeIn(id);
    claim(caseId, [id]);
    expect(listCasePhotos(db, shop.shopId, caseId)).toMatchObject([{ id, state: "processing" }]);
  });

  it("cannot be taken from another case, another member or another shop", async () => {
    const id = randomUUID();
    makeCase(db, shop, { photoIds: [id] });
    const { id: other } = makeCase(db, shop);
    expect(() => claim(other, [id])).toThrow("belongs to another case");
    const loose = randomUUID();
    comeIn(loose);
    expect(() => claim(other, [loose], shop.members.otherPlater)).toThrow("belongs to another case");
    const elsewhere = await makeShop(db);
    const { id: strange } = makeCase(db, elsewhere);
    expect(() => claim(strange, [loose], elsewhere.members.plater)).toThrow("belongs to another case");
    expect(() => comeIn(loose, elsewhere.members.plater)).toThrow("somebody else");
  });

  it("are shown in lists by the first of the newest round that was kept", () => {
    const [first, bad, again] = [randomUUID(), randomUUID(), randomUUID()];
    const { id } = makeCase(db, shop, { photoIds: [first] });
    const of = () => listPhotosOfCases(db, shop.shopId, [id]).get(id)?.id;
    expect(of()).toBe(first);
    claim(id, [bad, again], shop.members.plater, 2);
    expect(of()).toBe(bad);
    refusePhoto(db, shop.shopId, bad, "damaged");
    expect(of()).toBe(again);
  });

  it("that is recorded twice is recorded once", () => {
    const id = randomUUID();
    expect([comeIn(id), comeIn(id)]).toEqual([true, false]);
  });
});
