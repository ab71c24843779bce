import { randomUUID } from "node:crypto";
import { describe, expect, it } from "vitest";
import { snapSchema } from "@/lib/cases/case.schema";
import { CANT_TELL, missingIn, newDraft, snapBody, type SnapDraft } from "@/lib/cases/snap-draft";

const facts = {
  workOrderId: 1,
  runId: null,
  baseMetal: "brass",
  alloy: "",
  method: "bath",
  foundStationId: 3,
  solutionIds: [7],
  stageFound: "at-strike",
} as const;

const full = (some: Partial<SnapDraft> = {}): SnapDraft => ({
  ...newDraft({ ...facts, solutionIds: [7] }, randomUUID()),
  photoIds: [randomUUID()],
  calledClass: "dewetting",
  sure: 2,
  ...some,
});

describe("a snap before it is sent", () => {
  it("asks for a photo, a call and how sure, and for nothing that is filled in already", () => {
    const fresh = newDraft({ ...facts, solutionIds: [] }, randomUUID());
    expect(Object.keys(missingIn(fresh)).toSorted()).toEqual(["calledClass", "photoIds"]);
    expect(Object.keys(missingIn(full({ sure: null })))).toEqual(["sure"]);
    expect(missingIn(full())).toEqual({});
  });

  it("does not ask somebody who can't tell how sure they are", () => {
    expect(missingIn(full({ calledClass: CANT_TELL, sure: null }))).toEqual({});
  });

  it("refuses a number of parts that is empty, zero or a fraction", () => {
    for (const quantity of [NaN, 0, 1.5]) expect(missingIn(full({ quantity })).quantity).toMatch(/number of parts/);
  });

  it("is complete for the server as soon as nothing is missing", () => {
    // The judge is the server's own schema, on what JSON leaves of the body.
    for (const draft of [full(), full({ calledClass: CANT_TELL, sure: null }), full({ runId: 5, note: "edge" })]) {
      const sent: unknown = JSON.parse(JSON.stringify(snapBody(draft)));
      expect(snapSchema.safeParse(sent).success).toBe(true);
    }
  });

  it("sends can't tell as no class, and no run as none", () => {
    const sent = snapSchema.parse(JSON.parse(JSON.stringify(snapBody(full({ calledClass: CANT_TELL, sure: null })))));
    expect(sent.calledClass).toBeNull();
    expect(sent.runId).toBeUndefined();
  });
});
