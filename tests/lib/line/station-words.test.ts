import { describe, expect, it } from "vitest";
import { solutionAge } from "@/lib/line/solution-age";
import { stationView } from "@/lib/line/station-words";

const DAY_MS = 86_400_000;

describe("a solution's age", () => {
  it("counts the day of the make-up as the first", () => {
    expect(solutionAge(0, 14, 0).words).toBe("day 1 of 14");
    expect(solutionAge(0, 14, 5 * DAY_MS).words).toBe("day 6 of 14");
    expect(solutionAge(0, 14, 14 * DAY_MS - 1).words).toBe("day 14 of 14");
  });

  it("is due on the day after its window, and over from then on", () => {
    expect(solutionAge(0, 14, 14 * DAY_MS).words).toBe("change due");
    expect(solutionAge(0, 14, 15 * DAY_MS).words).toBe("1 day over");
    expect(solutionAge(0, 14, 19 * DAY_MS)).toMatchObject({ words: "5 days over", daysOver: 5 });
  });
});

describe("a station on the strip", () => {
  const base = { slug: "activate", name: "Activate", kind: "activate" as const, held: 3, check: null, waiting: 0 };

  it("is spoken for by the solution nearest its end, and warns when that is over", () => {
    const solutions = [
      { windowDays: 14, madeUpAt: 10 * DAY_MS },
      { windowDays: 14, madeUpAt: 0 },
    ];
    expect(stationView({ ...base, solutions }, 16 * DAY_MS)).toMatchObject({
      note: "2 days over",
      over: true,
      level: 0.12,
      held: 3,
    });
  });

  it("shows its last check while it is fresh, and never an empty tank", () => {
    const fresh = { ...base, kind: "strike" as const, solutions: [{ windowDays: 60, madeUpAt: 0 }] };
    expect(stationView({ ...fresh, check: { bathTempC: 54.2, volts: 0.8 } }, DAY_MS).note).toBe("54 °C 0.8 V");
    expect(stationView({ ...fresh, solutions: [] }, DAY_MS).note).toBe("no solution logged");
  });

  it("lets a rinse run and says at the bench how many cases wait", () => {
    expect(stationView({ ...base, kind: "rinse", solutions: [] }, 0)).toMatchObject({ flowing: true, note: "running" });
    expect(stationView({ ...base, kind: "inspect", solutions: [], waiting: 1 }, 0).note).toBe("1 case waits");
    expect(stationView({ ...base, kind: "inspect", solutions: [], waiting: 0 }, 0).note).toBe("nothing waits");
  });
});
