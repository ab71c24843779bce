import { asc, eq } from "drizzle-orm";
import { beforeEach, describe, expect, it } from "vitest";
import { amendCase } from "@/db/changes/close-case";
import type { Db } from "@/db/open";
import { requireCase } from "@/db/queries/cases";
import { getCostFacts } from "@/db/queries/case-costs";
import type { SignedIn } from "@/db/queries/crew";
import { caseCosts, caseEvents, cases } from "@/db/schema";
import { historyWords } from "@/lib/cases/history-words";
import { chooseStripSchema } from "@/lib/cases/case.schema";
import { FaultError, type Fault } from "@/lib/fault";
import { planStrip } from "@/lib/server/cases/change-case";
import { closeSound } from "@/tests/fixtures/closed-case";
import { TEST_NOW } from "@/tests/fixtures/crew-factory";
import { emptyDatabase, makeCase, makeShop, type TestShop } from "@/tests/fixtures/shop-factory";

let db: Db;
let shop: TestShop;

beforeEach(async () => {
  db = emptyDatabase();
  shop = await makeShop(db);
});

const choose = (ref: string, method: string, member: SignedIn = shop.members.senior) =>
  planStrip({ db, member, now: TEST_NOW + 60_000 }, chooseStripSchema.parse({ ref, method }));
/** 12 brass shells with nickel and gold on them. */
const plated = () => makeCase(db, shop, { stageFound: "after-final-plate", quantity: 12 });
const row = (id: number) => db.select().from(cases).where(eq(cases.id, id)).get();
const figuresOf = (id: number) =>
  db.select().from(caseCosts).where(eq(caseCosts.caseId, id)).orderBy(asc(caseCosts.id)).all();
const eventsOf = (id: number) =>
  db.select().from(caseEvents).where(eq(caseEvents.caseId, id)).orderBy(asc(caseEvents.id)).all();

function faultOf(call: () => unknown): Fault {
  try {
    call();
  } catch (error) {
    if (error instanceof FaultError) return error.fault;
    throw error;
  }
  throw new Error("It was not refused.");
}

describe("putting a way to strip on a case", () => {
  it("prices the case by that way, and the history says so", () => {
    const { id, ref } = plated();
    const cheapest = figuresOf(id).at(-1)?.method;
    const other = cheapest === "electrolytic" ? "polish-back" : "electrolytic";
    choose(ref, other);
    expect(row(id)?.stripMethod).toBe(other);
    expect(figuresOf(id).at(-1)).toMatchObject({ method: other, meanCents: row(id)?.costCents });
    const event = eventsOf(id).at(-1);
    expect(event).toMatchObject({ event: "amended", fromState: "held", toState: "held" });
    const words = historyWords(
      { event: "amended", by: "Ines", why: "", detail: event?.detail ?? {} },
      { classTitle: (slug) => slug, causeTitle: () => null },
    );
    expect(words.lines.join()).toMatch(/was the cheapest that is safe/);
  });

  it("an empty way takes the choice away again", () => {
    const { id, ref } = plated();
    const before = figuresOf(id).at(-1);
    choose(ref, "polish-back");
    choose(ref, "");
    expect(row(id)?.stripMethod).toBeNull();
    expect(figuresOf(id).at(-1)).toMatchObject({ method: before?.method, meanCents: before?.meanCents });
  });

  it("the same way a second time adds nothing", () => {
    const { id, ref } = plated();
    choose(ref, "polish-back");
    const [figures, events] = [figuresOf(id).length, eventsOf(id).length];
    choose(ref, "polish-back");
    expect([figuresOf(id).length, eventsOf(id).length]).toEqual([figures, events]);
  });

  it("is refused where the way attacks the base metal, with the reason beside the field", () => {
    const { id, ref } = plated();
    // Cyanide nickel strip is not for brass: trade forum finishing.com/349/73.
    const fault = faultOf(() => choose(ref, "chemical"));
    expect(fault).toMatchObject({ code: "invalid", fields: { method: expect.stringMatching(/brass/) as string } });
    expect(row(id)?.stripMethod).toBeNull();
  });

  it("falls back to what is safe when the base metal turns out to be another", () => {
    const steel = makeCase(db, shop, { stageFound: "after-final-plate", baseMetal: "steel" });
    choose(steel.ref, "chemical");
    expect(figuresOf(steel.id).at(-1)?.method).toBe("chemical");
    const doer = { shopId: shop.shopId, memberId: shop.members.senior.memberId, now: TEST_NOW + 120_000 };
    amendCase(db, doer, requireCase(db, shop.shopId, steel.ref), {
      ref: steel.ref,
      quantity: 3,
      baseMetal: "brass",
      stageFound: "after-final-plate",
      note: "",
    });
    expect(getCostFacts(db, shop.shopId, steel.id)?.method).toBeNull();
    expect(figuresOf(steel.id).at(-1)?.method).not.toBe("chemical");
  });

  it("comes too late for a closed case", () => {
    const closed = closeSound(db, shop, 10);
    expect(faultOf(() => choose(closed.ref, "polish-back")).code).toBe("conflict");
  });

  it("is for those who take the second look and may see money", () => {
    const { ref } = plated();
    for (const role of ["plater", "trainee"] as const)
      expect(faultOf(() => choose(ref, "polish-back", shop.members[role])).code).toBe("refused");
    expect(choose(ref, "polish-back", shop.members.owner)).toEqual({ ref });
  });

  it("does not know another shop's case", async () => {
    const other = await makeShop(db);
    const { ref } = plated();
    // Both shops' first case has the same number: the other shop's own is what it would touch.
    const theirs = makeCase(db, other);
    expect(theirs.ref).toBe(ref);
    choose(ref, "polish-back", other.members.senior);
    expect(row(requireCase(db, shop.shopId, ref).id)?.stripMethod).toBeNull();
    expect(row(theirs.id)?.stripMethod).toBe("polish-back");
  });
});

describe("what is sent", () => {
  it("is a known way or nothing", () => {
    expect(chooseStripSchema.safeParse({ ref: "CT-2607-0001", method: "dynamite" }).success).toBe(false);
    expect(chooseStripSchema.parse({ ref: "CT-2607-0001", method: "" })).toEqual({ ref: "CT-2607-0001", method: null });
  });
});
