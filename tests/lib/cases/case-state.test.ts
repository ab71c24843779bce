import { describe, expect, it } from "vitest";
import { canHappen, CASE_STATES, nextState } from "@/lib/cases/case-state";
import { formatCaseRef, yearMonth } from "@/lib/cases/case-ref";
import { agreementOf } from "@/lib/cases/agreement-words";

describe("what can happen to a case", () => {
  it("closes no held part without a second look", () => {
    expect(() => nextState("held", "re-strike-sound")).toThrow(/held/);
    expect(() => nextState("held", "disposed")).toThrow(/held/);
    expect(nextState("held", "confirmed")).toBe("confirmed");
    expect(nextState("held", "released")).toBe("closed");
  });

  it("sends a failed re-strike back to second look, and only a closed case can be opened again", () => {
    expect(nextState("in-rework", "re-strike-failed")).toBe("held");
    expect(CASE_STATES.filter((state) => canHappen(state, "reopened"))).toEqual(["closed"]);
    expect(CASE_STATES.filter((state) => canHappen(state, "taken-back"))).toEqual(["confirmed"]);
  });
});

describe("a reference", () => {
  it("takes year and month from the shop's own clock", () => {
    const newYear = Date.UTC(2026, 11, 31, 23, 30);
    expect(yearMonth(newYear, "UTC")).toBe("2612");
    // An hour ahead of UTC in winter: there the new year has begun.
    expect(yearMonth(newYear, "Europe/Stockholm")).toBe("2701");
    expect(formatCaseRef("2607", 42)).toBe("CT-2607-0042");
    expect(formatCaseRef("2607", 12_345)).toBe("CT-2607-12345");
  });
});

describe("agreement with the second look", () => {
  const pair = (called: string | null, confirmed: string | null) => ({ called, confirmed });

  it("counts what was called against what was confirmed, and leaves out an honest can't tell", () => {
    const pairs = [pair("a", "a"), pair("a", "b"), pair("a", "b"), pair(null, "b"), pair("b", "b")];
    expect(agreementOf(pairs)).toEqual({ agreed: 2, calls: 4, worst: { called: "a", confirmed: "b", times: 2 } });
  });

  it("names no mix-up that happened only once", () => {
    expect(agreementOf([pair("a", "b")]).worst).toBeNull();
    expect(agreementOf([])).toEqual({ agreed: 0, calls: 0, worst: null });
  });
});
