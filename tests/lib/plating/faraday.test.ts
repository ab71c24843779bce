import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { InputError } from "@/lib/input-error";
import {
  equivalentGPerAh,
  FARADAY_C_PER_MOL,
  layerMassG,
  massByCurrent,
  plateForThickness,
  platedByCurrent,
  thicknessOfMassUm,
  umPerHourAtOneADm2,
} from "@/lib/plating/faraday";
import { DEPOSIT_METALS, METALS, parseMetal, type DepositMetal } from "@/lib/plating/metals";
import { milToUm, squareInchToDm2 } from "@/lib/units";
import { referenceRows } from "@/tests/fixtures/reference-rows";

describe("electrochemical equivalents agree with the handbook", () => {
  // g/(A·h) as printed in the handbook table of electrochemical equivalents (older atomic masses).
  const HANDBOOK: [DepositMetal, number, number][] = [
    ["Cu", 1, 2.37],
    ["Cu", 2, 1.186],
    ["Ni", 2, 1.095],
    ["Au", 1, 7.348],
    ["Au", 3, 2.449],
    ["Ag", 1, 4.024],
    ["Pd", 2, 1.985],
    ["Rh", 3, 1.28],
    ["Cr", 6, 0.323],
    ["Zn", 2, 1.219],
    ["Sn", 2, 2.214],
    ["Sn", 4, 1.106],
    ["Co", 2, 1.099],
    ["Pt", 4, 1.819],
    ["Fe", 2, 1.042],
    ["Cd", 2, 2.097],
    ["Pb", 2, 3.865],
    ["In", 3, 1.428],
  ];
  it.each(HANDBOOK)("%s, valence %i: %f g/(A·h)", (metal, valence, printed) => {
    expect(Math.abs(equivalentGPerAh({ metal, valence }) / printed - 1)).toBeLessThan(0.0013);
  });

  // A·h/ft² for 0.001 in, same handbook: checks equivalent and density together, within 5 % (older densities).
  const PER_MIL: [DepositMetal, number, number][] = [
    ["Cu", 1, 8.89],
    ["Cu", 2, 17.8],
    ["Ni", 2, 19],
    ["Au", 1, 6.2],
    ["Ag", 1, 6.2],
    ["Rh", 3, 22.9],
    ["Cr", 6, 51.8],
    ["Sn", 2, 7.8],
    ["Co", 2, 19],
    ["Cd", 2, 9.73],
  ];
  it.each(PER_MIL)("%s, valence %i: %f A·h for a square foot, a thousandth of an inch", (metal, valence, printed) => {
    const perFootMil = (9.290304 * 25.4) / umPerHourAtOneADm2({ metal, valence });
    expect(Math.abs(perFootMil / printed - 1)).toBeLessThan(0.05);
  });

  it("agrees with every metal and valence of the reference table: equivalent, µm per hour and A·h per dm² and µm (Faraday's law, IUPAC masses, CRC densities, worked out apart from this code)", () => {
    const rows = referenceRows("electrochemical_equivalents.csv");
    expect(new Set(rows.map((row) => `${row.symbol} ${row.valence}`)).size).toBeGreaterThanOrEqual(19);
    for (const row of rows) {
      const deposit = { metal: parseMetal(row.symbol ?? ""), valence: Number(row.valence) };
      expect(equivalentGPerAh(deposit), row.metal).toBeCloseTo(Number(row.equivalent_g_per_Ah_computed), 4);
      expect(umPerHourAtOneADm2(deposit), row.metal).toBeCloseTo(Number(row.um_per_h_at_1_A_dm2_100pct), 3);
      expect(1 / umPerHourAtOneADm2(deposit), row.metal).toBeCloseTo(Number(row.Ah_per_dm2_per_um_100pct), 5);
    }
  });

  it("uses the exact Faraday constant, e × N_A of the SI of 2019", () => {
    expect(FARADAY_C_PER_MOL).toBeCloseTo(1.602176634e-19 * 6.02214076e23, 8);
  });
});

