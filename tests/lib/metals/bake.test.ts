import { describe, expect, it } from "vitest";
import { bakeHours } from "@/lib/metals/pretreatment/bake";

/** ASTM B850-98 (2009/2015), Table 1, as a job shop's public bake chart quotes it: MPa from, MPa to, least hours. */
const B850_TABLE_1: readonly (readonly [number, number, number])[] = [
  [1701, 1800, 22],
  [1601, 1700, 20],
  [1501, 1600, 18],
  [1401, 1500, 16],
  [1301, 1400, 14],
  [1201, 1300, 12],
  [1101, 1200, 10],
  [1001, 1100, 8],
];

describe("the bake of high-strength steel", () => {
  it.each(B850_TABLE_1)("bakes %i to %i MPa for at least %i h at 190 to 220 °C", (from, to, hours) => {
    const bake = { asks: "bake", leastHours: hours, lowTempC: 190, highTempC: 220 };
    expect(bakeHours(from)).toEqual(bake);
    expect(bakeHours((from + to) / 2)).toEqual(bake);
    expect(bakeHours(to)).toEqual(bake);
  });

  it("asks for none up to 1000 MPa, where the table begins", () => {
    expect(bakeHours(400)).toEqual({ asks: "none" });
    expect(bakeHours(1000)).toEqual({ asks: "none" });
  });

  it("sends steel stronger than the table to an engineer", () => {
    expect(bakeHours(1801)).toEqual({ asks: "engineer" });
  });

  it("never bakes stronger steel for less", () => {
    const hours = Array.from({ length: 799 }, (_, index) => bakeHours(1001 + index)).map((bake) =>
      bake.asks === "bake" ? bake.leastHours : Number.NaN,
    );
    expect(hours.every((each, index) => index === 0 || each >= (hours[index - 1] ?? Infinity))).toBe(true);
  });

  it.each([0, -5, Number.NaN, Infinity])("refuses %d MPa", (tensileMPa) => {
    expect(() => bakeHours(tensileMPa)).toThrow(expect.objectContaining({ field: "tensileMPa" }));
  });
});
