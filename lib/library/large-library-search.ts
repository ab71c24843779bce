/** The search over a library too large to weigh every entry at each key: full text proposes, the shop's words and Fuse order. */
import Fuse, { type IFuseOptions } from "fuse.js";
import { answersAmong, byScore, toHit, type Answer, type LibrarySearch } from "@/lib/library/library-hit";
import { documentsOf, type LibraryEntries, type SearchDocument } from "@/lib/library/search-documents";
import { placeWords, vocabularyOf, type PlacedWord } from "@/lib/library/search-words";
import { buildWordIndex } from "@/lib/library/word-index";
import { askedOf } from "@/lib/library/word-match";

/** Index words of an entry: those that name it or a metal, and those of its explanations. */
export interface EntryText {
  named: string;
  explained: string;
}

/** Finds the places of the entries that hold any of these index words, the likeliest first. */
export type FindPlaces = (words: readonly string[]) => number[];

/** From this weight on a word counts as naming its entry. */
const NAMING = 0.6;

/** What Fuse has to say about the order. More, and phrases that read alike but mean another thing come up: tried on the sets in the tests. */
const FUSE_SHARE = 0.2;

const FUSE_OPTIONS: IFuseOptions<Answer> = {
  useTokenSearch: true,
  ignoreLocation: true,
  includeScore: true,
  // The words are mended already, so only close ones count.
  threshold: 0.1,
  keys: [{ name: "phrases", getFn: ({ document }) => document.phrases.map(({ words }) => words.join(" ")) }],
};

/**
 * Builds the search over a library of thousands. It reads what was typed by the same rule as `buildLibrarySearch` and answers
 * in the same shape, but what is run together of three words or more it does not take apart.
 * @param indexTexts makes the full-text index of the entries, in their order
 */
export function buildLargeLibrarySearch(
  entries: LibraryEntries,
  indexTexts: (texts: readonly EntryText[]) => FindPlaces,
): LibrarySearch {
  const documents = documentsOf(entries);
  const vocabulary = vocabularyOf(documents.map((document) => document.prose));
  const index = buildWordIndex(documents);
  const findPlaces = indexTexts(documents.map(textOf));
  return (typed) => {
    const placed = placeWords(typed, vocabulary);
    const asked = askedOf(placed, index);
    const places = findPlaces([...new Set(placed.flatMap(({ readings }) => readings.map(({ stem }) => stem)))]);
    const candidates = places.flatMap((place) => documents[place] ?? []);
    return orderAnew(answersAmong(candidates, asked, index), placed).map((each) => toHit(each, asked));
  };
}

function textOf({ words }: SearchDocument): EntryText {
  const text: Record<keyof EntryText, string[]> = { named: [], explained: [] };
  for (const [word, weight] of words) text[weight >= NAMING ? "named" : "explained"].push(word);
  return { named: text.named.join(" "), explained: text.explained.join(" ") };
}

/** Orders the answers by how alike their phrases are to the whole of what was typed, as far as Fuse has a say. None is lost. */
function orderAnew(answers: readonly Answer[], placed: readonly PlacedWord[]): Answer[] {
  if (answers.length < 2) return [...answers];
  const found = new Fuse(answers, FUSE_OPTIONS).search(placed.map(surestReading).join(" "));
  const fuseScores = new Map(found.map(({ item, score }) => [item, score ?? 1]));
  return answers
    .map((each) => ({ ...each, score: (1 - FUSE_SHARE) * each.score + FUSE_SHARE * (fuseScores.get(each) ?? 1) }))
    .sort(byScore);
}

function surestReading({ typed, readings }: PlacedWord): string {
  return readings.toSorted((one, other) => other.sureness - one.sureness)[0]?.stem ?? typed;
}
