/**
 * Turns what a shop types into the words that the library is indexed by: small letters, one spelling, word stems,
 * no filler, and misspelt words mended against the library's own vocabulary.
 */

/** Words that say nothing about a fault. 'no', 'not', 'too' stay: they do. */
const FILLER = new Set(
  "a an and any are as at be been but by can did do does for from get gets got had has have he her his how i if in into is it its just like me my of on or our out so some that the their them then there these they this those to up was we very were what when where which who why will with would you your part parts job piece pieces".split(
    " ",
  ),
);

/** One spelling where shops use two. */
const ONE_SPELLING: Record<string, string> = {
  aluminum: "aluminium",
  alum: "aluminium",
  gray: "grey",
  sulphur: "sulfur",
  sulphuric: "sulfuric",
  color: "colour",
  colors: "colours",
  colored: "coloured",
  discolored: "discoloured",
  discoloration: "discoloured",
  mold: "mould",
  smokey: "smoky",
  zamac: "zamak",
  mazak: "zamak",
  no: "not",
  non: "not",
  without: "not",
  never: "not",
  wont: "not",
  cant: "not",
  dont: "not",
  doesnt: "not",
  didnt: "not",
  isnt: "not",
  wouldnt: "not",
  amps: "current",
  volts: "voltage",
  muriatic: "hydrochloric",
  hcl: "hydrochloric",
  h2so4: "sulfuric",
  di: "deionized",
  deionised: "deionized",
  inox: "stainless",
  ss: "stainless",
};

/** The words of a text as written, one spelling each, filler left out unless there is nothing else. */
export function plainWords(text: string): string[] {
  const plain = text
    .toLowerCase()
    .normalize("NFD")
    .replace(/[\u0300-\u036f'’]/g, "")
    .split(/[^a-z0-9]+/)
    .filter((word) => word.length > 0)
    .map((word) => ONE_SPELLING[word] ?? word);
  const telling = plain.filter((word) => !FILLER.has(word));
  return telling.length > 0 ? telling : plain;
}

/**
 * The words of a text as they are indexed: `plainWords`, cut to their stems.
 * @example searchWords("It won't take on the 304 parts") // ["not", "tak", "304"]
 */
export function searchWords(text: string): string[] {
  return plainWords(text).map(stem);
}

/** Cuts the endings that shops vary: peels, peeling, peeled → peel; haze, hazy → haz. Words with digits stay whole. */
function stem(word: string): string {
  if (/\d/.test(word) || word.length < 4) return word;
  const single = word.replace(/(?<=[^s])s$/, "");
  const cut = single.replace(/(ing|ed|ish|[iy]?ness)$/, "");
  const base = cut.length > 2 && /[aeiouy]/.test(cut) ? cut : single;
  const bare = base.length > 3 ? base.replace(/(ie|e|y)$/, "") : base;
  return bare === single ? bare : bare.replace(/([bdgklmnprt])\1$/, "$1");
}

/** Every word of the library as written, with how often it stands there, and all their stems. */
export interface Vocabulary {
  words: ReadonlyMap<string, number>;
  stems: ReadonlySet<string>;
}

export function vocabularyOf(texts: Iterable<string>): Vocabulary {
  const words = new Map<string, number>();
  for (const text of texts) for (const word of plainWords(text)) words.set(word, (words.get(word) ?? 0) + 1);
  return { words, stems: new Set([...words.keys()].map(stem)) };
}

/**
 * The index words of what was typed, misspelt ones mended: a word that the library neither holds nor continues becomes
 * the two words it was run together from, or its nearest one or two. A word with nothing near is dropped unless nothing
 * else is left. Words with digits are never mended.
 */
export function mendWords(typed: string, vocabulary: Vocabulary): string[] {
  const words = plainWords(typed);
  const mended = words.flatMap((word) => (isKnown(word, vocabulary) ? [word] : mendWord(word, vocabulary)));
  return [...new Set((mended.length > 0 ? mended : words).map(stem))];
}

function isKnown(word: string, vocabulary: Vocabulary): boolean {
  if (vocabulary.words.has(word) || vocabulary.stems.has(stem(word)) || /\d/.test(word)) return true;
  for (const known of vocabulary.words.keys()) if (known.startsWith(word)) return true;
  return false;
}

function mendWord(word: string, vocabulary: Vocabulary): string[] {
  for (let at = 3; at <= word.length - 3; at += 1) {
    const halves = [word.slice(0, at), word.slice(at)];
    if (halves.every((half) => vocabulary.words.has(half))) return halves;
  }
  return nearest(word, vocabulary);
}

const MOST_MENDINGS = 2;

function nearest(word: string, vocabulary: Vocabulary): string[] {
  const found: { known: string; far: number; count: number }[] = [];
  for (const [known, count] of vocabulary.words) {
    const far = distance(word, known);
    if (far !== null) found.push({ known, far, count });
  }
  found.sort((a, b) => a.far - b.far || b.count - a.count || a.known.localeCompare(b.known));
  const best = found[0]?.far;
  return found
    .filter((near) => near.far === best)
    .slice(0, MOST_MENDINGS)
    .map((near) => near.known);
}

/** How far apart two words are, or null when too far to be the same word misspelt. */
function distance(typed: string, known: string): number | null {
  if (known.length < 3 || typed.length < 3 || /\d/.test(known)) return null;
  const allowed = typed.length < 6 ? 1 : typed.length < 10 ? 2 : 3;
  if (Math.abs(typed.length - known.length) > allowed) return null;
  const edits = editDistance(typed, known);
  if (lettersSorted(typed) === lettersSorted(known)) return 1;
  if (edits <= allowed) return typed[0] === known[0] ? edits : edits + 0.5;
  return soundOf(typed) === soundOf(known) ? 1.25 : null;
}

/** Optimal string alignment: insertions, deletions, changes and swaps of neighbours, each one edit. */
export function editDistance(from: string, to: string): number {
  let before: number[] = [];
  let above: number[] = Array.from({ length: to.length + 1 }, (_, index) => index);
  for (let i = 1; i <= from.length; i += 1) {
    const row = [i];
    for (let j = 1; j <= to.length; j += 1) {
      const change = from[i - 1] === to[j - 1] ? 0 : 1;
      let least = Math.min((above[j] ?? 0) + 1, (row[j - 1] ?? 0) + 1, (above[j - 1] ?? 0) + change);
      if (i > 1 && j > 1 && from[i - 1] === to[j - 2] && from[i - 2] === to[j - 1]) {
        least = Math.min(least, (before[j - 2] ?? 0) + 1);
      }
      row.push(least);
    }
    before = above;
    above = row;
  }
  return above[to.length] ?? 0;
}

function lettersSorted(word: string): string {
  return [...word].sort().join("");
}

/** What is left when spelling is taken away: ruff and rough, flaik and flake sound alike. */
function soundOf(word: string): string {
  return word
    .replace(/ph/g, "f")
    .replace(/ough/g, "of")
    .replace(/ck|q/g, "k")
    .replace(/c(?=[eiy])/g, "s")
    .replace(/c/g, "k")
    .replace(/z/g, "s")
    .replace(/(?!^)[aeiouywh]/g, "")
    .replace(/(.)\1+/g, "$1");
}
