import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { SHELF_CLASSES, SYMPTOM_KEYS } from "@/lib/cases/case-words";
import { suggestedCalls } from "@/lib/cases/suggested-calls";

const ticks = fc.uniqueArray(fc.constantFrom(...SYMPTOM_KEYS));

// Expected orders come from the words of product.md ("`underactivation` patchy, hazy, peeling copper" and so on) and
// from design/mock/snap.html, where "Patchy, hazy" with "Lifts on tape" puts underactivation first.
describe("the classes offered for the first call", () => {
  it("puts underactivation first when copper is patchy and lifts on tape", () => {
    expect(suggestedCalls(["patchy-haze", "lifts-on-tape"], SHELF_CLASSES, 4)[0]).toBe("underactivation");
  });

  it("offers the class of a single tick first", () => {
    expect(suggestedCalls(["rings-tracks"], SHELF_CLASSES, 4)[0]).toBe("water-spots");
    expect(suggestedCalls(["burnt-edges"], SHELF_CLASSES, 4)[0]).toBe("burning");
    expect(suggestedCalls(["bare-islands"], SHELF_CLASSES, 4)[0]).toBe("dewetting");
  });

  it("offers the first of the five that most cases are, while nothing is ticked", () => {
    expect(suggestedCalls([], SHELF_CLASSES, 4)).toEqual([
      "dewetting",
      "underactivation",
      "overactivation",
      "water-spots",
    ]);
  });

  it("offers only classes of the shop's own library, and each once", () => {
    fc.assert(
      fc.property(
        ticks,
        fc.subarray([...SHELF_CLASSES, "blush"]),
        fc.integer({ min: 1, max: 14 }),
        (ticked, known, count) => {
          const offered = suggestedCalls(ticked, known, count);
          expect(offered.every((slug) => known.includes(slug))).toBe(true);
          expect(new Set(offered).size).toBe(offered.length);
          expect(offered.length).toBeLessThanOrEqual(count);
        },
      ),
    );
  });

  it("fills the places as far as the library reaches", () => {
    fc.assert(
      fc.property(ticks, (ticked) => {
        expect(suggestedCalls(ticked, SHELF_CLASSES, 4)).toHaveLength(4);
      }),
    );
  });

  it("does not care in which order the symptoms were ticked", () => {
    fc.assert(
      fc.property(ticks, (ticked) => {
        expect(suggestedCalls(ticked.toReversed(), SHELF_CLASSES, 5)).toEqual(suggestedCalls(ticked, SHELF_CLASSES, 5));
      }),
    );
  });
});
