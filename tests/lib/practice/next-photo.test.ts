import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { confusionOf, pairRecord, type CalledPair } from "@/lib/practice/confusion";
import { nextPhoto, type Askable, type Asking } from "@/lib/practice/next-photo";

const NOW = Date.UTC(2026, 11, 1, 9);
const DAY_MS = 86_400_000;
const CLASSES = ["dewetting", "underactivation", "peeling", "sound"];

let made = 0;
const photo = (over: Partial<Askable> = {}): Askable => {
  made += 1;
  return { photoId: `p${made}`, caseId: made, classSlug: "dewetting", dueAt: null, isOwnRecent: false, ...over };
};
const asking = (over: Partial<Asking> = {}): Asking => ({
  last: null,
  confusion: confusionOf([], CLASSES),
  lookAlikes: () => [],
  dueBefore: NOW,
  random: () => 0.5,
  ...over,
});

/** Numbers that look random and are the same each time (a linear congruential generator, from memory). */
function steadyRandom(seed: number): () => number {
  let state = seed;
  return () => {
    state = (state * 1_664_525 + 1_013_904_223) % 4_294_967_296;
    return state / 4_294_967_296;
  };
}

/** How often each class is drawn in many draws. */
function drawn(photos: readonly Askable[], over: Partial<Asking>, draws = 4000): Record<string, number> {
  const random = steadyRandom(7);
  const counts: Record<string, number> = {};
  for (let draw = 0; draw < draws; draw += 1) {
    const slug = nextPhoto(photos, asking({ ...over, random }))?.classSlug ?? "none";
    counts[slug] = (counts[slug] ?? 0) + 1;
  }
  return counts;
}

describe("what is asked next", () => {
  it("is what is due before anything new, the longest due first", () => {
    const fresh = photo();
    const late = photo({ dueAt: NOW - 3 * DAY_MS });
    const later = photo({ dueAt: NOW - DAY_MS });
    const notYet = photo({ dueAt: NOW + DAY_MS });
    expect(nextPhoto([fresh, later, late, notYet], asking())).toBe(late);
    expect(nextPhoto([fresh, notYet], asking())).toBe(fresh);
  });

  it("is, with nothing due and nothing new, what comes back soonest", () => {
    const soon = photo({ dueAt: NOW + DAY_MS });
    expect(nextPhoto([photo({ dueAt: NOW + 5 * DAY_MS }), soon], asking())).toBe(soon);
    expect(nextPhoto([], asking())).toBeNull();
  });

  it("is never the case that was asked last while another can be asked", () => {
    const anyPhoto = fc.record({
      photoId: fc.uuid(),
      caseId: fc.integer({ min: 1, max: 4 }),
      classSlug: fc.constantFrom(...CLASSES),
      dueAt: fc.option(fc.integer({ min: NOW - 9 * DAY_MS, max: NOW + 9 * DAY_MS })),
      isOwnRecent: fc.boolean(),
    });
    fc.assert(
      fc.property(
        fc.array(anyPhoto, { minLength: 1 }),
        fc.double({ min: 0, max: 0.999, noNaN: true }),
        (photos, at) => {
          const last = { caseId: 1, classSlug: "dewetting" };
          const next = nextPhoto(photos, asking({ last, random: () => at }));
          if (photos.some((each) => each.caseId !== 1)) expect(next?.caseId).not.toBe(1);
          else expect(next === null || (next.dueAt ?? NOW) < NOW).toBe(true);
        },
      ),
    );
  });

  it("is not a part that the person snapped or confirmed lately, unless there is no other", () => {
    const own = photo({ isOwnRecent: true, dueAt: NOW - DAY_MS });
    const other = photo();
    expect(nextPhoto([own, other], asking())).toBe(other);
    expect(nextPhoto([own], asking())).toBe(own);
  });

  it("puts a look-alike of the last class before other due photos, and the same class last", () => {
    const same = photo({ classSlug: "dewetting", dueAt: NOW - 9 * DAY_MS });
    const other = photo({ classSlug: "sound", dueAt: NOW - 5 * DAY_MS });
    const alike = photo({ classSlug: "underactivation", dueAt: NOW - DAY_MS });
    const last = { caseId: 0, classSlug: "dewetting" };
    const lookAlikes = () => ["underactivation"];
    expect(nextPhoto([same, other, alike], asking({ last, lookAlikes }))).toBe(alike);
    expect(nextPhoto([same, other], asking({ last, lookAlikes }))).toBe(other);
  });

  it("is the same for the same photos and the same random number", () => {
    const photos = CLASSES.map((classSlug) => photo({ classSlug }));
    expect(nextPhoto(photos, asking({ random: () => 0.3 }))).toBe(nextPhoto(photos, asking({ random: () => 0.3 })));
  });
});

describe("what a person confuses", () => {
  const fresh = CLASSES.flatMap((classSlug) => [photo({ classSlug }), photo({ classSlug })]);
  const pairs = (called: string | null, confirmed: string, times: number): CalledPair[] =>
    Array.from({ length: times }, () => ({ called, confirmed }));

  it("comes more often, and what is called right less, but no class ever drops out", () => {
    const calls = [
      ...pairs("underactivation", "dewetting", 6),
      ...pairs("underactivation", "underactivation", 3),
      ...pairs("peeling", "peeling", 9),
      ...pairs("sound", "sound", 9),
    ];
    const counts = drawn(fresh, { confusion: confusionOf(calls, CLASSES) });
    expect(counts.dewetting).toBeGreaterThan(3 * (counts.peeling ?? 0));
    // Others are taken for it, so it needs practice too, though it is called right itself.
    expect(counts.underactivation).toBeGreaterThan(2 * (counts.sound ?? 0));
    for (const slug of CLASSES) expect(counts[slug]).toBeGreaterThan(20);
  });

  it("weighs all classes alike before the first call", () => {
    const { weight } = confusionOf([], CLASSES);
    expect(new Set(CLASSES.map(weight)).size).toBe(1);
  });

  // By hand: 4 classes, prior 1/4 a cell. Dewetting asked 3 times, called underactivation twice:
  // (2 + 1/4) / (3 + 1) = 0.5625. Peeling never asked: (0 + 1/4) / 1 = 0.25.
  it("starts with one call's worth spread over all classes", () => {
    const { chance } = confusionOf(
      [...pairs("underactivation", "dewetting", 2), ...pairs("dewetting", "dewetting", 1)],
      CLASSES,
    );
    expect(chance("dewetting", "underactivation")).toBeCloseTo(0.5625, 12);
    expect(chance("peeling", "sound")).toBeCloseTo(0.25, 12);
  });

  it("counts can't tell as a miss that points at no other class", () => {
    const unsure = confusionOf(pairs(null, "peeling", 5), CLASSES);
    const sure = confusionOf(pairs("peeling", "peeling", 5), CLASSES);
    expect(unsure.weight("peeling")).toBeGreaterThan(sure.weight("peeling"));
    expect(unsure.chance("peeling", "sound")).toBeLessThan(0.25);
  });

  it("is told as so many mix-ups out of all calls on the pair", () => {
    const calls = [
      ...pairs("underactivation", "dewetting", 3),
      ...pairs("dewetting", "underactivation", 2),
      ...pairs("dewetting", "dewetting", 3),
      ...pairs("peeling", "dewetting", 1),
      ...pairs("peeling", "peeling", 7),
    ];
    expect(pairRecord(calls, "dewetting", "underactivation")).toEqual({ mixed: 5, asked: 9 });
  });
});
