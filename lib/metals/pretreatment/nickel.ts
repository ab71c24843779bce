import { ACID, CYANIDE_NEXT, NICKEL, POWER, SHEET } from "./cautions";
import type { WrittenRoute } from "./route";
import { COMMON, MEMORY } from "./sources";
import { acidDip, cyanideStrike, electroclean, look, rinseBeforeCyanide, soak, waterBreak } from "./steps";
import { STRIKES } from "./strikes";

/** Nickel and nickel plate to be struck again: waking a passive face. */
export const nickel: WrittenRoute = {
  baseMetal: "nickel",
  title: "Nickel and old nickel plate",
  summary:
    "Nickel falls asleep in minutes: wake it with current in acid or a chloride nickel strike, never with a dip alone.",
  steps: [
    soak({ detail: "Alkaline cleaner, 60 to 80 °C. No silicate that could dry on." }),
    electroclean({
      title: "Electroclean, cathodic only",
      detail: "3 to 8 A/dm², 60 to 80 °C. Anodic in alkali makes nickel passive.",
      minutesWords: "1 to 2 min",
      source: `ASTM B343; current and time ${MEMORY}`,
    }),
    waterBreak(),
    acidDip({
      title: "Anodic etch in sulfuric",
      detail: "Sulfuric 25 % by volume, 1.6 to 2.7 A/dm², anodic. On thin plate: less, it dissolves nickel.",
      minutesWords: "1 to 3 min",
      proof: "Even light grey. On plate, look that no base metal shows.",
      cautions: [ACID, POWER],
      source: "Guidebook, surface preparation",
    }),
    {
      station: "strike",
      title: "Chloride nickel strike (Woods kind)",
      detail:
        "Nickel chloride 225 to 240 g/L, hydrochloric acid 110 to 125 mL/L, cathodic. Current by what this tank proves.",
      minutesWords: "30 s to 3 min",
      proof: "Gas and even matt nickel at once, everywhere.",
      liquid: "acid",
      cautions: [NICKEL, ACID, POWER, SHEET],
      source: "trade columns, Woods (the Guidebook gives 16 to 24 A/dm² here, the columns far less)",
    },
    rinseBeforeCyanide({
      detail: "Two rinses, wet, under 15 s. The strike behind is acid, the next is cyanide.",
      cautions: [CYANIDE_NEXT],
    }),
    cyanideStrike(),
    look(),
  ],
  variants: [
    {
      title: "Fresh nickel plate, still wet",
      words:
        "Out of the nickel tank and never dried: a dip in sulfuric 5 to 10 % by volume, two rinses, strike. Once dry, the whole route.",
      cautions: [ACID, CYANIDE_NEXT],
      steps: [],
      source: `ASTM B343; strength ${MEMORY}`,
    },
    {
      title: "Electroless nickel, high phosphorus",
      words:
        "Harder to wake and not magnetic. Cathodic in sulfuric, then the chloride nickel strike; no anodic etch, it smuts black.",
      cautions: [ACID, NICKEL],
      steps: [],
      source: `${COMMON}, ${MEMORY}`,
    },
  ],
  strike: {
    suits: [
      {
        name: STRIKES.woods,
        why: "Wakes and plates in one tank.",
        source: "Guidebook, surface preparation; trade columns, Woods",
      },
      {
        name: STRIKES.gold,
        why: "Acid gold strikes hold on freshly woken nickel, where copper is not wanted.",
        source: COMMON,
      },
    ],
    unsuitable: [
      { name: STRIKES.cyanide, why: "Straight on passive nickel it plates bright and peels.", source: COMMON },
      { name: STRIKES.watts, why: "Nickel on sleeping nickel parts at the old face.", source: "ASTM B343" },
    ],
  },
  watchOuts: [
    {
      classSlug: "underactivation",
      title: "Asleep in minutes",
      words: "In air or in a warm rinse. It looks the same; only tape tells.",
      source: `${COMMON}; time ${MEMORY}`,
    },
    {
      classSlug: "underactivation",
      title: "Anodic in alkali",
      words: "The one move that undoes all. Cathodic cleaning only.",
      source: "ASTM B343",
    },
    {
      classSlug: "peeling",
      title: "Current off in the bath",
      words: "An edge left without current in a nickel tank goes passive and splits there.",
      source: "ASTM B343; from memory",
    },
    {
      classSlug: "pitting",
      title: "Etched through",
      words: "Thin nickel over steel: the etch finds pores and rusts them.",
      source: COMMON,
    },
  ],
  goesWrong: [
    { classSlug: "underactivation", words: "Hazy copper with clean nickel under it." },
    { classSlug: "peeling", words: "A mirror sheet comes off a mirror: it was asleep." },
    { classSlug: "overactivation", words: "Black film from etching electroless nickel." },
  ],
};
