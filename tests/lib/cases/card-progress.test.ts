import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { cardProgress, progressWords } from "@/lib/cases/card-progress";

/** The card of design/mock/rework.html: five steps of 7, 5, 4, 3 and 9 minutes, "card says 28 min", two ticked. */
const mock = [
  { id: 1, plannedMinutes: 7, spentMinutes: 8, tickedAt: 1 },
  { id: 2, plannedMinutes: 5, spentMinutes: 6, tickedAt: 2 },
  { id: 3, plannedMinutes: 4, spentMinutes: null, tickedAt: null },
  { id: 4, plannedMinutes: 3, spentMinutes: null, tickedAt: null },
  { id: 5, plannedMinutes: 9, spentMinutes: null, tickedAt: null },
];

describe("how far a rework card has come", () => {
  it("stands at step 3 of 5 after two ticks, with 14 of 28 minutes", () => {
    const progress = cardProgress(mock);
    expect(progress).toMatchObject({ steps: 5, ticked: 2, openStep: 3, plannedMinutes: 28, spentMinutes: 14 });
    expect(progress.share).toBeCloseTo(2 / 5, 12);
    expect(progressWords(progress)).toBe("Step 3 of 5");
  });

  it("has no open step once all are ticked: the re-strike is due", () => {
    const done = cardProgress(mock.map((step) => ({ ...step, tickedAt: 9, spentMinutes: 1 })));
    expect(done.openStep).toBeNull();
    expect(done.share).toBe(1);
    expect(progressWords(done)).toBe("Re-strike due");
  });

  it("is ready while nothing is ticked", () => {
    expect(progressWords({ steps: 5, ticked: 0 })).toBe("Card ready");
  });

  it("counts no minutes of a step that is not ticked, whatever stands in it", () => {
    const step = fc.record({
      id: fc.nat(),
      plannedMinutes: fc.nat({ max: 1440 }),
      spentMinutes: fc.option(fc.nat({ max: 1440 })),
      tickedAt: fc.constant(null),
    });
    fc.assert(
      fc.property(fc.array(step), (steps) => {
        expect(cardProgress(steps).spentMinutes).toBe(0);
      }),
    );
  });

  it("has a share from 0 to 1, 0 for a card without steps", () => {
    expect(cardProgress([]).share).toBe(0);
  });
});
