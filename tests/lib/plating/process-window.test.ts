import { describe, expect, it } from "vitest";
import { checkAgainstWindow, STRIKE_WINDOWS } from "@/lib/plating/process-window";
import { fahrenheitToC } from "@/lib/units";

const [voltage, temperature, seconds] = STRIKE_WINDOWS.bath;

describe("a check on the strike bath", () => {
  it("finds the set points in the window: 0.8 V, 130 °F, 30 s (common practice)", () => {
    if (!voltage || !temperature || !seconds) throw new Error("the bath has three windows");
    expect(checkAgainstWindow(voltage, 0.8)).toEqual({ inside: true, beyondBy: 0, words: "In the window." });
    expect(checkAgainstWindow(temperature, fahrenheitToC(130)).inside).toBe(true);
    expect(checkAgainstWindow(seconds, 30).inside).toBe(true);
  });

  it("says by how much it is out, over and under", () => {
    if (!voltage || !seconds) throw new Error("the bath has windows");
    expect(checkAgainstWindow(voltage, 1.1)).toMatchObject({ inside: false, words: "0.2 V over." });
    expect(checkAgainstWindow(voltage, 0.5).beyondBy).toBeCloseTo(-0.2, 12);
    expect(checkAgainstWindow(seconds, 48).words).toBe("18 s over. The solution is due for replacement.");
  });

  it("says it in °F and A/ft² to a shop that reads those", () => {
    const density = STRIKE_WINDOWS.bath[3];
    if (!temperature || !density) throw new Error("the bath has four windows");
    // 57 °C is 134.6 °F by definition of the two scales; 4 A/dm² is 37.2 A/ft² (1 ft = 3.048 dm, exact).
    expect(checkAgainstWindow(temperature, fahrenheitToC(138), "us").words).toBe("3.4 °F over.");
    expect(checkAgainstWindow(temperature, fahrenheitToC(138)).words).toBe("1.89 °C over.");
    expect(checkAgainstWindow(temperature, fahrenheitToC(127), "us").inside).toBe(true);
    expect(checkAgainstWindow(density, 4.5, "us").words).toBe("4.65 A/ft² over.");
  });

  it("refuses what is no reading, and a window upside down", () => {
    if (!voltage) throw new Error("the bath has windows");
    expect(() => checkAgainstWindow(voltage, Number.NaN)).toThrow(RangeError);
    expect(() => checkAgainstWindow({ kind: "voltageV", low: 3, high: 2, source: "test" }, 1)).toThrow(RangeError);
  });
});
