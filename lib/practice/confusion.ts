/** A call on a practice photo beside what was confirmed. Null: "can't tell". */
export interface CalledPair {
  called: string | null;
  confirmed: string;
}

/** How likely a person is to call one class another, by class; each between 0 and 1 and never quite 0. */
export interface Confusion {
  /** Chance that a photo of `confirmed` is called `called`, for two different classes. */
  chance: (confirmed: string, called: string) => number;
  /** How much practice a class needs: it is missed, or others are mistaken for it. */
  weight: (slug: string) => number;
}

/**
 * What a person confuses, from their calls. Each class starts with one call's worth of evidence spread evenly over all
 * classes (a Dirichlet prior, worth from memory), so that a class nobody has been asked yet is neither certain nor
 * impossible to miss, and no class ever drops out of practice.
 * @param classes the classes that can be asked or called
 * @example without any calls all classes weigh the same; after four misses of peeling it weighs most
 */
export function confusionOf(pairs: readonly CalledPair[], classes: readonly string[]): Confusion {
  const share = 1 / Math.max(1, classes.length);
  const asked = new Map<string, number>();
  const called = new Map<string, number>();
  const key = (confirmed: string, as: string) => `${confirmed}|${as}`;
  for (const pair of pairs) {
    asked.set(pair.confirmed, (asked.get(pair.confirmed) ?? 0) + 1);
    if (pair.called === null) continue;
    const cell = key(pair.confirmed, pair.called);
    called.set(cell, (called.get(cell) ?? 0) + 1);
  }
  const chance = (confirmed: string, as: string) =>
    ((called.get(key(confirmed, as)) ?? 0) + share) / ((asked.get(confirmed) ?? 0) + 1);
  // "Can't tell" counts as a miss of the class without pointing at another one.
  const missed = (slug: string) => 1 - chance(slug, slug);
  const drawn = (slug: string) => classes.reduce((sum, other) => (other === slug ? sum : sum + chance(other, slug)), 0);
  return { chance, weight: (slug) => (missed(slug) + drawn(slug)) / 2 };
}

/** How a pair of classes was told apart: how often one was called the other, out of all calls on either. */
export function pairRecord(pairs: readonly CalledPair[], a: string, b: string): { mixed: number; asked: number } {
  const onEither = pairs.filter((pair) => pair.confirmed === a || pair.confirmed === b);
  const mixed = onEither.filter(
    (pair) => pair.called !== pair.confirmed && (pair.called === a || pair.called === b),
  ).length;
  return { mixed, asked: onEither.length };
}
