import Database from "better-sqlite3";
import { drizzle } from "drizzle-orm/better-sqlite3";
import { beforeAll, beforeEach, describe, expect, it } from "vitest";
import type { Db } from "@/db/open";
import { MOST_MATCHES, searchCases } from "@/db/queries/case-search";
import * as schema from "@/db/schema";
import type { CasebookFilter } from "@/lib/cases/casebook-filter";
import { TEST_NOW } from "../../fixtures/crew-factory";
import { confirmFor, emptyDatabase, makeCase, makeShop, type TestShop } from "../../fixtures/shop-factory";

let db: Db;
let shop: TestShop;
let other: TestShop;
/** Both shops before their first case. */
let bytes: Buffer;

beforeAll(async () => {
  const first = emptyDatabase();
  shop = await makeShop(first);
  other = await makeShop(first);
  bytes = first.$client.serialize();
});
beforeEach(() => {
  db = drizzle(new Database(bytes), { schema });
});

let minute = 0;
/** Every search a quarter of an hour after the last, so that none leans on a vocabulary that was kept. */
const later = () => TEST_NOW + (minute += 15) * 60_000;
const search = (typed: string, filter: CasebookFilter = {}, of = shop) =>
  searchCases(db, of.shopId, typed, filter, later());
const found = (typed: string, filter?: CasebookFilter) => search(typed, filter).caseIds;

describe("a trainee who cannot spell it", () => {
  it.each(["underactivation", "underactivaton", "UNDERACTIVATON", "undreactivation", "underactivatoin", "underact"])(
    "finds an underactivated part by %s",
    (typed) => {
      const { id } = makeCase(db, shop, { calledClass: "underactivation" });
      makeCase(db, shop, { calledClass: "burning", symptoms: ["burnt-edges"] });
      expect(found(typed)).toEqual([id]);
    },
  );

  it("finds smut by smutt, and says how the word was read", () => {
    const { id } = makeCase(db, shop, { note: "Black smut at the rim.", calledClass: "handling", symptoms: [] });
    makeCase(db, shop, { note: "Copper took its time coming.", calledClass: "handling", symptoms: [] });
    const { caseIds, terms } = search("smutt");
    expect(caseIds).toEqual([id]);
    expect(terms).toEqual([{ typed: "smutt", readAs: ["smut"] }]);
  });

  it("finds it with every word misspelt and in another order", () => {
    const { id } = makeCase(db, shop, { note: "Won't take near the keyway." });
    makeCase(db, shop, { note: "Comes up in one sheet." });
    expect(found("kepway won't")).toEqual([id]);
    expect(found("tkae kepway")).toEqual([id]);
  });

  it("finds it by the cause and the shop's own talk for the class", () => {
    const held = makeCase(db, shop);
    confirmFor(db, shop, held);
    // The library's synonym for underactivation, db/seed/library/classes/underactivation.ts.
    expect(found("sleepy brass")).toEqual([held.id]);
  });
});

