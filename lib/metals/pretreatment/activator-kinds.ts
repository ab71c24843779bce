/** Kinds of activator, and on which base metals each one does its work or harm. The one place that says so,
 * and long because it is one table. */
import type { BaseMetal } from "@/lib/cases/case-words";
import { COMMON, MEMORY } from "./sources";

export const ACTIVATOR_SLUGS = [
  "dilute-sulfuric",
  "dilute-hydrochloric",
  "trace-sulfuric",
  "acid-salt",
  "acid-salt-fluoride",
  "fluoboric",
  "cyanide-dip",
  "cathodic-acid",
  "anodic-acid",
  "chloride-nickel-strike",
  "nitric-desmut",
  "fluoride-desmut",
  "zincate",
] as const;
export type ActivatorSlug = (typeof ACTIVATOR_SLUGS)[number];

export interface ActivatorRule {
  verdict: "suits" | "unsuitable";
  why: string;
  source: string;
}

export interface ActivatorKind {
  slug: ActivatorSlug;
  name: string;
  /** What is in it, how strong, how long. */
  words: string;
  /** What it is for. */
  purpose: string;
  source: string;
  on: Partial<Record<BaseMetal, ActivatorRule>>;
}

const suits = (why: string, source = COMMON): ActivatorRule => ({ verdict: "suits", why, source });
const unsuitable = (why: string, source = COMMON): ActivatorRule => ({ verdict: "unsuitable", why, source });

const BOTH = `${COMMON}, ${MEMORY}`;
const SURFACE = "Guidebook, surface preparation";

