import { beforeEach, describe, expect, it } from "vitest";
import type { Db } from "@/db/open";
import { listDrillPeople, listDrillsFor } from "@/db/queries/practice-drills";
import { listPhotosOfClasses } from "@/db/queries/practice-photos";
import type { FaultError } from "@/lib/fault";
import { drillInput, type DrillInput } from "@/lib/practice/practice.schema";
import { setDrill, withdrawDrill } from "@/lib/server/practice/drills";
import { answerQuestion, askQuestion } from "@/lib/server/practice/practise";
import { TEST_NOW } from "@/tests/fixtures/crew-factory";
import { confirmedPhoto } from "@/tests/fixtures/practice-photos";
import { emptyDatabase, makeShop, type TestShop } from "@/tests/fixtures/shop-factory";

const DAY_MS = 86_400_000;
const NOW = TEST_NOW + 60 * DAY_MS;

let db: Db;
let shop: TestShop;
beforeEach(async () => {
  db = emptyDatabase();
  shop = await makeShop(db);
  for (const classSlug of ["peeling", "dewetting", "peeling", "burning"]) confirmedPhoto(db, shop, { classSlug });
});

const set = (over: Partial<DrillInput> = {}) =>
  setDrill(
    { db, member: shop.members.senior, now: NOW },
    {
      title: "Lifts on tape",
      classSlugs: ["peeling", "dewetting"],
      photoCount: 3,
      memberIds: [shop.members.trainee.memberId],
      dueDay: undefined,
      ...over,
    },
  );
const refusedField = (over: Partial<DrillInput>) => {
  try {
    set(over);
  } catch (error) {
    return Object.keys((error as FaultError).fault.fields ?? {});
  }
  return [];
};
const trainee = () => shop.members.trainee;
const ask = (drillId: number, member = trainee()) =>
  askQuestion({ db, member, now: NOW, random: () => 0 }, { drillId });
const refusal = (code: string) =>
  expect.objectContaining({ fault: expect.objectContaining({ code }) as unknown }) as unknown;

describe("a drill that a senior sets", () => {
  it("asks its photos, each once and no other class, and then says that it is done", () => {
    const { id } = set();
    const called = [1, 2, 3].map((turn) => {
      const question = ask(id);
      answerQuestion({ db, member: trainee(), now: NOW + turn }, { id: question.id, calledClass: "peeling", sure: 2 });
      return question.id;
    });
    expect(new Set(called).size).toBe(3);
    expect(() => ask(id)).toThrow(refusal("not-found"));
    expect(listDrillPeople(db, shop.shopId, id)).toEqual([
      { memberId: trainee().memberId, name: trainee().name, called: 3, right: 2 },
    ]);
  });

  it("is only for those it is set for", () => {
    const { id } = set();
    expect(() => ask(id, shop.members.otherPlater)).toThrow(refusal("not-found"));
    expect(listDrillsFor(db, shop.shopId, shop.members.otherPlater.memberId)).toEqual([]);
  });

  it("is asked no more once it is withdrawn, and is withdrawn once", () => {
    const { id } = set();
    const by = { db, member: shop.members.senior, now: NOW };
    withdrawDrill(by, id);
    expect(() => ask(id)).toThrow(refusal("not-found"));
    expect(() => withdrawDrill(by, id)).toThrow(refusal("conflict"));
  });

  it("keeps its own questions apart from one's own practice", () => {
    const { id } = set();
    const inDrill = ask(id);
    const own = askQuestion({ db, member: trainee(), now: NOW, random: () => 0 }, { drillId: undefined });
    expect(own.id).not.toBe(inDrill.id);
  });

  it("lasts until the end of its day in the shop", () => {
    const { id } = set({ dueDay: "2026-12-24" });
    const drill = listDrillsFor(db, shop.shopId, trainee().memberId).find((each) => each.id === id);
    // The test shop keeps UTC.
    expect(new Date((drill?.dueAt ?? 0) - 1).toISOString().slice(0, 10)).toBe("2026-12-24");
  });

  it("is refused by field for more photos than there are, a class or a person of nowhere, and a day that is over", async () => {
    const other = await makeShop(db);
    expect(refusedField({ photoCount: 4 })).toEqual(["photoCount"]);
    expect(refusedField({ classSlugs: ["pitting"] })).toEqual(["classSlugs"]);
    expect(refusedField({ classSlugs: ["no-such-class"] })).toEqual(["classSlugs"]);
    expect(refusedField({ memberIds: [other.members.trainee.memberId] })).toEqual(["memberIds"]);
    expect(refusedField({ dueDay: "2020-01-01" })).toEqual(["dueDay"]);
  });

  it("is of every class when none is chosen", () => {
    const { id } = set({ classSlugs: [], photoCount: 4 });
    const seen = listPhotosOfClasses(db, { shopId: shop.shopId, memberId: trainee().memberId, now: NOW }, ["burning"]);
    expect(seen).toHaveLength(1);
    for (let turn = 0; turn < 4; turn += 1) {
      const question = ask(id);
      answerQuestion({ db, member: trainee(), now: NOW + turn }, { id: question.id, calledClass: null, sure: 1 });
    }
    expect(() => ask(id)).toThrow(refusal("not-found"));
  });

  it("is sent by a form: one person and one class arrive as single values", () => {
    const form = { title: "Lifts", classSlugs: "peeling", photoCount: "2", memberIds: "7", dueDay: "2026-12-24" };
    expect(drillInput.parse(form)).toEqual({
      title: "Lifts",
      classSlugs: ["peeling"],
      photoCount: 2,
      memberIds: [7],
      dueDay: "2026-12-24",
    });
  });
});