describe("what a search leads with", () => {
  it.each(["CT-2607-0002", "ct 2607 2", "2607-2"])("%s finds exactly that case", (typed) => {
    const refs = [1, 2, 3].map(() => makeCase(db, shop, { now: Date.UTC(2026, 6, 14) }));
    expect(refs[1]?.ref).toBe("CT-2607-0002");
    expect(found(typed)).toEqual([refs[1]?.id]);
  });

  it("a bare number finds that running number of each month first, the newest in front", () => {
    const june = makeCase(db, shop, { now: Date.UTC(2026, 5, 10) });
    const july = makeCase(db, shop, { now: Date.UTC(2026, 6, 10), note: "Rack 1 of 3." });
    makeCase(db, shop, { now: Date.UTC(2026, 6, 11), note: "Also rack 1." });
    expect(found("1").slice(0, 2)).toEqual([july.id, june.id]);
  });

  it("a job number is found as it stands, never a number like it", () => {
    const { id } = makeCase(db, shop);
    expect(found("J-3318")).toEqual([id]);
    expect(found("3318")).toEqual([id]);
    expect(found("3319")).toEqual([]);
  });

  it("all of the words come before some of them", () => {
    const both = makeCase(db, shop, { note: "Blister at the seam." });
    makeCase(db, shop, { note: "Seam is clean." });
    expect(search("blister seam")).toMatchObject({ caseIds: [both.id], isLoose: false });
    const some = search("blister xylophone");
    expect(some).toMatchObject({ caseIds: [both.id], isLoose: true });
  });

  it("filters narrow what is found", () => {
    const brass = makeCase(db, shop, { note: "Blister.", baseMetal: "brass" });
    const steel = makeCase(db, shop, { note: "Blister.", baseMetal: "steel", alloy: "1018" });
    expect(found("blister").sort()).toEqual([brass.id, steel.id].sort());
    expect(found("blister", { baseMetal: "steel" })).toEqual([steel.id]);
    expect(found(brass.ref, { baseMetal: "steel" })).not.toContain(brass.id);
  });

  it("a word is found as soon as its case is in, also a misspelt one", () => {
    const first = makeCase(db, shop, { note: "Haze on the rim." });
    const now = later();
    expect(searchCases(db, shop.shopId, "haze", {}, now).caseIds).toContain(first.id);
    const second = makeCase(db, shop, { note: "Mottled by the flange." });
    const soon = now + 3_000;
    expect(searchCases(db, shop.shopId, "mottled", {}, soon).caseIds).toEqual([second.id]);
    expect(searchCases(db, shop.shopId, "motled flagne", {}, soon + 3_000).caseIds).toEqual([second.id]);
  });

  it("no more than the two hundred best are listed, and that is said", () => {
    db.transaction(() => {
      for (let index = 0; index <= MOST_MATCHES; index += 1) makeCase(db, shop, { note: "Blister." });
    });
    const { caseIds, isCapped } = search("blister");
    expect(caseIds).toHaveLength(MOST_MATCHES);
    expect(new Set(caseIds).size).toBe(MOST_MATCHES);
    expect(isCapped).toBe(true);
  });
});

describe("another shop's words", () => {
  it("are not found, not by the word, not misspelt and not by reference", () => {
    const theirs = makeCase(db, other, { note: "Zirconium hanger by the gantry." });
    makeCase(db, shop);
    for (const typed of ["zirconium", "zirconum", "gantry", "gantri"]) expect(found(typed)).toEqual([]);
    expect(search(theirs.ref, {}, other).caseIds).toEqual([theirs.id]);
    expect(found(theirs.ref)).not.toContain(theirs.id);
  });

  it("are never offered as what a misspelt word was read as", () => {
    makeCase(db, other, { note: "Zirconium hanger by the gantry." });
    makeCase(db, shop);
    const { terms } = search("zirconum gantri");
    expect(terms.flatMap((term) => term.readAs)).toEqual([]);
  });

  it("do not keep a word from being mended because only they hold it", () => {
    makeCase(db, other, { note: "Smutt all over." });
    const ours = makeCase(db, shop, { note: "Black smut at the rim.", calledClass: "handling", symptoms: [] });
    expect(found("smutt")).toEqual([ours.id]);
  });

  it("cannot be reached by naming their mark", () => {
    makeCase(db, other, { note: "Gantry." });
    makeCase(db, shop);
    for (const typed of [`s${other.shopId}`, `scope:s${other.shopId}`, `" OR scope : "s${other.shopId}`]) {
      const { caseIds } = search(typed);
      const theirs = search("gantry", {}, other).caseIds;
      expect(caseIds.filter((id) => theirs.includes(id))).toEqual([]);
    }
    expect(found(`s${shop.shopId}`)).toEqual([]);
  });
});

describe("signs that mean something to the index", () => {
  it.each([
    '"',
    '""',
    "*",
    "-",
    "(",
    ")",
    "^",
    "+",
    ":",
    "NEAR",
    "NEAR(",
    'a" OR "b',
    "notes:smut",
    "{ref",
    "AND",
    "OR OR",
    "'",
    "\\",
    "%",
    "\u0000",
    "\uD800",
  ])("%j is looked for or found nowhere, and breaks nothing", (typed) => {
    makeCase(db, shop, { note: "Black smut at the rim." });
    expect(() => search(typed)).not.toThrow();
  });

  it("do not change what the words beside them find", () => {
    const { id } = makeCase(db, shop, { note: "Blister at the flange." });
    makeCase(db, shop, { note: "Clean." });
    for (const typed of [
      '"blister"',
      "blister*",
      "-blister",
      "(blister",
      "^blister",
      "blister NEAR flange",
      'blister"',
    ])
      expect(found(typed)[0]).toBe(id);
    expect(found("NOT blister")[0]).toBe(id);
  });
});
