/** Each class, cause and fix as the text that is searched. */
import { ALLOY_NAMES } from "@/lib/library/alloy-names";
import { BASE_METAL_TITLES, SYMPTOMS, type BaseMetal } from "@/lib/cases/case-words";
import type { FixStep, LibraryCause, LibraryClass, LibraryFix } from "@/lib/library/library-entry";
import { searchWords } from "@/lib/library/search-words";

export type SearchedClass = Pick<LibraryClass, "slug" | "title" | "short" | "atStrike" | "inFinalPlate" | "synonyms">;
export type SearchedCause = Pick<
  LibraryCause,
  "slug" | "title" | "classSlugs" | "why" | "proof" | "baseMetals" | "synonyms"
>;
export type SearchedFix = Pick<LibraryFix, "slug" | "title" | "causeSlugs" | "materials"> & {
  steps: readonly Pick<FixStep, "title">[];
};

/** What of a library is searched, and all of it that the search needs. A whole shelf fits. */
export interface LibraryEntries {
  classes: readonly SearchedClass[];
  causes: readonly SearchedCause[];
  fixes: readonly SearchedFix[];
}

export interface SearchPhrase {
  said: string;
  words: string[];
}

/** One entry as it is searched. `names`, `also`, `metals` and `all` hold index words, not prose. */
export interface SearchDocument {
  slug: string;
  title: string;
  kind: "class" | "cause" | "fix";
  classes: string[];
  /** Title and shop words, each as said and as indexed; then the names of the metals. */
  phrases: SearchPhrase[];
  metalPhrases: SearchPhrase[];
  names: string;
  also: string;
  metals: string;
  /** Names, other words and body text in one, so that words spread over the entry still count together. */
  all: string;
  /** Its text as written, for the vocabulary. */
  prose: string;
}

/**
 * Words are marked where they begin and end, since Fuse looks for letters anywhere: 'stain' would answer for
 * 'stainless' and 'rust' for 'crust'. A word still being typed gets the first mark only.
 */
export const markBegun = (word: string) => `_${word}`;
export const markWhole = (word: string) => `_${word}_`;

/** One document an entry: classes first, then causes, then fixes, each in shelf order. */
export function documentsOf({ classes, causes, fixes }: LibraryEntries): SearchDocument[] {
  const causeOf = new Map(causes.map((cause) => [cause.slug, cause]));
  return [
    ...classes.map(classDocument),
    ...causes.map((cause) => causeDocument(cause, classes)),
    ...fixes.map((fix) =>
      fixDocument(
        fix,
        fix.causeSlugs.flatMap((slug) => causeOf.get(slug) ?? []),
      ),
    ),
  ];
}

function classDocument(entry: SearchedClass): SearchDocument {
  const symptoms = Object.values(SYMPTOMS).flatMap((symptom) => (symptom.glyph === entry.slug ? [symptom.words] : []));
  return documentOf(entry.slug, entry.title, "class", [entry.slug], {
    also: [...entry.synonyms, ...symptoms],
    metals: [],
    body: [entry.short, entry.atStrike, entry.inFinalPlate],
  });
}

function causeDocument(entry: SearchedCause, classes: readonly SearchedClass[]): SearchDocument {
  const titles = classes.flatMap((owner) => (entry.classSlugs.includes(owner.slug) ? [owner.title] : []));
  return documentOf(entry.slug, entry.title, "cause", entry.classSlugs, {
    also: entry.synonyms,
    metals: entry.baseMetals.flatMap(namesOfMetal),
    body: [entry.why, entry.proof, ...titles],
  });
}

function fixDocument(entry: SearchedFix, causes: readonly SearchedCause[]): SearchDocument {
  return documentOf(entry.slug, entry.title, "fix", [...new Set(causes.flatMap((cause) => cause.classSlugs))], {
    also: entry.materials,
    metals: [],
    body: [...entry.steps.map((step) => step.title), ...causes.map((cause) => cause.title)],
  });
}

function documentOf(
  slug: string,
  title: string,
  kind: SearchDocument["kind"],
  classes: string[],
  texts: { also: readonly string[]; metals: readonly string[]; body: readonly string[] },
): SearchDocument {
  const index = (lines: readonly string[]) => lines.flatMap(searchWords).map(markWhole).join(" ");
  const names = index([title]);
  const also = index(texts.also);
  const metals = index(texts.metals);
  const asPhrases = (lines: readonly string[]) => lines.map((said) => ({ said, words: searchWords(said) }));
  const all = [names, also, index(texts.body)].join(" ");
  const prose = [title, ...texts.also, ...texts.metals, ...texts.body].join(" ");
  return {
    slug,
    title,
    kind,
    classes,
    phrases: asPhrases([title, ...texts.also]),
    metalPhrases: asPhrases(texts.metals),
    names,
    also,
    metals,
    all,
    prose,
  };
}

function namesOfMetal(metal: BaseMetal): string[] {
  return [BASE_METAL_TITLES[metal], ...ALLOY_NAMES[metal]];
}
