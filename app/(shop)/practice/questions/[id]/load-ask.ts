import type { Db } from "@/db/open";
import type { SignedIn } from "@/db/queries/crew";
import { countCasesByClass } from "@/db/queries/library";
import { listTellableClasses } from "@/db/queries/practice-classes";

/** Classes shown at once; five and "can't tell" fill three rows of two. */
const SHOWN = 5;

/**
 * The classes on offer: those that this shop sees most first, the rest in shelf order. The same for every question, so
 * the offer gives nothing away.
 */
export function loadOffer(db: Db, { shopId }: SignedIn) {
  const classes = listTellableClasses(db, shopId).map(({ slug, title }) => ({ slug, title }));
  const counts = countCasesByClass(db, shopId);
  const seen = (each: { slug: string }) => counts.get(each.slug) ?? 0;
  const first = classes.toSorted((a, b) => seen(b) - seen(a)).slice(0, SHOWN);
  return {
    first: classes.filter((each) => first.includes(each)),
    rest: classes.filter((each) => !first.includes(each)),
  };
}
