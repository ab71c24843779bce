/**
 * What a shop would type, and the class (and, where the words name it, the cause) that should come up.
 * Written before the search was tuned. `plain`: spelt as in a book. `slang`: shop talk. `typo`: misspelt.
 */
export interface SearchPhrase {
  typed: string;
  kind: "plain" | "slang" | "typo";
  finds: { class: string } | { cause: string };
}

const plain = (typed: string, finds: SearchPhrase["finds"]): SearchPhrase => ({ typed, kind: "plain", finds });
const slang = (typed: string, finds: SearchPhrase["finds"]): SearchPhrase => ({ typed, kind: "slang", finds });
const typo = (typed: string, finds: SearchPhrase["finds"]): SearchPhrase => ({ typed, kind: "typo", finds });

export const SEARCH_PHRASES: SearchPhrase[] = [
  // dewetting
  plain("bare islands", { class: "dewetting" }),
  plain("water break on the part", { class: "dewetting" }),
  plain("oil film on the rinse tank", { class: "dewetting" }),
  plain("buffing compound in the letters", { cause: "buffing-compound-left" }),
  slang("fish eyes", { class: "dewetting" }),
  slang("beads up like a waxed car", { class: "dewetting" }),
  slang("greasy spots no copper", { class: "dewetting" }),
  typo("dewettting", { class: "dewetting" }),
  typo("silicon spray mold relese", { cause: "silicone-or-lacquer" }),
  typo("bear ilands", { class: "dewetting" }),
  // underactivation
  plain("patchy haze", { class: "underactivation" }),
  plain("activator too old", { cause: "activator-spent" }),
  plain("not long enough in the acid", { cause: "activator-dwell-short" }),
  plain("wrong activator for stainless", { cause: "activator-wrong" }),
  slang("won't take", { class: "underactivation" }),
  slang("sleepy brass", { class: "underactivation" }),
  slang("tired acid", { cause: "activator-spent" }),
  slang("cloudy strike on the bracket", { class: "underactivation" }),
  typo("didnt tak on 304", { class: "underactivation" }),
  typo("pachy hazey coper", { class: "underactivation" }),
  typo("under activaton", { class: "underactivation" }),
  // overactivation
  plain("dark smut under the copper", { class: "overactivation" }),
  plain("left too long in the activator", { cause: "activator-dwell-long" }),
  plain("C360 black after the dip", { class: "overactivation" }),
  plain("carbon smut on cast iron", { cause: "carbon-smut" }),
  slang("smoky", { class: "overactivation" }),
  slang("sooty wipe on white rag", { class: "overactivation" }),
  slang("over pickled", { class: "overactivation" }),
  typo("blak smutt", { class: "overactivation" }),
  typo("leded brass turns gray in sulfric", { cause: "leaded-alloy-smut" }),
  typo("overactivasion 4140", { class: "overactivation" }),
  // water spots
  plain("rings where drops dried", { class: "water-spots" }),
  plain("hard water", { cause: "rinse-water-hard" }),
  plain("drying slowly after rinse leaves tear tracks", { class: "water-spots" }),
  plain("dirty rinse", { cause: "rinse-dirty" }),
  slang("tear drops", { class: "water-spots" }),
  slang("runs and drip marks", { class: "water-spots" }),
  slang("coffee rings", { class: "water-spots" }),
  typo("watter spotts", { class: "water-spots" }),
  typo("tare traks", { class: "water-spots" }),
  typo("hrad water rign", { class: "water-spots" }),
  // oxidation
  plain("brown copper after waiting", { class: "oxidation" }),
  plain("flash rust on steel", { cause: "flash-rust" }),
  plain("iridescent stain", { class: "oxidation" }),
  plain("left overnight before nickel", { cause: "strike-left-standing" }),
  slang("rainbow", { class: "oxidation" }),
  slang("went purple", { class: "oxidation" }),
  slang("tarnished on the rack", { class: "oxidation" }),
  typo("oxydation", { class: "oxidation" }),
  typo("irridescant brwon", { class: "oxidation" }),
  typo("rsut bloom", { class: "oxidation" }),
  // the others
  plain("burnt edges", { class: "burning" }),
  plain("voltage too high", { cause: "strike-voltage-high" }),
  slang("crispy corners", { class: "burning" }),
  typo("brunt powdery edgs", { class: "burning" }),
  plain("bare in a recess", { class: "no-deposit" }),
  slang("skip plate in the blind hole", { class: "no-deposit" }),
  typo("no copper at contct point", { class: "no-deposit" }),
  plain("lifts on the tape", { class: "peeling" }),
  plain("blisters on zamak", { class: "peeling" }),
  slang("flakes off like foil", { class: "peeling" }),
  typo("peelling on alumnium", { class: "peeling" }),
  plain("copper wipes off with a thumb", { class: "immersion-deposit" }),
  slang("rubs off before power was on", { class: "immersion-deposit" }),
  typo("imersion depositt", { class: "immersion-deposit" }),
  plain("stain from a seam", { class: "bleed-out" }),
  slang("weeping casting", { class: "bleed-out" }),
  typo("spoting out next day", { class: "bleed-out" }),
  plain("pits and lumps", { class: "pitting" }),
  slang("feels like sandpaper", { class: "pitting" }),
  typo("nodulles ruff deposit", { class: "pitting" }),
  plain("fingerprints", { class: "handling" }),
  slang("thumb print", { class: "handling" }),
  typo("rack mrak", { class: "handling" }),
  typo("glov smuge", { class: "handling" }),
  plain("no fault", { class: "sound" }),
  slang("good copper", { class: "sound" }),
];
