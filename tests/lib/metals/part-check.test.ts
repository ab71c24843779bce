import { describe, expect, it } from "vitest";
import type { Looks } from "@/lib/metals/material";
import { checkPart } from "@/lib/metals/part-check";
import { published, weighingOf } from "./weighings";

const check = (densityGPerCm3: number, looks: Looks = {}, weightAirG = 500) =>
  checkPart({ ...weighingOf(densityGPerCm3, weightAirG), ...looks });
const warned = (...args: Parameters<typeof check>) => check(...args).warnings.join("\n");

describe("a part check", () => {
  it("gives the pretreatment of the likeliest metal, and none when nothing fits", () => {
    expect(check(published("zinc die cast ZA-8")).route).toMatchObject({ baseMetal: "zinc" });
    expect(check(published("free-cutting brass C36000"), { colour: "yellow" }).route).toMatchObject({
      baseMetal: "brass",
    });
    expect(check(5.2)).toMatchObject({ candidates: [], route: null });
  });

  it("always warns that a hollow or plated part misleads, and of bubbles and wet parts", () => {
    for (const density of [2.7, 5.2, 8.5, 19.3]) {
      expect(warned(density)).toMatch(/hollow, porous or plated part misleads/);
      expect(warned(density)).toMatch(/Air bubbles/);
    }
  });

  it("asks for a heavier part or a finer balance when the error is above 1 %", () => {
    expect(warned(8.5, {}, 5)).toMatch(/too wide to tell brass, bronze and copper apart\. Weigh a heavier part/);
    expect(warned(8.5, {}, 500)).not.toMatch(/too wide/);
  });

  it("says what further look tells two base metals apart", () => {
    // Copper 8.89 to 8.94 and nickel 8.88 to 8.91 overlap: nickel pulls. Nickel silver and brass: the colour.
    expect(warned(8.9)).toMatch(
      /does not tell .*(copper and nickel|nickel and copper).* apart\. Hold a magnet to it\./,
    );
    expect(warned(8.6)).toMatch(/does not tell .* apart\. File a spot and look at its colour\./);
    expect(warned(7.25, { pull: "none" })).not.toMatch(/does not tell/);
  });

  it("warns that tungsten weighs what fine gold weighs, also where the part looks yellow", () => {
    expect(warned(19.27)).toMatch(/gold-plated tungsten/);
    expect(warned(19.32, { colour: "yellow" })).toMatch(/gold-plated tungsten/);
    expect(warned(10.36)).not.toMatch(/tungsten/);
  });

  it("says that a thick nickel plate can pull a little, when a magnet did", () => {
    expect(warned(8.5, { pull: "faint" })).toMatch(/thick nickel plate makes brass or zinc pull a little/);
    expect(warned(8.5, { pull: "none" })).not.toMatch(/thick nickel plate/);
  });

  it("says whether nothing has that weight, or the magnet and colour speak against what has", () => {
    expect(warned(5.2)).toMatch(/No metal in the table reads 5\.20 g\/cm³/);
    expect(warned(6.6, { pull: "strong" })).toMatch(
      /could be zinc die cast Alloy 3 .*, but the magnet speaks against it/,
    );
    expect(warned(6.6, { pull: "strong", colour: "red" })).toMatch(/the magnet and the colour speak against it/);
  });

  it("names its sources, and what it took for granted", () => {
    expect(check(8.5).sources.join(" ")).toMatch(/Tanaka.*OIML R 111.*JCGM 100/);
    expect(check(8.5).assumed.join(" ")).toMatch(/0\.01 g \(a bench balance, from memory\)/);
    const told = checkPart({ ...weighingOf(8.5), balanceErrorG: 0.05 });
    expect(told.assumed.join(" ")).not.toMatch(/bench balance/);
  });
});
