import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { checkStack, metalValueCents, strikeOf, weighStack, type Layer } from "@/lib/plating/deposit-stack";
import { DEPOSIT_METALS, parseMetal } from "@/lib/plating/metals";

const goldOnNickel: Layer[] = [
  { metal: "Cu", thicknessUm: 1 },
  { metal: "Ni", thicknessUm: 5 },
  { metal: "Au", thicknessUm: 0.8 },
];

describe("a stack weighed", () => {
  it("weighs each layer as area × thickness × density: 7.44 dm² by hand", () => {
    // 7.44 dm² = 744 cm²; copper 1e-4 cm × 8.96, nickel 5e-4 × 8.90, gold 0.8e-4 × 19.32 g/cm³ (CRC densities).
    const { layers, totalG, totalUm } = weighStack(goldOnNickel, 0.62, 12);
    expect(layers.map((layer) => Number(layer.massG.toFixed(4)))).toEqual([0.6666, 3.3108, 1.1499]);
    expect(totalG).toBeCloseTo(5.1274, 4);
    expect(totalUm).toBeCloseTo(6.8, 12);
  });

  it("is worth the sum of its layers at the shop's prices", () => {
    const { layers } = weighStack(goldOnNickel, 0.62, 12);
    // 1.14992 g × 12860 + 3.3108 g × 1.8 + 0.666624 g × 1
    expect(metalValueCents(layers, { Cu: 1, Ni: 1.8, Au: 12860 })).toBeCloseTo(14794.6, 0);
    expect(() => metalValueCents(layers, { Cu: 1, Ni: 2 })).toThrow(
      expect.objectContaining({ field: "metalCentsPerG" }),
    );
  });

  it("has layers that add up to the whole, whatever the order", () => {
    const anyLayer = fc.record({
      metal: fc.constantFrom("Cu" as const, "Ni" as const, "Zn" as const, "Sn" as const),
      thicknessUm: fc.double({ min: 0.01, max: 100, noNaN: true }),
    });
    fc.assert(
      fc.property(fc.array(anyLayer, { minLength: 1, maxLength: 6 }), (stack) => {
        const there = weighStack(stack, 2.5, 3);
        const back = weighStack([...stack].reverse(), 2.5, 3);
        expect(there.layers.reduce((sum, layer) => sum + layer.massG, 0)).toBeCloseTo(there.totalG, 9);
        expect(back.totalG).toBeCloseTo(there.totalG, 9);
      }),
    );
  });
});

describe("an impossible stack is refused by name", () => {
  it("no layer, nothing thick, a metal that nobody plates", () => {
    expect(() => checkStack([])).toThrow(expect.objectContaining({ field: "stack" }));
    for (const thicknessUm of [0, -1, Number.NaN, 1e308]) {
      expect(() => checkStack([{ metal: "Ni", thicknessUm }])).toThrow(
        expect.objectContaining({ field: "stack.0.thicknessUm" }),
      );
    }
    // @ts-expect-error what a body could hold
    expect(() => checkStack([{ metal: "Xx", thicknessUm: 1 }])).toThrow(
      expect.objectContaining({ field: "stack.0.metal" }),
    );
    // @ts-expect-error a word that every object knows is no metal
    expect(() => checkStack([{ metal: "constructor", thicknessUm: 1 }])).toThrow(/metal/);
  });

  it("layers listed from the top down", () => {
    expect(() => checkStack([...goldOnNickel].reverse())).toThrow(/base metal out/);
    const upsideDown = [
      ["Ag", "Cu"],
      ["Au", "Sn", "Ni"],
      ["Cr", "Ni", "Cu"],
    ] as const;
    for (const metals of upsideDown) {
      expect(() => checkStack(metals.map((metal) => ({ metal, thicknessUm: 1 })))).toThrow(/base metal out/);
    }
    expect(() => checkStack(goldOnNickel)).not.toThrow();
    expect(() =>
      checkStack([
        { metal: "Ni", thicknessUm: 0.3 },
        { metal: "Cu", thicknessUm: 5 },
      ]),
    ).not.toThrow();
  });

  it("a range that does not run upward", () => {
    const layer: Layer = { metal: "Au", thicknessUm: 0.8, thicknessLowUm: 0.9, thicknessHighUm: 1.2 };
    expect(() => checkStack([layer])).toThrow(expect.objectContaining({ field: "stack.0.thicknessUm" }));
    expect(() => checkStack([{ ...layer, thicknessLowUm: 0.6 }])).not.toThrow();
  });
});

describe("what lies on the part at the strike", () => {
  it("is the copper strike and what is under it, never the plate above", () => {
    expect(strikeOf(goldOnNickel)).toEqual([{ metal: "Cu", thicknessUm: 1 }]);
    const onStainless: Layer[] = [
      { metal: "Ni", thicknessUm: 0.3 },
      { metal: "Cu", thicknessUm: 0.5 },
      { metal: "Ag", thicknessUm: 8 },
    ];
    expect(strikeOf(onStainless)).toEqual(onStainless.slice(0, 2));
  });

  it("is no thicker than a strike: 5 µm (Surface Finishing Guidebook, strike plate 3 to 5 µm), without copper a flash", () => {
    expect(strikeOf([{ metal: "Cu", thicknessUm: 20 }])).toEqual([{ metal: "Cu", thicknessUm: 5 }]);
    expect(strikeOf([{ metal: "Ni", thicknessUm: 20 }])).toEqual([{ metal: "Ni", thicknessUm: 0.5 }]);
  });
});

describe("a metal as people type it", () => {
  it("is known by symbol and by name, in any case", () => {
    for (const symbol of DEPOSIT_METALS) expect(parseMetal(symbol.toUpperCase())).toBe(symbol);
    expect(parseMetal(" Nickel ")).toBe("Ni");
    expect(() => parseMetal("unobtainium")).toThrow(expect.objectContaining({ field: "metal" }));
  });
});
