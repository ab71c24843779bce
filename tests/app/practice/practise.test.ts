import { randomUUID } from "node:crypto";
import { and, eq } from "drizzle-orm";
import { beforeEach, describe, expect, it } from "vitest";
import { reopenCase, takeBack } from "@/db/changes/close-case";
import { releaseCase } from "@/db/changes/confirm-case";
import { recordOutcome, tickStep } from "@/db/changes/do-rework";
import type { Db } from "@/db/open";
import { requireCase } from "@/db/queries/cases";
import { getAnswer } from "@/db/queries/practice-questions";
import { splitOf } from "@/db/queries/practice-split";
import { photos, practiceAnswers, practiceMemories, practiceQuestions } from "@/db/schema";
import { askQuestion, answerQuestion } from "@/lib/server/practice/practise";
import { TEST_NOW } from "@/tests/fixtures/crew-factory";
import { confirmedPhoto } from "@/tests/fixtures/practice-photos";
import { confirmFor, emptyDatabase, makeCase, makeShop, type TestShop } from "@/tests/fixtures/shop-factory";
import { stepsOf } from "@/tests/app/refusals/targets";

const DAY_MS = 86_400_000;
/** Long after the snaps, so that nobody remembers them. */
const NOW = TEST_NOW + 60 * DAY_MS;

let db: Db;
let shop: TestShop;
beforeEach(async () => {
  db = emptyDatabase();
  shop = await makeShop(db);
});

const trainee = () => shop.members.trainee;
const ask = (now = NOW, drillId?: number) => askQuestion({ db, member: trainee(), now, random: () => 0 }, { drillId });
const call = (id: string, calledClass: string | null, now = NOW, sure: 1 | 2 | 3 = 2) =>
  answerQuestion({ db, member: trainee(), now }, { id, calledClass, sure });
const photoOf = (id: string) =>
  db.select().from(practiceQuestions).where(eq(practiceQuestions.id, id)).get()?.photoId ?? "";
const conflict = expect.objectContaining({ fault: expect.objectContaining({ code: "conflict" }) as unknown });
const notFound = expect.objectContaining({ fault: expect.objectContaining({ code: "not-found" }) as unknown });

describe("what can be asked", () => {
  it("is nothing in a shop without a confirmed photo, and is said so", () => {
    makeCase(db, shop);
    expect(() => ask()).toThrow(notFound);
  });

  it("is a confirmed photo of the snap; not one that is held, on its way, or of another shop", async () => {
    const other = await makeShop(db);
    confirmedPhoto(db, other);
    const awaited = confirmedPhoto(db, shop, { classSlug: "peeling" });
    db.update(photos).set({ state: "processing" }).where(eq(photos.id, awaited.photoId)).run();
    expect(() => ask()).toThrow(notFound);
    const ready = confirmedPhoto(db, shop);
    expect(photoOf(ask().id)).toBe(ready.photoId);
  });

  it("has a random number of 128 bits that says nothing of the photo", () => {
    const { photoId } = confirmedPhoto(db, shop);
    const { id } = ask();
    expect(Buffer.from(id, "base64url")).toHaveLength(16);
    expect(photoId).not.toContain(id);
  });

  it("is the same in two tabs until it is called", () => {
    confirmedPhoto(db, shop);
    confirmedPhoto(db, shop, { classSlug: "peeling" });
    const { id } = ask();
    expect(ask(NOW + 1000).id).toBe(id);
  });

  it("is not the part that the person snapped last week, where there is another", () => {
    confirmedPhoto(db, shop, { by: trainee(), now: NOW - 7 * DAY_MS });
    const other = confirmedPhoto(db, shop, { classSlug: "peeling", now: NOW - 7 * DAY_MS });
    expect(photoOf(ask().id)).toBe(other.photoId);
  });

  it("is never the same part twice in a row, and only comes back once it is due", () => {
    confirmedPhoto(db, shop);
    call(ask().id, "peeling");
    expect(() => ask(NOW + 60_000)).toThrow(notFound);
    expect(photoOf(ask(NOW + 2 * DAY_MS).id)).not.toBe("");
  });
});

