import { describe, expect, it } from "vitest";
import { readJobCursor, writeJobCursor } from "@/lib/cases/job-cursor";
import { jobChanges } from "@/lib/cases/job-words";
import { changeJobInput, openJobInput } from "@/lib/cases/job.schema";
import { readForm } from "@/lib/server/form";

// The sentences and limits are those of the jobs page's brief: up to four layers after the strike, decimal money.
const TYPED = {
  number: " J-3401 ",
  customer: "Orrin & Pike",
  partName: "shell",
  baseMetal: "brass",
  alloy: "",
  quantity: "48",
  areaDm2: "1,25",
  layer2Metal: "Ni",
  layer2Um: "5",
  layer3Metal: "Au",
  layer3Um: "0.8",
  layer4Metal: "",
  layer4Um: "",
};

function formOf(values: Record<string, string>): Record<string, unknown> {
  const form = new FormData();
  for (const [name, value] of Object.entries(values)) form.append(name, value);
  return readForm(form);
}

function faultsOf(changes: Record<string, string>): Record<string, string> {
  const result = openJobInput.safeParse(formOf({ ...TYPED, ...changes }));
  if (result.success) return {};
  return Object.fromEntries(result.error.issues.map((issue) => [issue.path.join("."), issue.message]));
}

describe("opening a job", () => {
  it("reads what the form sends: trimmed, a decimal comma, layers in order, no alloy", () => {
    expect(openJobInput.parse(formOf(TYPED))).toEqual({
      number: "J-3401",
      customer: "Orrin & Pike",
      partName: "shell",
      baseMetal: "brass",
      alloy: null,
      quantity: 48,
      areaDm2: 1.25,
      partValueCents: undefined,
      finalStack: [
        { metal: "Ni", thicknessUm: 5 },
        { metal: "Au", thicknessUm: 0.8 },
      ],
    });
  });

  it("takes a job that ends at the strike", () => {
    const none = { layer2Metal: "", layer2Um: "", layer3Metal: "", layer3Um: "" };
    expect(openJobInput.parse(formOf({ ...TYPED, ...none })).finalStack).toEqual([]);
  });

  it("counts a part's value in whole cents, and an empty one as not known", () => {
    expect(openJobInput.parse(formOf({ ...TYPED, partValue: "42.29" })).partValueCents).toBe(4229);
    expect(openJobInput.parse(formOf({ ...TYPED, partValue: "" })).partValueCents).toBe(0);
    expect(Object.keys(faultsOf({ partValue: "1,000" }))).toEqual(["partValue"]);
  });

  it("asks beside the field for what is missing", () => {
    const names = ["number", "customer", "partName", "baseMetal", "quantity", "areaDm2"];
    const empty = Object.fromEntries(names.map((name) => [name, ""]));
    expect(Object.keys(faultsOf(empty)).toSorted()).toEqual(names.toSorted());
  });

  it.each(["0", "2.5", "-3", "100001", "many"])("refuses %s parts", (quantity) => {
    expect(Object.keys(faultsOf({ quantity }))).toEqual(["quantity"]);
  });

  it.each(["0", "-1", "palm", "10001"])("refuses an area of %s", (areaDm2) => {
    expect(Object.keys(faultsOf({ areaDm2 }))).toEqual(["areaDm2"]);
  });

  it("refuses layers listed upside down: no shop lays nickel on gold", () => {
    const faults = faultsOf({ layer2Metal: "Au", layer2Um: "0.8", layer3Metal: "Ni", layer3Um: "5" });
    // The strike is layer 1, so the form's second row is layer 3.
    expect(faults).toEqual({ layers: "Layer 3, nickel, lies above gold. List the layers from the base metal out." });
  });

  it("says which half of a layer is missing, and points at a gap", () => {
    expect(Object.keys(faultsOf({ layer3Um: "" }))).toEqual(["layer3Um"]);
    expect(Object.keys(faultsOf({ layer3Metal: "" }))).toEqual(["layer3Metal"]);
    expect(Object.keys(faultsOf({ layer2Metal: "", layer2Um: "" }))).toEqual(["layer3Metal"]);
    expect(Object.keys(faultsOf({ layer3Um: "0" }))).toEqual(["layer3Um"]);
  });
});

describe("changing a job", () => {
  it("takes no new number or customer", () => {
    const input = changeJobInput.parse(formOf({ ...TYPED, jobId: "7" }));
    const figures = ["areaDm2", "finalStack", "jobId", "metal", "partValueCents", "quantity"];
    expect(Object.keys(input).toSorted()).toEqual(figures);
  });

  it("leaves the metal alone where the form does not ask for it", () => {
    const { baseMetal: _, ...without } = TYPED;
    expect(changeJobInput.parse(formOf({ ...without, jobId: "7" }))).not.toHaveProperty("metal");
  });

  it("says in words what differs, and nothing of what does not", () => {
    const before = { quantity: 48, areaDm2: 1.2, partValueCents: 0, finalStack: [{ metal: "Ni", thicknessUm: 5 }] };
    const money = (cents: number) => `$${cents / 100}`;
    expect(jobChanges(before, { ...before, quantity: 60, partValueCents: 4200 }, money)).toEqual([
      "quantity from 48 parts to 60 parts",
      "value of a part from not set to $42",
    ]);
    expect(jobChanges(before, { ...before }, money)).toEqual([]);
  });
});

it("goes on from an address that it wrote, and begins at the first page for any other", () => {
  expect(readJobCursor(writeJobCursor({ at: 5, id: 7 }))).toEqual({ at: 5, id: 7 });
  for (const text of [undefined, "", "5", "5-", "-5-7", "a-b", "5-7-9"]) expect(readJobCursor(text)).toBeUndefined();
});
