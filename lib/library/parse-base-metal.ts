import { BASE_METAL_TITLES, BASE_METALS, type BaseMetal } from "@/lib/cases/case-words";
import { InputError } from "@/lib/input-error";
import { ALLOY_NAMES } from "@/lib/library/alloy-names";

/** Words that stand before or behind an alloy's number and name nothing by themselves: "AISI 304", "UNS C36000". */
const BESIDE_A_NAME: ReadonlySet<string> = new Set(["aisi", "astm", "sae", "uns", "type", "grade", "alloy"]);
/** Temper of an alloy: "6061-T6", "C260 H02". It changes the strength, not the metal. */
const TEMPER = /^[tho]\d{1,4}$/;
/** The longest name has so many words. */
const MOST_WORDS = 4;

const BY_NAME: ReadonlyMap<string, BaseMetal> = namesOfAll();

/**
 * The base metal that a person typed: our own word, its title, a trade name or an alloy number, in any case, with spaces
 * or hyphens; a number beside its metal is fine. Throws `InputError` for words that name none, or two.
 *
 * Example: "C360", "leaded brass" and "Brass C360" are all `"brass"`; "zinc die cast" is `"zinc"`.
 */
export function parseBaseMetal(typed: string, field = "baseMetal"): BaseMetal {
  const named = metalsNamed(plainWords(typed));
  const [only] = named;
  if (only !== undefined && named.size === 1) return only;
  throw new InputError(field, `Use one of: ${BASE_METALS.join(", ")}; or an alloy such as C360, 304 or zamak.`);
}

/** The metals that the words name, longest names first; none when a word is left over that names nothing. */
function metalsNamed(words: readonly string[]): Set<BaseMetal> {
  const found = new Set<BaseMetal>();
  for (let from = 0; from < words.length;) {
    let length = Math.min(MOST_WORDS, words.length - from);
    let metal = BY_NAME.get(words.slice(from, from + length).join(" "));
    while (metal === undefined && length > 1) {
      length -= 1;
      metal = BY_NAME.get(words.slice(from, from + length).join(" "));
    }
    const word = words[from] ?? "";
    if (metal !== undefined) found.add(metal);
    else if (!BESIDE_A_NAME.has(word) && !TEMPER.test(word)) return new Set();
    from += length;
  }
  return found;
}

function namesOfAll(): Map<string, BaseMetal> {
  const names = new Map<string, BaseMetal>();
  for (const metal of BASE_METALS) {
    for (const name of [metal, BASE_METAL_TITLES[metal], ...ALLOY_NAMES[metal]]) {
      names.set(plainWords(name).join(" "), metal);
    }
  }
  return names;
}

function plainWords(typed: string): string[] {
  return typed
    .toLowerCase()
    .split(/[\s_,/-]+/)
    .filter((word) => word !== "");
}
