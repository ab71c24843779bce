import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { checkAddress, checkFromAddress, typedAgain } from "@/lib/metals/check-address";
import { CHECK_FIELDS, readTypedCheck, startingCheck, type TypedCheck } from "@/lib/metals/typed-check";

const typed = (changed: Partial<TypedCheck> = {}): TypedCheck => ({
  air: "48.6",
  water: "41.3",
  temp: "22",
  error: "0.1",
  pull: "",
  colour: "",
  ...changed,
});

describe("what is typed into the part check", () => {
  it("reads points and commas alike", () => {
    const points = readTypedCheck(typed(), "metric");
    expect(points.kind).toBe("ready");
    expect(readTypedCheck(typed({ air: "48,6", water: " 41,3 " }), "metric")).toEqual(points);
  });

  it("reads the water's temperature as the shop does: 71.6 °F is 22 °C", () => {
    // (71.6 − 32) × 5/9 = 22, exact.
    const read = readTypedCheck(typed({ temp: "71.6" }), "us");
    expect(read.kind === "ready" && read.input.waterTempC).toBeCloseTo(22, 9);
  });

  it("scolds nobody who has typed nothing: it only asks", () => {
    const read = readTypedCheck(startingCheck("metric"), "metric");
    expect(read.kind).toBe("empty");
    expect(Object.keys(read.kind === "ready" ? {} : read.faults)).toEqual(["air", "water"]);
  });

  it.each([
    ["air", "heavy", "metric"],
    // A thousands mark or a decimal comma: neither is taken for the other.
    ["air", "1,250", "metric"],
    ["air", "-48.6", "metric"],
    ["air", "0", "metric"],
    ["water", "0", "metric"],
    ["water", "48.6", "metric"],
    ["water", "52", "metric"],
    ["temp", "72", "metric"],
    ["temp", "10", "us"],
    ["error", "0", "metric"],
    // Two weights that differ by 7.3 g mean nothing on a balance that is 5 g off.
    ["error", "5", "metric"],
    ["pull", "sideways", "metric"],
    ["colour", "pink", "metric"],
  ] as const)("says beside %s what is wrong with %j", (field, value, units) => {
    const temp = units === "us" && field !== "temp" ? { temp: "72" } : {};
    const read = readTypedCheck(typed({ ...temp, [field]: value }), units);
    expect(read.kind).toBe("refused");
    expect(Object.keys(read.kind === "ready" ? {} : read.faults)).toEqual([field]);
  });

  it("names the shop's own unit when the water is too hot: 40 °C is 104 °F", () => {
    const read = readTypedCheck(typed({ temp: "150" }), "us");
    expect(read.kind === "refused" && read.faults.temp).toContain("32 and 104 °F");
  });

  it("never breaks, whatever is typed", () => {
    const word = fc.string({ maxLength: 12 });
    fc.assert(
      fc.property(fc.tuple(word, word, word, word, word, word), (words) => {
        const any = Object.fromEntries(CHECK_FIELDS.map((field, index) => [field, words[index] ?? ""])) as TypedCheck;
        expect(["empty", "refused", "ready"]).toContain(readTypedCheck(any, "metric").kind);
      }),
    );
  });
});

describe("the address of a part check", () => {
  it("brings back what was typed, to reload and to share", () => {
    const seen = typed({ air: "48,6", pull: "none", colour: "blue-grey" });
    const address = checkAddress(seen, { job: "J-3318", case: "CT-2607-0042" });
    expect(address).toMatchObject({ job: "J-3318", case: "CT-2607-0042", air: "48,6" });
    expect(checkFromAddress(address, "metric")).toEqual({ typed: seen, isAsked: true });
  });

  it("is bare while nobody has typed anything", () => {
    expect(checkAddress(startingCheck("us"), { job: null, case: null })).toEqual({});
    expect(checkFromAddress({}, "us")).toEqual({ typed: startingCheck("us"), isAsked: false });
  });

  it("leaves out what nobody would type: doubled words, pages of text", () => {
    const { typed: read } = checkFromAddress({ air: ["1", "2"], water: "9".repeat(99) }, "metric");
    expect(read).toEqual(startingCheck("metric"));
  });

  it("types a kept check again in the shop's unit: 22 °C is 71.6 °F", () => {
    const kept = { weightAirG: 48.6, weightWaterG: 41.3, waterTempC: 22, balanceErrorG: 0.1, pull: null, colour: null };
    expect(typedAgain(kept, "us")).toEqual(typed({ temp: "71.6" }));
  });
});
