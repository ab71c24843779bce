import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { casebookAddress, filtersSet, readCasebookAddress } from "@/lib/cases/casebook-address";
import { readCasebookCursor, writeCasebookCursor } from "@/lib/cases/casebook-cursor";
import { casebookSchema, FILTER_NAMES } from "@/lib/cases/casebook.schema";

describe("the casebook's address", () => {
  it("reads every filter that the ledger and the strip link with", () => {
    const { query, left } = readCasebookAddress({
      cause: "weak-activator",
      status: "closed",
      closedFrom: "2026-07-01",
      closedTo: "2026-07-31",
      station: "activate",
    });
    expect(left).toEqual([]);
    expect(filtersSet(query)).toEqual(["cause", "station", "status", "closedFrom", "closedTo"]);
  });

  it("reads an empty form as no filter, and says that the address is untidy", () => {
    const form = new FormData();
    for (const name of FILTER_NAMES) form.append(name, "");
    const fields = [...form].map(([name, value]) => [name, String(value)]);
    const { query, isTidy } = readCasebookAddress(Object.fromEntries(fields));
    expect(filtersSet(query)).toEqual([]);
    expect(isTidy).toBe(false);
  });

  it("leaves out what it cannot use and names it, and keeps the rest", () => {
    const { query, left } = readCasebookAddress({
      metal: "unobtainium",
      class: "peeling",
      by: "x",
      closedFrom: "2026-02-30",
    });
    expect(query).toEqual({ class: "peeling" });
    expect(left.sort()).toEqual(["by", "closedFrom", "metal"]);
  });

  it("turns away a period that ends before it begins", () => {
    const { query, left } = readCasebookAddress({ closedFrom: "2026-07-14", closedTo: "2026-07-01" });
    expect(left).toEqual(["closedTo"]);
    expect(query).toEqual({ closedFrom: "2026-07-14" });
  });

  it("begins at the first page when a cursor is none of ours or belongs to another list, without a word", () => {
    for (const params of [{ cursor: "zz" }, { cursor: "m24" }, { q: "smut", cursor: "o5-7" }]) {
      const { query, left } = readCasebookAddress(params);
      expect(query.cursor).toBeUndefined();
      expect(left).toEqual([]);
    }
  });

  it("takes the first of a filter that is given twice", () => {
    expect(readCasebookAddress({ class: ["peeling", "pitting"] }).query).toEqual({ class: "peeling" });
  });

  it("begins anew when a filter changes, and keeps the view", () => {
    const { query } = readCasebookAddress({ class: "peeling", metal: "brass", view: "table", cursor: "o5-7" });
    expect(casebookAddress(query, { metal: null })).toEqual({ class: "peeling", view: "table" });
    expect(casebookAddress(query, { cursor: { kind: "back", at: 5, id: 7 } }).cursor).toBe("b5-7");
  });

  it("writes an address that reads back as the same query", () => {
    const { query } = readCasebookAddress({ q: "pachy & co", by: "12", order: "oldest", status: "in-rework" });
    expect(readCasebookAddress(casebookAddress(query)).query).toEqual(query);
  });
});

describe("the casebook over HTTP", () => {
  it.each([
    [{ cursor: "zz" }, "cursor"],
    [{ status: "lost" }, "status"],
    [{ metal: "x" }, "metal"],
    [{ by: "-3" }, "by"],
    [{ customer: "1.5" }, "customer"],
    [{ closedTo: "14/07/2026" }, "closedTo"],
    [{ q: "x".repeat(201) }, "q"],
    [{ class: "a b" }, "class"],
  ])("refuses %j and names the field", (params, field) => {
    const read = casebookSchema.safeParse(params);
    expect(read.error?.issues.map((issue) => issue.path[0])).toEqual([field]);
  });
});

describe("a cursor", () => {
  it("reads back as it was written", () => {
    const place = fc.record({ kind: fc.constantFrom("on" as const, "back" as const), at: fc.nat(), id: fc.nat() });
    fc.assert(
      fc.property(place, (cursor) => {
        expect(readCasebookCursor(writeCasebookCursor(cursor))).toEqual(cursor);
      }),
    );
    expect(readCasebookCursor(writeCasebookCursor({ kind: "match", shown: 24 }))).toEqual({ kind: "match", shown: 24 });
  });

  it.each(["", "o5", "o5-7-9", "x5-7", "o-5-7", "o5-7;drop", "m", "m9999"])("%j is none", (text) =>
    expect(readCasebookCursor(text)).toBeNull(),
  );
});