describe("worked examples from print", () => {
  it("plates 41.17 g of silver in an hour at 10.23 A (OpenStax Chemistry 2e 17.7 prints 41.19 from rounded steps)", () => {
    const { massG } = massByCurrent({ metal: "Ag", currentA: 10.23, minutes: 60, efficiency: 1 });
    expect(massG).toBeCloseTo(41.17, 1);
    expect(Math.abs(massG - 41.19)).toBeLessThan(0.03);
  });

  it("takes 11.0 hours for 0.010 mm of trivalent chromium on 3.3 m² at 33.46 A (OpenStax Chemistry 2e 17.7)", () => {
    const plate = plateForThickness({
      metal: "Cr",
      valence: 3,
      areaDm2: 330,
      thicknessUm: 10,
      efficiency: 1,
      currentDensityADm2: 33.46 / 330,
    });
    expect(plate.minutes / 60).toBeCloseTo(11, 1);
    expect(Math.abs(plate.massG - 4.56 * 51.9961)).toBeLessThan(0.5);
    expect(Math.abs((plate.ampereHours * 3600) / 1.32e6 - 1)).toBeLessThan(0.003);
  });

  it("gives nickel the printed thickness constant 12.294 µm·dm²/(A·h) at 8.907 g/cm³ (nickel plating reference article)", () => {
    const { thicknessUm } = platedByCurrent({
      metal: "Ni",
      densityGCm3: 8.907,
      currentA: 1,
      minutes: 60,
      efficiency: 1,
      areaDm2: 1,
    });
    expect(Math.abs(thicknessUm - 12.294)).toBeLessThan(0.005);
  });

  it("gives 5.0 µm of chromium for a mean 14 A over 20 minutes on 125 cm² at 15 % (exam problem, Groover's constants, n = 3)", () => {
    const { thicknessUm } = platedByCurrent({
      metal: "Cr",
      valence: 3,
      currentA: 14,
      minutes: 20,
      efficiency: 0.15,
      areaDm2: 1.25,
    });
    expect(Math.abs(thicknessUm - 5.0)).toBeLessThan(0.06);
  });

  it("gives half of that from a hexavalent bath", () => {
    const one = { metal: "Cr" as const, currentA: 14, minutes: 20, efficiency: 0.15, areaDm2: 1.25 };
    const six = platedByCurrent({ ...one, valence: 6 }).thicknessUm;
    expect(platedByCurrent({ ...one, valence: 3 }).thicknessUm).toBeCloseTo(2 * six, 10);
  });

  it("plates 1.186 g of copper from an acid bath with one ampere-hour (public calculator page)", () => {
    expect(massByCurrent({ metal: "Cu", valence: 2, currentA: 1, minutes: 60, efficiency: 1 }).massG).toBeCloseTo(
      1.186,
      2,
    );
  });

  it("takes 11.31 A·h, 22.6 minutes at 30 A, for 0.002 in of brush nickel on 37.7 in² (Surface Finishing Guidebook 2011-12, 150 A·h per in³)", () => {
    // The book's factor holds the losses: 8.90 g/cm³ × 16.387 cm³/in³ ÷ 1.095 g/(A·h) is 133.2 A·h per in³ without any.
    const efficiency = (8.9 * 16.387064) / 1.095 / 150;
    const areaDm2 = squareInchToDm2(37.7);
    const plate = plateForThickness({
      metal: "Ni",
      areaDm2,
      thicknessUm: milToUm(2),
      efficiency,
      currentDensityADm2: 30 / areaDm2,
    });
    expect(plate.ampereHours).toBeCloseTo(11.31, 2);
    expect(plate.minutes).toBeCloseTo(22.6, 1);
  });
});

