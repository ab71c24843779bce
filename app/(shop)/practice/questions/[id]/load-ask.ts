import type { Db } from "@/db/open";
import type { SignedIn } from "@/db/queries/crew";
import { countCasesByClass } from "@/db/queries/library";
import { listTellableClasses } from "@/db/queries/practice-classes";

/** Classes shown at once; five and "can't tell" fill three rows of two. */
const SHOWN = 5;

/** In a shop with fewer confirmed cases, what it sees most would point at the few photos that it has. */
const CASES_TO_COUNT = 30;

/**
 * The classes on offer, in shelf order: first those that this shop sees most (the shelf's first, which most cases are,
 * while it has few), then the rest. The same for every question, so the offer gives nothing away.
 */
export function loadOffer(db: Db, { shopId }: SignedIn) {
  const classes = listTellableClasses(db, shopId).map(({ slug, title }) => ({ slug, title }));
  const counts = countCasesByClass(db, shopId);
  const cases = [...counts.values()].reduce((sum, count) => sum + count, 0);
  const seen = (each: { slug: string }) => (cases < CASES_TO_COUNT ? 0 : (counts.get(each.slug) ?? 0));
  const first = classes.toSorted((a, b) => seen(b) - seen(a)).slice(0, SHOWN);
  return {
    first: classes.filter((each) => first.includes(each)),
    rest: classes.filter((each) => !first.includes(each)),
  };
}
