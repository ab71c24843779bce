import { beforeEach, describe, expect, it } from "vitest";
import type { Db } from "@/db/open";
import { getHoldTag } from "@/db/queries/hold-tag";
import { confirmFor, emptyDatabase, makeCase, makeShop, type TestShop } from "../../fixtures/shop-factory";

let db: Db;
let shop: TestShop;

beforeEach(async () => {
  db = emptyDatabase();
  shop = await makeShop(db);
});

describe("the hold tag", () => {
  it("says what was called while the part is held", () => {
    const { ref } = makeCase(db, shop);
    expect(getHoldTag(db, shop.shopId, ref)).toMatchObject({
      classTitle: "Underactivation",
      quantity: 3,
      jobNumber: "J-3318",
      customer: "Orrin & Pike",
      openedBy: shop.members.plater.name,
    });
  });

  it("says what was confirmed afterwards, also where it differs from the call", () => {
    const held = makeCase(db, shop);
    confirmFor(db, shop, held, { classSlug: "dewetting" });
    expect(getHoldTag(db, shop.shopId, held.ref)?.classTitle).toBe("Dewetting");
  });

  it("has no class while nobody could tell", () => {
    const { ref } = makeCase(db, shop, { calledClass: null });
    expect(getHoldTag(db, shop.shopId, ref)?.classTitle).toBeNull();
  });

  it("is unknown to another shop", async () => {
    const other = await makeShop(db);
    expect(getHoldTag(db, other.shopId, makeCase(db, shop).ref)).toBeNull();
  });
});
