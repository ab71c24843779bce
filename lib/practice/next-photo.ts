import type { Confusion } from "./confusion";

/** A photo that may be asked. */
export interface Askable {
  photoId: string;
  caseId: number;
  classSlug: string;
  /** When it comes back, UTC milliseconds; null when this person has never called it. */
  dueAt: number | null;
  /** Snapped or confirmed by this person within the last days: they know the answer. */
  isOwnRecent: boolean;
}

export interface Asking {
  /** The case and class asked last, null at the very first question. */
  last: { caseId: number; classSlug: string } | null;
  confusion: Confusion;
  /** Classes that the library names as look-alikes of a class. */
  lookAlikes: (slug: string) => readonly string[];
  /** Everything that comes back before this moment is due. UTC milliseconds. */
  dueBefore: number;
  /** A number from 0 up to 1. */
  random: () => number;
}

/** A look-alike of the class asked last comes this much more often: side by side, two classes teach more. From memory. */
const LOOK_ALIKE_BOOST = 3;
/** The same class again comes this much less often: who expects it no longer looks. From memory. */
const SAME_CLASS_BRAKE = 0.25;

/**
 * Which photo to ask next. What is due comes first, look-alikes of the last class before others, the longest due before
 * the rest. Then new photos: the class is drawn by how much this person confuses it, the photo within it at random.
 * Then, with nothing due and nothing new, what comes back soonest. Never the case that was asked last, and none that
 * the person snapped or confirmed lately, as long as there is another.
 * @returns null when there is nothing to ask
 */
export function nextPhoto(photos: readonly Askable[], asking: Asking): Askable | null {
  const others = photos.filter((photo) => photo.caseId !== asking.last?.caseId);
  const strange = others.filter((photo) => !photo.isOwnRecent);
  const pool = strange.length > 0 ? strange : others;
  // The only case there is: it may come back, but not before it is due.
  if (pool.length === 0) return firstDue(photos, asking);
  return firstDue(pool, asking) ?? drawNew(pool, asking) ?? soonest(pool);
}

function firstDue(photos: readonly Askable[], asking: Asking): Askable | null {
  const due = photos.filter((photo) => photo.dueAt !== null && photo.dueAt < asking.dueBefore);
  const place = (photo: Askable) => {
    if (!asking.last) return 1;
    if (photo.classSlug === asking.last.classSlug) return 2;
    return asking.lookAlikes(asking.last.classSlug).includes(photo.classSlug) ? 0 : 1;
  };
  return due.toSorted((a, b) => place(a) - place(b) || byDue(a, b))[0] ?? null;
}

function drawNew(photos: readonly Askable[], asking: Asking): Askable | null {
  const fresh = photos.filter((photo) => photo.dueAt === null);
  const classes = [...new Set(fresh.map((photo) => photo.classSlug))];
  const slug = drawWeighted(classes, (each) => asking.confusion.weight(each) * pace(each, asking), asking.random);
  if (slug === null) return null;
  const ofClass = fresh.filter((photo) => photo.classSlug === slug);
  return ofClass[Math.min(ofClass.length - 1, Math.floor(asking.random() * ofClass.length))] ?? null;
}

function pace(slug: string, { last, lookAlikes }: Asking): number {
  if (!last) return 1;
  if (slug === last.classSlug) return SAME_CLASS_BRAKE;
  return lookAlikes(last.classSlug).includes(slug) ? LOOK_ALIKE_BOOST : 1;
}

function drawWeighted(
  slugs: readonly string[],
  weightOf: (slug: string) => number,
  random: () => number,
): string | null {
  const total = slugs.reduce((sum, slug) => sum + weightOf(slug), 0);
  let left = random() * total;
  for (const slug of slugs) {
    left -= weightOf(slug);
    if (left < 0) return slug;
  }
  return slugs.at(-1) ?? null;
}

const byDue = (a: Askable, b: Askable) =>
  (a.dueAt ?? 0) - (b.dueAt ?? 0) || (a.photoId < b.photoId ? -1 : Number(a.photoId > b.photoId));

const soonest = (photos: readonly Askable[]) => photos.toSorted(byDue)[0] ?? null;
