import { eq } from "drizzle-orm";
import { beforeEach, describe, expect, it } from "vitest";
import { releaseCase } from "@/db/changes/confirm-case";
import type { Db } from "@/db/open";
import type { CaseStanding } from "@/db/queries/cases";
import { countQueue, getNextInQueue, getQueuePlace, listQueue, type QueuePlace } from "@/db/queries/second-look";
import { countConfirmed, getShelf, listAlike, listExemplars } from "@/db/queries/second-look-against";
import { cases, exemplars, photos } from "@/db/schema";
import { offerForCase } from "@/lib/cases/second-look-offer";
import { TEST_NOW } from "../../fixtures/crew-factory";
import {
  confirmFor,
  emptyDatabase,
  makeCase,
  makeShop,
  stationNamed,
  type TestShop,
} from "../../fixtures/shop-factory";

let db: Db;
let shop: TestShop;

beforeEach(async () => {
  db = emptyDatabase();
  shop = await makeShop(db);
});

/** A held case with this much at risk, waiting since so many minutes. */
function waiting(atRiskCents: number, minutes: number, classSlug: string | null = "underactivation"): CaseStanding {
  const held = makeCase(db, shop, { now: TEST_NOW - minutes * 60_000, calledClass: classSlug });
  db.update(cases).set({ atRiskCents }).where(eq(cases.id, held.id)).run();
  return held;
}

function placeOf(held: CaseStanding): QueuePlace {
  const place = getQueuePlace(db, shop.shopId, held.id);
  if (!place) throw new Error("The case has no place.");
  return place;
}

const all = { stationId: null, limit: 50 };
const refs = (rows: { ref: string }[]) => rows.map((row) => row.ref);

describe("the queue for a second look", () => {
  it("puts most money at risk first, then who waits longest", () => {
    const small = waiting(7_400, 90);
    const large = waiting(41_200, 5);
    const older = waiting(7_400, 120);
    expect(refs(listQueue(db, shop.shopId, all))).toEqual([large.ref, older.ref, small.ref]);
  });

  it("shows every case once, page after page", () => {
    const made = [5, 5, 9, 1, 5].map((cents, index) => waiting(cents, index % 2));
    const seen: string[] = [];
    let after: QueuePlace | null = null;
    for (let page = 0; page < made.length; page += 1) {
      const rows = listQueue(db, shop.shopId, { stationId: null, after, limit: 2 });
      seen.push(...refs(rows));
      after = rows.at(-1) ?? null;
      if (rows.length < 2) break;
    }
    expect(seen).toEqual(refs(listQueue(db, shop.shopId, all)));
    expect(seen.toSorted()).toEqual(refs(made).toSorted());
  });

  it("leaves out what has been looked at, and other shops' cases", async () => {
    const held = waiting(100, 1);
    confirmFor(db, shop, waiting(200, 1));
    const other = await makeShop(db);
    makeCase(db, other);
    expect(refs(listQueue(db, shop.shopId, all))).toEqual([held.ref]);
  });

  it("narrows to the station that a case traces back to", () => {
    const activator = stationNamed(shop.stationIds, "activate");
    const held = waiting(100, 1, "underactivation");
    db.update(cases).set({ tracedStationId: activator }).where(eq(cases.id, held.id)).run();
    const unknown = waiting(900, 1, null);
    expect(refs(listQueue(db, shop.shopId, { ...all, stationId: activator }))).toEqual([held.ref]);
    expect(countQueue(db, shop.shopId, { stationId: activator })).toEqual({ cases: 1, parts: 3 });
    expect(countQueue(db, shop.shopId, { stationId: null })).toEqual({ cases: 2, parts: 6 });
    expect(getNextInQueue(db, shop.shopId, activator, placeOf(unknown))).toBe(held.ref);
  });

  it("knows how many stand in front of a case", () => {
    waiting(900, 1);
    waiting(800, 1);
    const third = waiting(700, 1);
    expect(countQueue(db, shop.shopId, { stationId: null, before: placeOf(third) }).cases).toBe(2);
  });

  it("can begin with the open case, for the rail on top of it", () => {
    const [, second, third] = [waiting(900, 1), waiting(800, 1), waiting(700, 1)];
    expect(refs(listQueue(db, shop.shopId, { ...all, from: placeOf(second) }))).toEqual([second.ref, third.ref]);
  });

  it("goes on to the next case, from the last one to the first, and nowhere when no other waits", () => {
    const [first, last] = [waiting(900, 1), waiting(800, 1)];
    expect(getNextInQueue(db, shop.shopId, null, placeOf(first))).toBe(last.ref);
    expect(getNextInQueue(db, shop.shopId, null, placeOf(last))).toBe(first.ref);
    confirmFor(db, shop, last);
    expect(getNextInQueue(db, shop.shopId, null, placeOf(first))).toBeNull();
  });

  it("goes on from a case that has been confirmed, to what stood behind it", () => {
    const [first, second] = [waiting(900, 1), waiting(800, 1)];
    const place = placeOf(first);
    confirmFor(db, shop, first);
    expect(getNextInQueue(db, shop.shopId, null, place)).toBe(second.ref);
  });
});

