import { describe, expect, it } from "vitest";
import { median } from "@/lib/stats/median";

// Worked by hand from the definition: the middle of the sorted values, or the mean of the middle two.
describe("the median of minutes", () => {
  it("is the middle one of an odd number, whatever their order", () => expect(median([30, 12, 18])).toBe(18));
  it("is the mean of the middle two of an even number", () => expect(median([40, 12, 18, 30])).toBe(24));
  it("is not moved by one card that took all day", () => expect(median([10, 11, 12, 13, 480])).toBe(12));
  it("is the only one there is", () => expect(median([7])).toBe(7));
  it("says nothing of nothing", () => expect(median([])).toBeNull());
});
