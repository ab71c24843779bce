/** Each class, cause and fix as the text that is searched. */
import { SYMPTOMS, type BaseMetal } from "@/lib/cases/case-words";
import type { FixStep, LibraryCause, LibraryClass, LibraryFix } from "@/lib/library/library-entry";
import { namesOfMetal, metalsNamedIn } from "@/lib/library/named-metals";
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
  /** How far it speaks for the entry (0 to 1). */
  weight: number;
}

/** One entry as it is searched. */
export interface SearchDocument {
  slug: string;
  title: string;
  kind: "class" | "cause" | "fix";
  classes: string[];
  /** The base metals that it is about; none: any. */
  baseMetals: readonly BaseMetal[];
  /** Title, shop words, and names of the metals it is about: each as said and as indexed. */
  phrases: SearchPhrase[];
  /** Names of the metals that it puts at risk besides. */
  metalPhrases: SearchPhrase[];
  /** Index words, each with how much it says about the entry (0 to 1): by where it stands. */
  words: ReadonlyMap<string, number>;
  /** Its explanations, line by line. */
  body: readonly string[];
  /** Its text as written, for the vocabulary. */
  prose: string;
}

/** What a word says about an entry by where it stands: in its name, in its explanation, or in a metal's name. */
const NAMED = 1;
const EXPLAINED = 0.5;
/** One metal at risk says nearly as much as a name; the more there are, the less each says. */
const metalWeight = (metals: number) => Math.min(0.9, 1.1 / Math.max(1, metals));

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
    metals: entry.baseMetals,
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
  texts: { also: readonly string[]; metals: readonly BaseMetal[]; body: readonly string[] },
): SearchDocument {
  const named = [title, ...texts.also];
  const about = metalsNamedIn(title);
  const metals = texts.metals.map(metalTextOf);
  const phrases = named.map((said) => asPhrase(said, NAMED));
  const words = new Map<string, number>();
  for (const metal of metals) weigh(words, metal.words, metalWeight(metals.length));
  weigh(words, texts.body.flatMap(searchWords), EXPLAINED);
  weigh(words, about.names.flatMap(searchWords), about.weight);
  for (const phrase of phrases) weigh(words, phrase.words, NAMED);
  return {
    slug,
    title,
    kind,
    classes,
    baseMetals: texts.metals,
    phrases: [...phrases, ...about.names.map((said) => asPhrase(said, about.weight))],
    metalPhrases: metals.flatMap((metal) => metal.phrases),
    words,
    body: texts.body,
    prose: [...named, ...about.names, ...metals.map((metal) => metal.prose), ...texts.body].join(" "),
  };
}

function weigh(weights: Map<string, number>, words: readonly string[], weight: number): void {
  for (const word of words) weights.set(word, Math.max(weight, weights.get(word) ?? 0));
}

interface MetalText {
  phrases: SearchPhrase[];
  words: string[];
  prose: string;
}

const metalTexts = new Map<BaseMetal, MetalText>();

/** A metal's names. Each has some twenty and stands in half of the causes: they are read once. */
function metalTextOf(metal: BaseMetal): MetalText {
  const kept = metalTexts.get(metal);
  if (kept) return kept;
  const names = namesOfMetal(metal);
  const phrases = names.map((said) => asPhrase(said, NAMED));
  const text = { phrases, words: [...new Set(phrases.flatMap(({ words }) => words))], prose: names.join(" ") };
  metalTexts.set(metal, text);
  return text;
}

function asPhrase(said: string, weight: number): SearchPhrase {
  return { said, words: [...new Set(searchWords(said))], weight };
}