describe("what the second look may choose from", () => {
  const offerHere = () =>
    offerForCase(getShelf(db, shop.shopId), {
      baseMetal: "brass",
      quantity: 3,
      countByCause: countConfirmed(db, shop.shopId).byCause,
    });

  it("names for each class only causes that the confirmation takes", () => {
    const { classes, causes } = offerHere();
    const known = new Set(causes.map((cause) => cause.id));
    expect(classes.length).toBeGreaterThanOrEqual(12);
    for (const each of classes) for (const id of each.causeIds) expect(known.has(id)).toBe(true);
  });

  it("leaves sound out of the faults: it is a release and not a class with a cause", () => {
    expect(offerHere().classes.map((each) => each.slug)).not.toContain("sound");
  });

  it("knows every caution that a step names", () => {
    const { fixes, cautions } = offerHere();
    const named = fixes.flatMap((fix) => fix.steps.flatMap((step) => step.cautionKeys));
    expect(named.length).toBeGreaterThan(0);
    expect(named.filter((key) => cautions[key] === undefined)).toEqual([]);
  });

  it("puts the cause first that this shop has confirmed most", () => {
    const before = offerHere().classes.find((each) => each.slug === "underactivation");
    const rare = before?.causeIds.at(-1);
    if (rare === undefined) throw new Error("Underactivation has no cause on the shelf.");
    confirmFor(db, shop, waiting(1, 1), { causeId: rare });
    const after = offerHere();
    expect(after.classes.find((each) => each.slug === "underactivation")?.causeIds[0]).toBe(rare);
    expect(after.causes.find((cause) => cause.id === rare)?.countHere).toBe(1);
  });
});

describe("the shop's most alike cases", () => {
  /** A closed case: conceded, so that it needs no card. */
  function closed(overrides: Parameters<typeof makeCase>[2] = {}, classSlug = "underactivation"): CaseStanding {
    const held = makeCase(db, shop, overrides);
    return confirmFor(db, shop, held, { classSlug, disposition: "concession", why: "Good enough", steps: [] });
  }
  const of = {
    id: -1,
    baseMetal: "brass",
    classSlug: "underactivation",
    symptoms: ["patchy-haze", "lifts-on-tape"],
  } as const;

  it("are of the same base metal and class; who shares most symptoms comes first, then the newest", () => {
    const near = closed({ symptoms: ["patchy-haze", "lifts-on-tape"], now: TEST_NOW - 9_000 });
    const older = closed({ symptoms: ["patchy-haze"], now: TEST_NOW - 8_000 });
    const newer = closed({ symptoms: ["patchy-haze"], now: TEST_NOW - 7_000 });
    closed({ baseMetal: "steel" });
    closed({}, "dewetting");
    makeCase(db, shop);
    expect(refs(listAlike(db, shop.shopId, of, 4))).toEqual([near.ref, newer.ref, older.ref]);
  });

  it("go by symptoms alone where nobody could call a class", () => {
    const alike = closed({ symptoms: ["lifts-on-tape"] }, "peeling");
    closed({ symptoms: ["pits-lumps"] }, "pitting");
    expect(refs(listAlike(db, shop.shopId, { ...of, classSlug: null }, 4))).toEqual([alike.ref]);
  });

  it("never include the case itself, nor more than asked for", () => {
    const self = closed();
    for (let made = 0; made < 5; made += 1) closed();
    const rows = listAlike(db, shop.shopId, { ...of, id: self.id }, 4);
    expect(rows).toHaveLength(4);
    expect(refs(rows)).not.toContain(self.ref);
  });

  it("count a released case as sound and not as the class it was called", () => {
    const held = makeCase(db, shop);
    const doer = { shopId: shop.shopId, memberId: shop.members.senior.memberId, now: TEST_NOW, asTrainee: false };
    db.transaction((tx) => releaseCase(tx, doer, held, "Glare"));
    expect(listAlike(db, shop.shopId, of, 4)).toEqual([]);
    expect(countConfirmed(db, shop.shopId).byClass.get("sound")).toBe(1);
  });
});

describe("exemplars beside the photo", () => {
  it("are shown only once their photo is ready, and only in their own shop", async () => {
    const held = confirmFor(db, shop, makeCase(db, shop));
    const photo = db.select({ id: photos.id }).from(photos).where(eq(photos.caseId, held.id)).get();
    if (!photo) throw new Error("The case has no photo.");
    db.insert(exemplars)
      .values({
        shopId: shop.shopId,
        classSlug: "underactivation",
        photoId: photo.id,
        chosenById: shop.members.senior.memberId,
        at: TEST_NOW,
      })
      .run();
    expect(listExemplars(db, shop.shopId, ["underactivation"])).toEqual([]);
    db.update(photos).set({ state: "ready" }).where(eq(photos.id, photo.id)).run();
    expect(listExemplars(db, shop.shopId, ["underactivation"]).map((row) => row.photoId)).toEqual([photo.id]);
    expect(listExemplars(db, shop.shopId, ["dewetting"])).toEqual([]);
    const other = await makeShop(db);
    expect(listExemplars(db, other.shopId, ["underactivation"])).toEqual([]);
  });
});
