/** Which base metals a title is about, and what job cards call them, so that an alloy number finds the entry for it. */
import { ALLOY_NAMES } from "@/lib/library/alloy-names";
import { plainWords } from "@/lib/library/search-words";
import { BASE_METALS, BASE_METAL_TITLES, type BaseMetal } from "@/lib/cases/case-words";

/**
 * Families within a base metal, the narrower before the wider: who asks for C172 wants beryllium copper's entry, not every
 * copper's. Alloy numbers from memory.
 */
const FAMILIES: readonly { said: RegExp; names: readonly string[] }[] = [
  { said: /leaded/, names: ["C353", "C360", "C385", "C544", "C932", "C36000", "leaded brass", "free-cutting brass"] },
  { said: /silicon-bearing aluminium/, names: ["A356", "A360", "A380", "A413", "ADC12", "die cast aluminium"] },
  { said: /beryllium/, names: ["C172", "C17200", "C17500", "BeCu", "beryllium copper"] },
  {
    said: /(aluminium|silicon)( or silicon)? bronze/,
    names: ["C630", "C655", "C954", "aluminium bronze", "silicon bronze"],
  },
  {
    said: /high-carbon|cast iron/,
    names: ["1095", "4140", "4340", "O1", "A2", "D2", "52100", "tool steel", "grey iron", "ductile iron"],
  },
  { said: /high-strength/, names: ["4340", "300M", "spring steel", "hardened bolts", "Grade 12.9"] },
  { said: /free-machining stainless/, names: ["303", "416"] },
];

const SAID: readonly { said: RegExp; metal: BaseMetal }[] = [
  { said: /stainless/, metal: "stainless" },
  { said: /nickel silver/, metal: "nickel-silver" },
  { said: /(?<!stainless |stainless)steel/, metal: "steel" },
  { said: /\biron\b/, metal: "iron" },
  { said: /brass/, metal: "brass" },
  { said: /bronze/, metal: "bronze" },
  { said: /copper alloy|brass or copper/, metal: "copper" },
  { said: /or nickel:|old nickel/, metal: "nickel" },
  { said: /zinc die|\bzinc\b(?! or aluminium attacked)|die casting/, metal: "zinc" },
  { said: /aluminium(?! bronze)/, metal: "aluminium" },
  { said: /(?<!nickel )silver/, metal: "silver" },
  { said: /gold alloy|karat gold/, metal: "gold" },
  { said: /pewter/, metal: "pewter" },
];

/** How far a metal's name speaks for an entry (0 to 1): a family more than the whole metal, a title's head more than a mention. */
const SPEAKS = { family: { head: 1, mention: 0.9 }, metal: { head: 0.8, mention: 0.6 } } as const;

/**
 * Names of the metals that a title is about (what stands before its colon, if it has one), and how far they speak for it.
 * @example metalsNamedIn("Zinc die cast: polish, gentle acid, live entry") // { names: ["Zinc die cast", "zamak", …], weight: 0.8 }
 */
export function metalsNamedIn(title: string): { names: string[]; weight: number } {
  const place = title.includes(":") ? "head" : "mention";
  const head = (title.split(":")[0] ?? title).toLowerCase() + (title.includes(":") ? ":" : "");
  const families = FAMILIES.filter((family) => family.said.test(head));
  if (families.length > 0) return { names: families.flatMap((family) => family.names), weight: SPEAKS.family[place] };
  const metals = SAID.filter((each) => each.said.test(head)).map((each) => each.metal);
  return { names: metals.flatMap(namesOfMetal), weight: SPEAKS.metal[place] };
}

const METALS_BY_NUMBER = new Map<string, Set<BaseMetal>>();
for (const metal of BASE_METALS) {
  for (const name of ALLOY_NAMES[metal].flatMap(plainWords)) {
    if (!/\d/.test(name)) continue;
    METALS_BY_NUMBER.set(name, (METALS_BY_NUMBER.get(name) ?? new Set()).add(metal));
  }
}

/**
 * The base metals whose alloy numbers stand among these words: none where no number does.
 * @example metalsOfNumbers(["black", "c360"]) // Set { "brass" }
 */
export function metalsOfNumbers(words: readonly string[]): ReadonlySet<BaseMetal> {
  return new Set(words.flatMap((word) => [...(METALS_BY_NUMBER.get(word) ?? [])]));
}

/** A base metal's title and all that job cards call it. */
export function namesOfMetal(metal: BaseMetal): string[] {
  return [BASE_METAL_TITLES[metal], ...ALLOY_NAMES[metal]];
}
