import { beforeEach, describe, expect, it } from "vitest";
import type { Db } from "@/db/open";
import { countHeldByStation, getStation, listSolutions, listStations } from "@/db/queries/line";
import { listCallsAgainstConfirmed, listMyOpenCases } from "@/db/queries/today";
import { countWaiting, hasCases } from "@/db/queries/waiting";
import {
  confirmFor,
  emptyDatabase,
  makeCase,
  makeShop,
  stationNamed,
  type TestShop,
} from "@/tests/fixtures/shop-factory";

let db: Db;
let shop: TestShop;
let other: TestShop;

beforeEach(async () => {
  db = emptyDatabase();
  shop = await makeShop(db);
  other = await makeShop(db);
});

describe("the line", () => {
  it("stands in the order in which the part travels", () => {
    expect(listStations(db, shop.shopId).map((station) => station.slug)).toEqual([
      "clean",
      "rinse-1",
      "activate",
      "rinse-2",
      "strike",
      "inspect",
      "plate",
      "finish",
    ]);
    expect(getStation(db, shop.shopId, "no-such-station")).toBeNull();
    expect(listSolutions(db, shop.shopId).map((solution) => solution.code)).toEqual(["A-12"]);
  });

  it("counts held parts where their class most likely begins, and not another shop's", () => {
    makeCase(db, shop, { calledClass: "underactivation", quantity: 3 });
    makeCase(db, shop, { calledClass: "underactivation", quantity: 4 });
    makeCase(db, other, { calledClass: "underactivation", quantity: 9 });
    expect(countHeldByStation(db, shop.shopId).get(stationNamed(shop.stationIds, "activate"))).toBe(7);
  });
});

describe("what waits", () => {
  it("counts by state, in this shop alone", () => {
    expect(hasCases(db, shop.shopId)).toBe(false);
    makeCase(db, shop);
    confirmFor(db, shop, makeCase(db, shop));
    makeCase(db, other);
    expect(countWaiting(db, shop.shopId)).toEqual({ secondLook: 1, rework: 1 });
  });

  it("shows a plater their own held parts and how their calls were confirmed, but not what they confirmed themselves", () => {
    const { plater, senior } = shop.members;
    makeCase(db, shop);
    makeCase(db, shop, { by: shop.members.otherPlater });
    confirmFor(db, shop, makeCase(db, shop, { calledClass: "dewetting" }));
    confirmFor(db, shop, makeCase(db, shop, { by: senior }));
    expect(listMyOpenCases(db, shop.shopId, plater.memberId, 10)).toHaveLength(1);
    expect(listCallsAgainstConfirmed(db, shop.shopId, plater.memberId, 0)).toEqual([
      { called: "dewetting", confirmed: "underactivation" },
    ]);
    expect(listCallsAgainstConfirmed(db, shop.shopId, senior.memberId, 0)).toEqual([]);
  });
});
