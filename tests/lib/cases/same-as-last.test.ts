import { describe, expect, it } from "vitest";
import { sameAsLast, type LastSnap, type SnapChoices } from "@/lib/cases/same-as-last";

const DAY = 86_400_000;

/** Two open jobs, the newer one first; one activator in use and one strike bath; a brush solution beside them. */
const choices: SnapChoices = {
  jobs: [
    { id: 2, number: "J-2", customer: "Vale", partName: "bracket", baseMetal: "steel", alloy: null, quantity: 20 },
    {
      id: 1,
      number: "J-1",
      customer: "Orrin & Pike",
      partName: "shell",
      baseMetal: "brass",
      alloy: "C360",
      quantity: 48,
    },
  ],
  stations: [
    { id: 10, slug: "activate", kind: "activate", name: "Activate" },
    { id: 11, slug: "strike", kind: "strike", name: "Strike" },
    { id: 12, slug: "inspect", kind: "inspect", name: "Inspect" },
  ],
  solutions: [
    { id: 101, stationId: 10, code: "A-12", name: "Activator", method: "bath", windowDays: 14, madeUpAt: 0 },
    { id: 102, stationId: 10, code: "A-13", name: "Activator", method: "bath", windowDays: 14, madeUpAt: 9 * DAY },
    { id: 103, stationId: 11, code: "S-04", name: "Strike", method: null, windowDays: 60, madeUpAt: 0 },
    {
      id: 104,
      stationId: 10,
      code: "AB-2",
      name: "Brush activator",
      method: "brush",
      windowDays: 30,
      madeUpAt: 20 * DAY,
    },
  ],
  runs: [
    { id: 51, code: "R-51", workOrderId: 1, method: "bath", partsStruck: 48, struckAt: DAY, solutionIds: [101, 103] },
  ],
  classes: [],
};

const last: LastSnap = {
  workOrderId: 1,
  runId: 51,
  baseMetal: "brass",
  alloy: "C385",
  method: "bath",
  foundStationId: 11,
  stageFound: "after-final-plate",
  solutionIds: [101, 103],
};

// What has to hold is product.md's "job, base metal, run, solutions already filled in from the last time".
describe("same as last time", () => {
  it("repeats every fact of the last case while its job is open", () => {
    const { facts, isLast } = sameAsLast(choices, last);
    expect(isLast).toBe(true);
    expect(facts).toEqual({ ...last, alloy: "C385" });
  });

  it("takes the job's newest run, with what that run used", () => {
    const newer = { ...choices.runs[0], id: 52, code: "R-52", struckAt: 2 * DAY, solutionIds: [102, 103] };
    const { facts } = sameAsLast({ ...choices, runs: [newer as (typeof choices.runs)[0], ...choices.runs] }, last);
    expect(facts.runId).toBe(52);
    expect(facts.solutionIds).toEqual([102, 103]);
  });

  it("names the newest solution of the station once the one used is retired", () => {
    const inUse = choices.solutions.filter((each) => each.code !== "A-12");
    const { facts } = sameAsLast({ ...choices, solutions: inUse }, last);
    expect(facts.solutionIds.toSorted()).toEqual([102, 103]);
  });

  it("falls back to the newest open job when the last one is closed, and says so", () => {
    const { facts, isLast } = sameAsLast({ ...choices, jobs: choices.jobs.slice(0, 1) }, last);
    expect(isLast).toBe(false);
    expect(facts).toMatchObject({
      workOrderId: 2,
      baseMetal: "steel",
      alloy: "",
      runId: null,
      stageFound: "at-strike",
    });
  });

  it("begins a new member at the inspection bench with the newest open job", () => {
    const { facts, isLast } = sameAsLast(choices, null);
    expect(isLast).toBe(false);
    expect(facts).toMatchObject({ workOrderId: 2, foundStationId: 12, method: "bath" });
  });

  it("never offers a brush solution for a bath run", () => {
    expect(sameAsLast(choices, null).facts.solutionIds).not.toContain(104);
  });

  it("leaves the job open to choose where the shop has none", () => {
    expect(sameAsLast({ ...choices, jobs: [], runs: [] }, last).facts.workOrderId).toBeNull();
  });
});
