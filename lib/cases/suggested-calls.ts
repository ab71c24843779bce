import { SYMPTOMS, type ShelfClass, type Symptom } from "./case-words";

/**
 * The classes that a symptom speaks for, the one it speaks for most first. It only orders the picture buttons of the
 * first call; weighing evidence is another matter. From memory, after what each class looks like at the strike
 * (lib/cases/case-words.ts): copper that lifts also comes from a weak or an overdone activation, bare spots in a recess
 * also from a film that broke, and so on. Common practice knows each of these mix-ups.
 */
const ALSO: Partial<Record<Symptom, readonly ShelfClass[]>> = {
  "patchy-haze": ["dewetting"],
  "bare-islands": ["no-deposit"],
  "dark-smut": ["burning"],
  "rings-tracks": ["bleed-out"],
  "brown-rainbow": ["water-spots"],
  "burnt-edges": ["overactivation"],
  "bare-recess": ["underactivation"],
  "lifts-on-tape": ["underactivation", "overactivation"],
  "wipes-off": ["overactivation"],
  "stain-from-seam": ["water-spots"],
  "pits-lumps": ["burning"],
  "finger-rack-mark": ["dewetting"],
};

/** What most cases are: shown while nothing is ticked, and to fill up. */
const USUAL: readonly ShelfClass[] = ["dewetting", "underactivation", "overactivation", "water-spots", "oxidation"];

const MOST = 2;
const SOME = 1;

/**
 * Classes to offer for the first call, likeliest first: those that the ticked symptoms speak for, then the usual ones.
 * @param ticked symptoms as ticked; their order does not matter
 * @param known slugs of the shop's library, in its order; only these are offered
 * @param count how many to offer
 * @returns at most `count` slugs; fewer only when the library holds fewer
 * @example suggestedCalls(["lifts-on-tape", "patchy-haze"], known, 2) is ["underactivation", "peeling"]
 */
export function suggestedCalls(ticked: readonly Symptom[], known: readonly string[], count: number): string[] {
  const weight = new Map<string, number>();
  const add = (slug: string, more: number) => weight.set(slug, (weight.get(slug) ?? 0) + more);
  for (const symptom of new Set(ticked)) {
    add(SYMPTOMS[symptom].glyph, MOST);
    for (const slug of ALSO[symptom] ?? []) add(slug, SOME);
  }
  const place = (slug: string) => known.indexOf(slug);
  const spoken = [...weight.keys()].toSorted(
    (a, b) => (weight.get(b) ?? 0) - (weight.get(a) ?? 0) || place(a) - place(b),
  );
  const faults = known.filter((slug) => slug !== "sound");
  return [...new Set([...spoken, ...USUAL, ...faults])].filter((slug) => known.includes(slug)).slice(0, count);
}
