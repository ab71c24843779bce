/** A class as the second look offers it. */
interface ClassOnOffer {
  slug: string;
  /** Classes it is mistaken for, the commonest first. */
  lookAlikes: readonly string[];
}

interface Choosing {
  /** The library's classes in shelf order. `sound` is not among them: it has its own key. */
  classes: readonly ClassOnOffer[];
  /** What was called in this round, the newest call first. */
  called: readonly string[];
  /** Confirmed cases of each class in this shop. */
  counts: ReadonlyMap<string, number>;
  /** How many are offered at once. */
  most: number;
}

/**
 * Which classes the second look offers first, and in which order: what was called, then its look-alikes, then what this
 * shop sees most. The rest follows by how often the shop sees it. Every class is in exactly one of the two lists.
 */
export function chooseClasses({ classes, called, counts, most }: Choosing): { first: string[]; rest: string[] } {
  const bySlug = new Map(classes.map((each) => [each.slug, each]));
  const seenHere = classes.toSorted((a, b) => (counts.get(b.slug) ?? 0) - (counts.get(a.slug) ?? 0));
  const calledHere = called.filter((slug) => bySlug.has(slug));
  const lookAlikes = calledHere
    .flatMap((slug) => bySlug.get(slug)?.lookAlikes ?? [])
    .filter((slug) => bySlug.has(slug));
  const order = [...new Set([...calledHere, ...lookAlikes, ...seenHere.map((each) => each.slug)])];
  return { first: order.slice(0, most), rest: order.slice(most) };
}
