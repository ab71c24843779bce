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

  it("refuses what is no reading, and a window upside down", () => {
    if (!voltage) throw new Error("the bath has windows");
    expect(() => checkAgainstWindow(voltage, Number.NaN)).toThrow(RangeError);
    expect(() => checkAgainstWindow({ kind: "voltageV", low: 3, high: 2, source: "test" }, 1)).toThrow(RangeError);
  });
});
