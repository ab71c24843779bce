import { describe, expect, it } from "vitest";
import { missCost, type MixJob, type OwnCost } from "@/lib/costs/miss-cost";
import { STARTING_RATES } from "@/lib/costs/starting-rates";
import { compareAtStrike } from "@/lib/costs/strip-estimate";

const SHELL: MixJob = {
  parts: 300,
  areaDm2: 0.9,
  baseMetal: "brass",
  stack: [
    { metal: "Cu", thicknessUm: 0.5 },
    { metal: "Ni", thicknessUm: 5 },
    { metal: "Au", thicknessUm: 0.8 },
  ],
  partValueCents: 3800,
};
const BRACKET: MixJob = {
  parts: 100,
  areaDm2: 2.4,
  baseMetal: "steel",
  stack: [
    { metal: "Cu", thicknessUm: 0.5 },
    { metal: "Ni", thicknessUm: 12 },
  ],
  partValueCents: 2900,
};
/** Eight later cases: 20 parts for $2,960; at the strike 100 parts for $800. By hand: $148 less $8 is $140 a part. */
const OWN: OwnCost = {
  laterCases: 8,
  laterParts: 20,
  laterCents: 296_000,
  strikeCases: 40,
  strikeParts: 100,
  strikeCents: 80_000,
};
const basis = { batch: 4, rates: STARTING_RATES };
const savedAPart = ({ parts: _parts, partValueCents, ...job }: MixJob) =>
  compareAtStrike({
    ...job,
    partValueCents: partValueCents ?? undefined,
    quantity: 4,
    stageFound: "at-strike",
    rates: STARTING_RATES,
  }).savedCents / 4;

describe("what a bad part that goes on costs more", () => {
  it("is the shop's own mean once eight cases were found later, and says so", () => {
    const miss = missCost(OWN, "in a year", [SHELL], basis);
    expect(miss?.cents).toBe(14_000);
    expect(miss?.from).toContain("own 8 cases found later");
  });

  it("is the estimate for what the shop strikes, weighted by parts, while there are seven", () => {
    const miss = missCost({ ...OWN, laterCases: 7 }, "in a year", [SHELL, BRACKET], basis);
    expect(miss?.cents).toBeCloseTo((savedAPart(SHELL) * 300 + savedAPart(BRACKET) * 100) / 400, 6);
    expect(miss?.from).toContain("estimate for the 2 jobs struck");
    expect(miss?.from).toContain("7 so far");
  });

  it("is never below nothing, when faults found later happened to be cheap", () => {
    expect(missCost({ ...OWN, laterCents: 20 }, "in a year", [], basis)?.cents).toBe(0);
  });

  it("is not known without cases and without a job", () => {
    expect(missCost({ ...OWN, laterCases: 0 }, "in a year", [], basis)).toBeNull();
  });
});
