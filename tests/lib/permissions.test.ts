import { describe, expect, it } from "vitest";
import { can, MATRIX, PERMISSIONS, reach } from "@/lib/permissions";

const plater = { memberId: 5, shopId: 1, roles: ["plater"] as const };

describe("who may do what", () => {
  it("has every cell filled", () => {
    expect(Object.keys(MATRIX).toSorted()).toEqual([...PERMISSIONS].toSorted());
    for (const row of Object.values(MATRIX))
      expect(Object.keys(row).toSorted()).toEqual(["owner", "plater", "senior", "trainee"]);
  });

  it("holds to the product's own table", () => {
    // product.md, "Who may do what".
    expect(reach(["plater"], "case.confirm")).toBe("no");
    expect(reach(["trainee"], "card.work")).toBe("no");
    expect(reach(["senior"], "money.case")).toBe("any");
    expect(reach(["senior"], "ledger.see")).toBe("no");
    expect(reach(["owner"], "crew.manage")).toBe("any");
  });

  it("lets somebody with two roles do what either may", () => {
    expect(reach(["plater", "senior"], "case.confirm")).toBe("any");
  });

  it("gives one's own row to oneself alone, and no row of another shop to anybody", () => {
    expect(can(plater, "case.amend", { shopId: 1, ownerId: 5 })).toBe(true);
    expect(can(plater, "case.amend", { shopId: 1, ownerId: 6 })).toBe(false);
    expect(can({ ...plater, roles: ["owner"] }, "case.amend", { shopId: 2, ownerId: 5 })).toBe(false);
  });
});
