import { describe, expect, it } from "vitest";
import { readTypedRef } from "@/lib/cases/typed-ref";

// product.md, "Words": reference CT-2607-0042 (year-month, running number in the shop).
describe("a reference as people type it", () => {
  it.each(["CT-2607-0042", "ct-2607-0042", " CT 2607 42 ", "2607-42", "2607/0042", "CT26070042", "ct_2607_042"])(
    "%s means CT-2607-0042",
    (typed) => expect(readTypedRef(typed)).toEqual({ ref: "CT-2607-0042" }),
  );

  it.each(["42", "#42", "0042", "CT-42", "no. 42", "No 42"])("%s means running number 42 of some month", (typed) =>
    expect(readTypedRef(typed)).toEqual({ runningNumber: "0042" }),
  );

  it("reads a running number beyond 9999", () => {
    expect(readTypedRef("CT-2607-100001")).toEqual({ ref: "CT-2607-100001" });
  });

  it.each(["", "J-3318", "patchy", "42 shells", "CT", "-", "2607-", "CT-26-07-42"])("%j is no reference", (typed) =>
    expect(readTypedRef(typed)).toBeNull(),
  );
});
