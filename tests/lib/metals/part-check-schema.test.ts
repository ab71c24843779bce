import { describe, expect, it } from "vitest";
import { COLOURS, PULLS } from "@/lib/metals/material-words";
import { partCheckSchema } from "@/lib/metals/part-check.schema";

const TYPED = { weightAirG: "100", weightWaterG: "84,86", waterTempC: " 20 " };

function sent(values: Record<string, string>) {
  const form = new FormData();
  for (const [name, value] of Object.entries(values)) form.append(name, value);
  return partCheckSchema.safeParse(Object.fromEntries(form));
}
const faultsOf = (values: object) =>
  Object.fromEntries(
    (partCheckSchema.safeParse(values).error?.issues ?? []).map((issue) => [issue.path.join("."), issue.message]),
  );

describe("what a weighing's form sends", () => {
  it("is read as numbers, with a point or a comma, and what was left empty as not said", () => {
    const read = sent({ ...TYPED, balanceErrorG: "", magnetic: "", colour: "" });
    expect(read.data).toEqual({
      weightAirG: 100,
      weightWaterG: 84.86,
      waterTempC: 20,
      balanceErrorG: undefined,
      pull: undefined,
      colour: undefined,
    });
  });

  it("is read the same as numbers of a route", () => {
    expect(partCheckSchema.parse({ weightAirG: 100, weightWaterG: 84.86, waterTempC: 20 })).toEqual(sent(TYPED).data);
  });

  it("is refused field by field where it is missing or no number", () => {
    expect(faultsOf({ weightWaterG: "heavy", waterTempC: null, balanceErrorG: [] })).toEqual({
      weightAirG: "Give the weight in air, in g.",
      weightWaterG: "Write a number such as 86.4, without a unit.",
      waterTempC: "Give the water's temperature, in °C.",
      balanceErrorG: "Write a number such as 86.4, without a unit.",
    });
    // 1,234 could be a thousand or one and a bit.
    for (const weightAirG of ["1,234", "12 g", "0x10", "1.2.3", true, {}, NaN, Infinity]) {
      expect(faultsOf({ ...TYPED, weightAirG }), String(weightAirG)).toHaveProperty("weightAirG");
    }
  });

  it("takes the magnet as yes, no or a word", () => {
    const pullOf = (magnetic: unknown) => partCheckSchema.parse({ ...TYPED, magnetic }).pull;
    expect([true, false, "true", "weak", "Strong"].map(pullOf)).toEqual([
      "strong",
      "none",
      "strong",
      "faint",
      "strong",
    ]);
    expect(PULLS.map(pullOf)).toEqual([...PULLS]);
    for (const magnetic of ["very", 1, "toString"]) {
      expect(faultsOf({ ...TYPED, magnetic })).toEqual({ magnetic: "Use one of: none, faint, strong." });
    }
  });

  it("takes a colour in any case and in the shop's other words", () => {
    const colourOf = (colour: string) => partCheckSchema.parse({ ...TYPED, colour }).colour;
    expect(COLOURS.map((colour) => colourOf(colour.toUpperCase()))).toEqual([...COLOURS]);
    expect(["white", "Silver", "gray", "brown", "brown-red", "copper", "gold"].map(colourOf)).toEqual([
      "silver-white",
      "silver-white",
      "grey",
      "red",
      "red",
      "red",
      "yellow",
    ]);
    for (const colour of ["mauve", 7, "constructor"]) {
      expect(faultsOf({ ...TYPED, colour })).toEqual({
        colour: "Use one of: yellow, red, blue-grey, silver-white, grey.",
      });
    }
  });
});
