/** Search over classes, causes and fixes that knows the shop's words and forgives spelling. Pure: build once, ask often. */
import Fuse from "fuse.js";
import { ALLOY_NAMES } from "@/lib/library/alloy-names";
import { BASE_METAL_TITLES, SYMPTOMS, type BaseMetal } from "@/lib/cases/case-words";
import type { LibraryCause, LibraryClass, LibraryFix, Shelf } from "@/lib/library/library-entry";
import { mendWords, searchWords, type Vocabulary } from "@/lib/library/search-words";

export type LibraryEntries = Pick<Shelf, "classes" | "causes" | "fixes">;

export interface LibraryHit {
  slug: string;
  title: string;
  kind: "class" | "cause" | "fix";
  /** Slugs of the defect classes that the hit belongs to. */
  classes: string[];
  /** 0 is a perfect match, 1 none. Order only: not a probability. */
  score: number;
  /** The entry's own words that answered, for the screen to show: 'sleepy brass'. */
  matched: string;
}

export type LibrarySearch = (typed: string) => LibraryHit[];

/** One entry as it is searched. `names`, `also`, `metals` and `body` hold index words, not prose. */
interface SearchDocument {
  slug: string;
  title: string;
  kind: LibraryHit["kind"];
  classes: string[];
  phrases: { said: string; words: string[] }[];
  names: string;
  also: string;
  metals: string;
  body: string;
  all: string;
}

const MOST_HITS = 24;

/**
 * Builds the search over a library. The result answers what was typed with the best hits first, at most 24;
 * nothing typed gives nothing. Words may come in any order, misspelt, as slang or as an alloy name.
 * @example buildLibrarySearch(shelf)("sleepy brass")[0] // { slug: "underactivation", kind: "class", … }
 */
export function buildLibrarySearch(entries: LibraryEntries): LibrarySearch {
  const documents = documentsOf(entries);
  const vocabulary = vocabularyOf(documents);
  const fuse = new Fuse(documents, {
    useTokenSearch: true,
    ignoreLocation: true,
    threshold: 0.35,
    includeMatches: true,
    includeScore: true,
    ignoreFieldNorm: true,
    keys: [
      { name: "names", weight: 3 },
      { name: "also", weight: 4 },
      { name: "metals", weight: 1 },
      { name: "body", weight: 1 },
      { name: "all", weight: 3 },
    ],
  });
  return (typed) => {
    const words = mendWords(searchWords(typed), vocabulary);
    if (words.length === 0) return [];
    return fuse.search(words.join(" "), { limit: MOST_HITS }).map(({ item, score }) => ({
      slug: item.slug,
      title: item.title,
      kind: item.kind,
      classes: item.classes,
      score: score ?? 1,
      matched: saidBest(item, words),
    }));
  };
}

function documentsOf({ classes, causes, fixes }: LibraryEntries): SearchDocument[] {
  const causeOf = new Map(causes.map((cause) => [cause.slug, cause]));
  return [
    ...classes.map(classDocument),
    ...causes.map((cause) => causeDocument(cause, classes)),
    ...fixes.map((fix) => fixDocument(fix, fix.causeSlugs.flatMap((slug) => causeOf.get(slug) ?? []))),
  ];
}

function classDocument(entry: LibraryClass): SearchDocument {
  const symptoms = Object.values(SYMPTOMS).flatMap((symptom) => (symptom.glyph === entry.slug ? [symptom.words] : []));
  return documentOf(entry.slug, entry.title, "class", [entry.slug], {
    also: [...entry.synonyms, ...symptoms],
    metals: [],
    body: [entry.short, entry.atStrike, entry.inFinalPlate],
  });
}

function causeDocument(entry: LibraryCause, classes: readonly LibraryClass[]): SearchDocument {
  const titles = classes.flatMap((owner) => (entry.classSlugs.includes(owner.slug) ? [owner.title] : []));
  return documentOf(entry.slug, entry.title, "cause", entry.classSlugs, {
    also: entry.synonyms,
    metals: entry.baseMetals.flatMap(namesOfMetal),
    body: [entry.why, entry.proof, ...titles],
  });
}

function fixDocument(entry: LibraryFix, causes: readonly LibraryCause[]): SearchDocument {
  return documentOf(entry.slug, entry.title, "fix", [...new Set(causes.flatMap((cause) => cause.classSlugs))], {
    also: entry.materials,
    metals: [],
    body: [...entry.steps.map((step) => step.title), ...causes.map((cause) => cause.title)],
  });
}

function documentOf(
  slug: string,
  title: string,
  kind: LibraryHit["kind"],
  classes: string[],
  texts: { also: readonly string[]; metals: readonly string[]; body: readonly string[] },
): SearchDocument {
  const index = (lines: readonly string[]) => lines.flatMap(searchWords).join(" ");
  const names = index([title]);
  const also = index(texts.also);
  const metals = index(texts.metals);
  const body = index(texts.body);
  const phrases = [title, ...texts.also, ...texts.metals].map((said) => ({ said, words: searchWords(said) }));
  return { slug, title, kind, classes, phrases, names, also, metals, body, all: [names, also, metals, body].join(" ") };
}

function namesOfMetal(metal: BaseMetal): string[] {
  return [BASE_METAL_TITLES[metal], ...ALLOY_NAMES[metal]];
}

function vocabularyOf(documents: readonly SearchDocument[]): Vocabulary {
  const counts = new Map<string, number>();
  for (const document of documents) {
    for (const word of new Set(document.all.split(" "))) counts.set(word, (counts.get(word) ?? 0) + 1);
  }
  return counts;
}

/** The phrase of the entry that shares most words with what was typed; its title when only its prose answered. */
function saidBest(document: SearchDocument, words: readonly string[]): string {
  let best = { said: document.title, shared: 0 };
  for (const phrase of document.phrases) {
    const hits = words.filter((word) => phrase.words.some((own) => own.startsWith(word))).length;
    const shared = hits - phrase.words.length / 100;
    if (hits > 0 && shared > best.shared) best = { said: phrase.said, shared };
  }
  return best.said;
}