describe("a call", () => {
  it("is kept once: a second one is refused in words and the first stays", () => {
    confirmedPhoto(db, shop);
    const { id } = ask();
    call(id, "dewetting");
    expect(() => call(id, "underactivation", NOW + 1000)).toThrow(conflict);
    expect(getAnswer(db, shop.shopId, id)).toMatchObject({ called: "dewetting", confirmed: "underactivation" });
    expect(db.select().from(practiceAnswers).all()).toHaveLength(1);
  });

  it("brings a missed photo back sooner than one that was called right", () => {
    confirmedPhoto(db, shop);
    confirmedPhoto(db, shop);
    const missed = ask();
    call(missed.id, "peeling");
    const right = ask();
    call(right.id, "underactivation", NOW, 3);
    const due = (id: string) =>
      db
        .select()
        .from(practiceMemories)
        .where(eq(practiceMemories.photoId, photoOf(id)))
        .get()?.dueAt ?? 0;
    expect(due(missed.id)).toBe(NOW + DAY_MS);
    expect(due(right.id)).toBeGreaterThan(due(missed.id));
  });

  it("counts can't tell as a miss that comes back", () => {
    confirmedPhoto(db, shop);
    const { id } = ask();
    call(id, null);
    expect(db.select().from(practiceMemories).get()?.dueAt).toBe(NOW + DAY_MS);
  });

  it("is another person's business only: their questions are not there", () => {
    confirmedPhoto(db, shop);
    const { id } = ask();
    const member = shop.members.otherPlater;
    expect(() => answerQuestion({ db, member, now: NOW }, { id, calledClass: "peeling", sure: 2 })).toThrow(notFound);
  });

  it("is refused, and nothing counted, when the photo has left practice meanwhile", () => {
    const { photoId, ref } = confirmedPhoto(db, shop);
    const { id } = ask();
    takeBack(db, { shopId: shop.shopId, memberId: shop.members.senior.memberId, now: NOW }, requireCase(db, shop.shopId, ref), "wrong class"); // prettier-ignore
    expect(() => call(id, "peeling")).toThrow(conflict);
    expect(db.select().from(practiceAnswers).all()).toEqual([]);
    db.update(photos).set({ state: "refused" }).where(eq(photos.id, photoId)).run();
    expect(() => ask()).toThrow(notFound);
  });

  it("is refused for a class that has left the library", () => {
    confirmedPhoto(db, shop);
    const { id } = ask();
    expect(() => call(id, "no-such-class")).toThrow(
      expect.objectContaining({ fault: expect.objectContaining({ code: "invalid" }) as unknown }),
    );
  });
});

describe("what stands as the right answer", () => {
  const doer = () => ({ shopId: shop.shopId, memberId: shop.members.senior.memberId, now: NOW });

  it("is kept as it stood at the call, and is the newest one for calls after the case was looked at again", () => {
    const first = confirmedPhoto(db, shop);
    const { id } = ask();
    call(id, "underactivation");
    takeBack(db, doer(), requireCase(db, shop.shopId, first.ref), "it was peeling");
    confirmFor(db, shop, requireCase(db, shop.shopId, first.ref), { classSlug: "peeling" }, NOW);
    expect(getAnswer(db, shop.shopId, id)?.confirmed).toBe("underactivation");
    const again = ask(NOW + 9 * DAY_MS);
    call(again.id, "peeling", NOW + 9 * DAY_MS);
    expect(getAnswer(db, shop.shopId, again.id)).toMatchObject({ called: "peeling", confirmed: "peeling" });
  });

  it("does not change when a later round finds another fault on the new strike", () => {
    const { ref, id: caseId } = confirmedPhoto(db, shop);
    for (const stepId of stepsOf({ db, shop, by: shop.members.plater }, caseId))
      tickStep(db, doer(), requireCase(db, shop.shopId, ref), { stepId, spentMinutes: 5 });
    recordOutcome(db, doer(), requireCase(db, shop.shopId, ref), {
      ref,
      outcome: "another-fault",
      note: "burnt now",
      photoIds: [],
    });
    confirmFor(db, shop, requireCase(db, shop.shopId, ref), { classSlug: "burning" }, NOW);
    const { id } = ask();
    call(id, "underactivation");
    expect(getAnswer(db, shop.shopId, id)?.confirmed).toBe("underactivation");
  });

  it("is sound for a false alarm", () => {
    const photoId = randomUUID();
    const held = makeCase(db, shop, { photoIds: [photoId] });
    releaseCase(db, { ...doer(), asTrainee: false }, held, "only light");
    db.update(photos).set({ state: "ready" }).where(eq(photos.id, photoId)).run();
    const { id } = ask();
    call(id, "sound");
    expect(getAnswer(db, shop.shopId, id)).toMatchObject({ called: "sound", confirmed: "sound" });
  });

  it("is in doubt once a closed case is opened again: it is not asked until it is confirmed anew", () => {
    const { ref } = confirmedPhoto(db, shop, {
      confirmation: { disposition: "scrap", why: "eaten away", steps: [] },
    });
    ask();
    reopenCase(db, doer(), requireCase(db, shop.shopId, ref), "look again");
    expect(() => ask()).toThrow(notFound);
  });
});

describe("how the shop split", () => {
  it("counts each person's first call at the tank and the practice calls before, nothing after", () => {
    const { photoId, id: caseId } = confirmedPhoto(db, shop, { snap: { calledClass: "dewetting" } });
    const others = [shop.members.plater, shop.members.otherPlater].map((member) => {
      const { id } = askQuestion({ db, member, now: NOW }, { drillId: undefined });
      return answerQuestion({ db, member, now: NOW }, { id, calledClass: "peeling", sure: 2 });
    });
    expect(others).toHaveLength(2);
    const { id } = ask();
    call(id, "underactivation");
    const answerId = getAnswer(db, shop.shopId, id)?.id ?? 0;
    expect(splitOf(db, shop.shopId, { caseId, photoId, answerId })).toEqual([
      { classSlug: "peeling", atTheTank: 0, inPractice: 2 },
      { classSlug: "dewetting", atTheTank: 1, inPractice: 0 },
    ]);
    const memories = db
      .select()
      .from(practiceMemories)
      .where(and(eq(practiceMemories.shopId, shop.shopId), eq(practiceMemories.photoId, photoId)))
      .all();
    expect(memories).toHaveLength(3);
  });
});