export const ACTIVATORS: readonly ActivatorKind[] = [
  {
    slug: "dilute-sulfuric",
    name: "Dilute sulfuric dip",
    words: "Sulfuric acid 5 to 10 % by volume, room temperature, 15 to 60 s.",
    purpose: "Takes the thin oxide and the alkaline film that the cleaner left.",
    source: BOTH,
    on: {
      steel: suits("Enough for clean low-carbon steel; no chloride to rust it in the walk."),
      iron: suits("Weak and short only, 3 to 5 %; long acid raises graphite smut.", BOTH),
      brass: suits("Takes thin oxide without much zinc. Not enough for lead smut.", "ASTM B281; times from memory"),
      bronze: suits("Enough for tin and phosphor bronze. Not for aluminium bronze.", "ASTM B281; times from memory"),
      copper: suits("Takes oxide, leaves copper.", "ASTM B281; times from memory"),
      "nickel-silver": suits("At 10 %; go at once, it re-forms its film.", BOTH),
      silver: suits("Takes copper oxide and the alkaline film, leaves silver.", SURFACE),
      gold: suits("Takes copper and silver oxide of the alloy, leaves gold."),
      nickel: unsuitable("Too weak alone: nickel stays passive. Run it cathodic, or use the chloride nickel strike."),
      stainless: unsuitable("Does not break the chromium oxide film.", "ASTM B254; from memory"),
      zinc: unsuitable("At 5 to 10 % it eats the dense skin and opens the pores below.", "ASTM B252; from memory"),
      aluminium: unsuitable("Leaves the oxide and the smut. Only zincate holds a strike."),
      pewter: unsuitable("Lead in old pewter forms insoluble lead sulfate under the copper.", BOTH),
    },
  },
  {
    slug: "dilute-hydrochloric",
    name: "Dilute hydrochloric dip",
    words: "Hydrochloric acid 10 to 50 % by volume, room temperature, 15 to 120 s.",
    purpose: "Takes rust and scale off steel, and wakes nickel for a moment.",
    source: BOTH,
    on: {
      steel: suits(
        "Takes rust and light scale. Inhibited for anything long. Never on high-strength steel.",
        "ASTM B183; strength and times from memory",
      ),
      iron: suits("10 to 20 %, seconds: it raises graphite and stays in pores.", BOTH),
      nickel: suits("20 to 50 %, 30 to 60 s, then the nickel strike still wet.", BOTH),
      stainless: suits(
        "Only as the dip before the chloride nickel strike, never straight to copper.",
        "ASTM B254; from memory",
      ),
      brass: unsuitable("Takes zinc before copper, so the face turns red. Salted lead stays.", BOTH),
      zinc: unsuitable("Attacks in seconds: black smut, blisters later.", "ASTM B252; from memory"),
      aluminium: unsuitable("Pits it, and leaves copper and silicon smut."),
      silver: unsuitable("Leaves a film of silver chloride under the copper."),
      pewter: unsuitable("Etches tin and leaves lead chloride on old pewter.", BOTH),
      gold: unsuitable("Low carats leave silver chloride; solder seams go first.", BOTH),
    },
  },
  {
    slug: "trace-sulfuric",
    name: "Very dilute sulfuric dip",
    words: "Sulfuric acid 0.25 to 1 % by volume, 10 to 30 s, out at the first even gas.",
    purpose: "Neutralises and just wakes a metal that acid eats.",
    source: "ASTM B252; strength and times from memory",
    on: {
      zinc: suits(
        "Enough to take oxide and alkali. Out at the first even gas.",
        "ASTM B252; strength and times from memory",
      ),
      pewter: suits("Lead-free pewter only, a few seconds, to neutralise.", MEMORY),
      steel: unsuitable("Too weak to take rust or to wake the steel.", BOTH),
      stainless: unsuitable("Does nothing to the chromium oxide film."),
      nickel: unsuitable("Does nothing to passive nickel."),
      aluminium: unsuitable("Leaves the oxide. Only zincate holds a strike."),
    },
  },
  {
    slug: "acid-salt",
    name: "Acid salt without fluoride",
    words: "Dry acid salt (sodium bisulfate) 30 to 120 g/L, room temperature, 15 to 60 s.",
    purpose: "A milder stand-in for sulfuric; easier to weigh and carry.",
    source: BOTH,
    on: {
      steel: suits("Clean low-carbon steel after the electroclean."),
      brass: suits("As sulfuric; slower on zinc.", BOTH),
      bronze: suits("Tin and phosphor bronze.", BOTH),
      copper: suits("Takes thin oxide."),
      zinc: suits("At 5 to 15 g/L, seconds, out at the first even gas.", MEMORY),
      stainless: unsuitable("Without fluoride or chloride it leaves the film."),
      nickel: unsuitable("Leaves nickel passive."),
      aluminium: unsuitable("Leaves the oxide. Only zincate holds a strike."),
    },
  },
  {
    slug: "acid-salt-fluoride",
    name: "Acid salt with fluoride",
    words: "Dry acid salt with ammonium bifluoride, 30 to 120 g/L, 10 to 60 s. Fluoride: trained people only.",
    purpose: "Takes silica, lead smut and tough oxides that plain acid leaves.",
    source: BOTH,
    on: {
      brass: suits(
        "Leaded brass: takes lead smut that sulfuric only sets.",
        "trade column, leaded brass; strength from memory",
      ),
      bronze: suits("Aluminium bronze and leaded bronze: takes the alumina and the lead.", BOTH),
      "nickel-silver": suits("Leaded grades, seconds.", BOTH),
      iron: suits("Takes sand and silica skin that other acids leave.", "ASTM B320"),
      steel: suits("Takes silicate dried on from the cleaner. Seconds; rinse well.", BOTH),
      pewter: suits("Takes lead smut, but fluoboric is the milder way.", MEMORY),
      zinc: unsuitable("Attacks fast and leaves smut.", BOTH),
      nickel: unsuitable("Alone it leaves nickel passive; it works as a cathodic bath.", SURFACE),
    },
  },
  {
    slug: "fluoboric",
    name: "Fluoboric acid dip",
    words: "Fluoboric acid 10 to 30 % by volume, room temperature, at most 2 min. A fluoride: trained people only.",
    purpose: "Dissolves lead and tin salts, where sulfuric and hydrochloric make insoluble ones.",
    source: "trade column, leaded brass",
    on: {
      brass: suits("Leaded brass such as C360: takes smeared lead, leaves the brass.", "trade column, leaded brass"),
      bronze: suits("Leaded bronze.", BOTH),
      "nickel-silver": suits("Leaded grades.", BOTH),
      pewter: suits("5 to 10 %, seconds: wakes tin and takes lead.", BOTH),
      aluminium: unsuitable("Eats it and leaves smut. Its route is desmut and zincate.", BOTH),
      zinc: unsuitable("Too strong a bite on the skin.", BOTH),
      stainless: unsuitable("Leaves the film; use the chloride nickel strike.", BOTH),
    },
  },
  {
    slug: "cyanide-dip",
    name: "Cyanide dip",
    words:
      "Sodium cyanide 30 to 60 g/L, alkaline, room temperature, 10 to 60 s. Cyanide: trained people only, never near acid.",
    purpose: "Takes tarnish and neutralises before a cyanide strike, with no acid near it.",
    source: BOTH,
    on: {
      copper: suits("Takes tarnish; the strike may follow with one rinse."),
      brass: suits("Takes tarnish; does not smut.", BOTH),
      bronze: suits("Takes tarnish of tin bronze.", BOTH),
      silver: suits("Takes light tarnish. Short: it slowly dissolves silver."),
      gold: suits("Short and still. Aerated or anodic, it dissolves gold.", BOTH),
      stainless: unsuitable("Does nothing to its film."),
      aluminium: unsuitable("Alkali eats it and leaves it bare of zincate."),
      steel: unsuitable("Takes no rust or scale; only neutralises.", BOTH),
      nickel: unsuitable("By immersion it leaves nickel passive.", BOTH),
    },
  },
  {
    slug: "cathodic-acid",
    name: "Cathodic activation in acid",
    words: "Sulfuric acid 5 to 20 % by volume, part cathodic, 1 to 3 min.",
    purpose: "Hydrogen reduces the film. The bath must be free of copper, which would plate out loose.",
    source: BOTH,
    on: {
      nickel: suits("The usual wake-up for nickel plate that has dried.", "ASTM B343; figures from memory"),
      stainless: suits("Before the chloride nickel strike, not in its place.", "ASTM B254; from memory"),
      "nickel-silver": suits("Where the dip alone gives haze.", BOTH),
      steel: unsuitable("Puts hydrogen in and plates out smut; anodic cleaning is better.", "ASTM B242; from memory"),
      iron: unsuitable("Hydrogen in the pores comes out later as blisters.", BOTH),
      zinc: unsuitable("Acid at the casting's pores. Not for die cast.", BOTH),
      aluminium: unsuitable("The oxide re-forms before the strike."),
    },
  },
  {
    slug: "anodic-acid",
    name: "Anodic etch in sulfuric",
    words: "Sulfuric acid 25 % by volume, part anodic at 1.6 to 2.7 A/dm², 1 to 3 min (nickel).",
    purpose: "Etches off the passive face, smut and smeared metal.",
    source: SURFACE,
    on: {
      nickel: suits("Then cathodic in the chloride nickel strike, at once.", SURFACE),
      steel: suits(
        "Hardened steel: no hydrogen from it, and it lifts smut. By an engineer's card only.",
        "ASTM B242; from memory",
      ),
      stainless: suits("Heavy film or reworked parts, then the chloride nickel strike at once.", BOTH),
      brass: unsuitable("Roughens and takes zinc.", BOTH),
      copper: unsuitable("Dissolves it.", BOTH),
      bronze: unsuitable("Dissolves it.", BOTH),
      zinc: unsuitable("Dissolves the casting.", BOTH),
      aluminium: unsuitable("Anodises it: the very film you want gone."),
      silver: unsuitable("Dissolves and darkens it.", BOTH),
    },
  },
  {
    slug: "chloride-nickel-strike",
    name: "Chloride nickel strike (Woods kind)",
    words: "Nickel chloride 225 to 240 g/L, hydrochloric acid 110 to 125 mL/L, 21 to 32 °C, 30 s to 3 min.",
    purpose: "Strips the film and plates nickel in the same tank, so nothing can re-form.",
    source: "trade columns, Woods",
    on: {
      stainless: suits(
        "The one that holds on 300-series. Copper follows still wet.",
        "ASTM B254; trade columns, Woods",
      ),
      nickel: suits("Passive or dried nickel plate, and nickel alloys.", SURFACE),
      "nickel-silver": suits("Where copper straight on gives haze.", BOTH),
      bronze: suits("Aluminium and silicon bronze, after the fluoride dip.", MEMORY),
      steel: suits("Alloyed or hardened grades that will not wake; an engineer decides for high-strength steel.", BOTH),
      zinc: unsuitable("The acid eats the casting; nickel drops out loose.", COMMON),
      aluminium: unsuitable("The acid strips zincate and pits what is under it."),
      pewter: unsuitable("The acid etches tin.", BOTH),
      silver: unsuitable("Chloride leaves a film on silver.", BOTH),
    },
  },
  {
    slug: "nitric-desmut",
    name: "Nitric desmut",
    words: "Nitric acid 50 to 100 % by volume, or 15 to 25 % with sulfuric 10 to 20 %. Nitric: trained people only.",
    purpose: "Takes etch smut, copper and old zincate off aluminium and leaves the aluminium.",
    source: "Guidebook, aluminium",
    on: {
      aluminium: suits("After the etch, and between the two zincates.", "Guidebook, aluminium"),
      steel: unsuitable("Dissolves it with brown fume at this strength."),
      iron: unsuitable("Dissolves it with brown fume."),
      brass: unsuitable("Dissolves it with brown fume."),
      bronze: unsuitable("Dissolves copper; leaves white tin oxide.", BOTH),
      copper: unsuitable("Dissolves it with brown fume."),
      "nickel-silver": unsuitable("Dissolves it with brown fume."),
      zinc: unsuitable("Dissolves the casting."),
      silver: unsuitable("Dissolves it."),
      pewter: unsuitable("Turns tin to white oxide.", BOTH),
      nickel: unsuitable("Strong nitric makes nickel passive; weak dissolves it.", BOTH),
      stainless: unsuitable("This is how stainless is made passive."),
      gold: unsuitable("Takes silver and copper out of low carats.", BOTH),
    },
  },
  {
    slug: "fluoride-desmut",
    name: "Fluoride desmut",
    words:
      "Nitric acid 50 %, sulfuric 20 to 25 % by volume, ammonium bifluoride 120 to 240 g/L. Nitric and fluoride: trained people only.",
    purpose: "Takes the silicon that nitric alone leaves on castings.",
    source: "Guidebook, aluminium",
    on: {
      aluminium: suits(
        "Silicon castings such as A380 and 413, seconds; the high end of fluoride at about 12 % silicon.",
        "Guidebook, aluminium; seconds from memory",
      ),
      zinc: unsuitable("Dissolves the casting.", BOTH),
      brass: unsuitable("Dissolves it with brown fume."),
      copper: unsuitable("Dissolves it with brown fume."),
      steel: unsuitable("Dissolves it with brown fume."),
      silver: unsuitable("Dissolves it."),
    },
  },
  {
    slug: "zincate",
    name: "Zincate (immersion zinc)",
    words: "Alkaline zincate; 30 to 60 s, strip, then 15 to 30 s for the second coat.",
    purpose: "Swaps the oxide of aluminium for a thin zinc coat that takes a strike.",
    source: "ASTM B253; times from memory",
    on: {
      aluminium: suits("Twice: the second coat is thinner, tighter and more even.", "ASTM B253; Guidebook, aluminium"),
      steel: unsuitable("Does not deposit; only dirties the part."),
      zinc: unsuitable("Strong caustic on a zinc casting: etch and smut.", BOTH),
      stainless: unsuitable("Does not deposit."),
    },
  },
];
