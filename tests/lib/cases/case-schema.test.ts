import { randomUUID } from "node:crypto";
import { describe, expect, it } from "vitest";
import { amendSchema, confirmationSchema, outcomeSchema, snapSchema, tickSchema } from "@/lib/cases/case.schema";
import { readForm } from "@/lib/server/form";

/** A snap as a form sends it: every value a text. */
function snapForm(changes: Record<string, string | string[] | null> = {}): Record<string, unknown> {
  const values: Record<string, string | string[] | null> = {
    snapKey: randomUUID(),
    "photoIds[]": [randomUUID()],
    workOrderId: "7",
    runId: "",
    baseMetal: "brass",
    method: "bath",
    foundStationId: "3",
    "solutionIds[]": ["1", "2"],
    stageFound: "at-strike",
    quantity: "3",
    "symptoms[]": ["patchy-haze"],
    calledClass: "underactivation",
    sure: "2",
    ...changes,
  };
  const form = new FormData();
  for (const [name, value] of Object.entries(values)) {
    if (value === null) continue;
    for (const each of [value].flat()) form.append(name, each);
  }
  return readForm(form);
}

const faultOf = (raw: unknown, field: string) =>
  snapSchema.safeParse(raw).error?.issues.find((issue) => issue.path[0] === field)?.message;

describe("a snap's form", () => {
  it("comes out as numbers and lists, with nothing invented for what was left empty", () => {
    expect(snapSchema.parse(snapForm())).toMatchObject({
      workOrderId: 7,
      runId: undefined,
      quantity: 3,
      solutionIds: [1, 2],
      sure: 2,
      note: "",
    });
    expect(snapSchema.parse(snapForm({ "solutionIds[]": null })).solutionIds).toEqual([]);
  });

  it("takes can't tell for an answer", () => {
    expect(snapSchema.parse(snapForm({ calledClass: "cant-tell" })).calledClass).toBeNull();
  });

  it.each([
    ["quantity", { quantity: "" }, /whole number/],
    ["quantity", { quantity: "0" }, /at least 1/],
    ["quantity", { quantity: "2.5" }, /whole number/],
    ["quantity", { quantity: "1e308" }, /at most|whole number/],
    ["baseMetal", { baseMetal: "unobtainium" }, /Choose the base metal/],
    ["photoIds", { "photoIds[]": null }, /at least one photo/],
    ["photoIds", { "photoIds[]": Array.from({ length: 7 }, () => randomUUID()) }, /At most 6 photos/],
    ["calledClass", { calledClass: "'; drop table" }, /Choose a class/],
    ["sure", { sure: "9" }, /how sure/],
    ["note", { note: "x".repeat(2001) }, /under 2000/],
  ])("says what to do about %s", (field, changes, words) => {
    expect(faultOf(snapForm(changes), field)).toMatch(words);
  });
});

describe("the second look's form", () => {
  const base = {
    ref: "CT-2607-0042",
    classSlug: "dewetting",
    causeId: "4",
    disposition: "rework",
    steps: JSON.stringify([{ title: "Polish", plannedMinutes: 6 }]),
  };

  it("reads the card from its one field, and wants a card for rework and a reason for anything else", () => {
    expect(confirmationSchema.parse(base).steps).toEqual([
      { title: "Polish", detail: "", plannedMinutes: 6, cautionKeys: [] },
    ]);
    expect(confirmationSchema.safeParse({ ...base, steps: "" }).error?.issues[0]?.message).toMatch(/at least one step/);
    expect(confirmationSchema.safeParse({ ...base, steps: "{not json" }).success).toBe(false);
    expect(confirmationSchema.safeParse({ ...base, disposition: "scrap", why: "" }).error?.issues[0]?.path).toEqual([
      "why",
    ]);
  });
});

describe("the card's forms", () => {
  it("take no minutes below nothing or beyond a day, and no outcome without photo or word", () => {
    expect(tickSchema.safeParse({ ref: "CT-2607-0042", stepId: "1", spentMinutes: "-1" }).success).toBe(false);
    expect(tickSchema.safeParse({ ref: "CT-2607-0042", stepId: "1", spentMinutes: "1441" }).success).toBe(false);
    expect(outcomeSchema.safeParse({ ref: "CT-2607-0042", outcome: "sound" }).error?.issues[0]?.message).toMatch(
      /photo of the re-strike/,
    );
    expect(
      amendSchema.safeParse({ ref: "42", quantity: "1", baseMetal: "brass", stageFound: "at-strike" }).error?.issues[0]
        ?.message,
    ).toMatch(/CT-2607-0042/);
  });
});