describe("the trade guidebook's nickel time table, 95 %", () => {
  // µm, A/dm², minutes as printed to two figures (finishingandcoating.com, article on nickel plating).
  const PRINTED = [
    [2, 0.5, 20],
    [2, 2, 5.1],
    [2, 5, 2],
    [4, 1, 20],
    [4, 1.5, 14],
    [4, 4, 5.1],
    [4, 8, 2.6],
    [6, 0.5, 61],
    [6, 3, 10],
    [6, 5, 6.1],
    [6, 10, 3.1],
    [6, 12, 2.6],
  ] as const;
  it.each(PRINTED)("%f µm at %f A/dm² hangs %f minutes", (thicknessUm, currentDensityADm2, printed) => {
    const { minutes } = plateForThickness({
      metal: "Ni",
      areaDm2: 3,
      thicknessUm,
      efficiency: 0.95,
      currentDensityADm2,
    });
    expect(Math.abs(minutes / printed - 1)).toBeLessThan(0.05);
  });
});

const anyMetal = fc.constantFrom(...DEPOSIT_METALS);
const positive = (most: number) => fc.double({ min: 1e-3, max: most, noNaN: true });

describe("identities", () => {
  it("time for a thickness and thickness from that time are each other's inverse", () => {
    fc.assert(
      fc.property(
        anyMetal,
        positive(100),
        positive(500),
        positive(1),
        positive(50),
        (metal, areaDm2, thicknessUm, efficiency, density) => {
          const plate = plateForThickness({ metal, areaDm2, thicknessUm, efficiency, currentDensityADm2: density });
          const there = massByCurrent({
            metal,
            currentA: plate.currentA,
            minutes: Math.min(plate.minutes, 1e6),
            efficiency,
          });
          fc.pre(plate.minutes < 1e6);
          expect(thicknessOfMassUm({ metal }, there.massG, areaDm2) / thicknessUm).toBeCloseTo(1, 9);
        },
      ),
    );
  });

  it("twice the area or twice the thickness is twice the mass", () => {
    fc.assert(
      fc.property(anyMetal, positive(100), positive(100), (metal, areaDm2, thicknessUm) => {
        const once = layerMassG({ metal }, areaDm2, thicknessUm);
        expect(layerMassG({ metal }, 2 * areaDm2, thicknessUm) / once).toBeCloseTo(2, 12);
        expect(layerMassG({ metal }, areaDm2, 2 * thicknessUm) / once).toBeCloseTo(2, 12);
      }),
    );
  });

  it("a deposit of 1 dm² and 100 µm weighs its density in grams", () => {
    for (const metal of DEPOSIT_METALS)
      expect(layerMassG({ metal }, 1, 100)).toBeCloseTo(METALS[metal].densityGCm3, 12);
  });
});

describe("impossible input is refused by name", () => {
  const good = { metal: "Ni" as const, areaDm2: 1, thicknessUm: 5, efficiency: 0.95, currentDensityADm2: 4 };
  it.each(["areaDm2", "thicknessUm", "efficiency", "currentDensityADm2"] as const)("%s", (field) => {
    for (const bad of [0, -1, Number.NaN, Infinity, 1e308]) {
      expect(() => plateForThickness({ ...good, [field]: bad })).toThrow(expect.objectContaining({ field }));
    }
  });

  it("a number so small that nothing can be counted: no time is endless and no answer is NaN", () => {
    expect(() => plateForThickness({ ...good, efficiency: 1e-310 })).toThrow(
      expect.objectContaining({ field: "efficiency" }),
    );
    expect(() => plateForThickness({ ...good, currentDensityADm2: 5e-324 })).toThrow(
      expect.objectContaining({ field: "currentDensityADm2" }),
    );
    expect(() => thicknessOfMassUm({ metal: "Ni" }, 1, 5e-324)).toThrow(expect.objectContaining({ field: "areaDm2" }));
    const tiny = plateForThickness({ ...good, areaDm2: 5e-324, thicknessUm: 5e-324 });
    expect(Object.values(tiny).every(Number.isFinite)).toBe(true);
  });

  it("an efficiency above 1 or a valence that nickel does not have", () => {
    expect(() => plateForThickness({ ...good, efficiency: 1.01 })).toThrow(InputError);
    expect(() => plateForThickness({ ...good, valence: 3 })).toThrow(expect.objectContaining({ field: "valence" }));
  });
});
