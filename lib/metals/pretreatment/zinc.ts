import { ACID, CYANIDE, HOT_PART, LIVE_ENTRY, SHEET } from "./cautions";
import type { WrittenRoute } from "./route";
import { COMMON, MEMORY } from "./sources";
import { acidDip, electroclean, liveCyanideStrike, look, rinseBeforeCyanide, soak, waterBreak } from "./steps";
import { STRIKES } from "./strikes";

/** Zinc die cast: Alloys 3 and 5 and their kin. */
export const zinc: WrittenRoute = {
  baseMetal: "zinc",
  title: "Zinc die cast",
  summary:
    "Everything mild and short: the dense skin is thin, and an alkaline copper strike must seal it before any acid bath.",
  steps: [
    soak({
      detail: "Inhibited cleaner made for zinc, 50 to 70 °C. No strong caustic.",
      minutesWords: "2 to 5 min",
      source: `ASTM B252; figures ${MEMORY}`,
    }),
    electroclean({
      title: "Electroclean, anodic and short",
      detail: "Inhibited, 1.5 to 3 A/dm², 60 to 70 °C. Longer etches the skin and greys it.",
      minutesWords: "20 to 45 s",
      proof: "Still bright. Grey means too long.",
      source: `ASTM B252; figures ${MEMORY}`,
    }),
    waterBreak(),
    acidDip({
      title: "Very dilute sulfuric dip",
      detail: "0.25 to 1 % by volume, room temperature. Out at the first even gas.",
      minutesWords: "10 to 30 s",
      proof: "One even light gassing, no black.",
      source: `ASTM B252; strength and time ${COMMON}, ${MEMORY}`,
    }),
    rinseBeforeCyanide({
      detail: "Two rinses of their own, drained from every boss. Castings carry acid over in blind holes.",
    }),
    liveCyanideStrike({
      title: "Copper cyanide strike-plate, live entry",
      detail: "In with the current on. Copper cyanide 42 g/L; 3 to 5 µm, corners covered, before any acid bath.",
      minutesWords: "until 3 to 5 µm",
      proof: "Pink in every recess. A bare corner blisters later.",
      cautions: [CYANIDE, LIVE_ENTRY, SHEET],
      source: "Guidebook, copper (Table II)",
    }),
    look({
      detail: "Look into recesses and along parting lines, tape one part. Heat one to 150 °C if blisters are feared.",
      cautions: [HOT_PART],
      source: `${COMMON}; 150 °C (ISO 2819) ${MEMORY}`,
    }),
  ],
  variants: [
    {
      title: "Polished through the skin",
      words: "Buffing opens the porous core. More copper, 5 µm and up, or the customer is told before it runs.",
      cautions: [],
      steps: [],
      source: `ASTM B252; ${MEMORY}`,
    },
    {
      title: "High-aluminium zinc, ZA-8, ZA-12, ZA-27",
      words: "More aluminium means more smut in alkali and no grip on a plain card. Prove a card on scrap first.",
      cautions: [ACID],
      steps: [],
      source: MEMORY,
    },
  ],
  strike: {
    suits: [
      {
        name: STRIKES.cyanide,
        why: "Copper is held too tightly in cyanide to drop out on zinc.",
        source: "Guidebook, copper",
      },
      {
        name: STRIKES.alkaline,
        why: "Some shops run it; narrow, so prove it with heat and tape.",
        source: `${COMMON}, ${MEMORY}`,
      },
    ],
    unsuitable: [
      {
        name: STRIKES.acid,
        why: "Loose copper by displacement in a second; the acid eats the casting.",
        source: "Guidebook, copper; CRC potentials",
      },
      { name: STRIKES.woods, why: "Strong acid on zinc: eaten skin, loose nickel.", source: COMMON },
      { name: STRIKES.watts, why: "Acid enough to attack bare zinc; it needs sealed copper first.", source: COMMON },
    ],
  },
  watchOuts: [
    {
      classSlug: "immersion-deposit",
      title: "No acid copper straight on zinc",
      words: "Copper drops out loose, with no grip.",
      source: "Guidebook, copper",
    },
    {
      classSlug: "peeling",
      title: "Bare corners blister later",
      words: "The next acid bath eats the zinc under the plate.",
      source: COMMON,
    },
    {
      classSlug: "bleed-out",
      title: "Castings hold liquid",
      words: "Long soaks come back as stains at seams and cold shuts.",
      source: COMMON,
    },
    {
      classSlug: "overactivation",
      title: "Over-etched in seconds",
      words: "Strong caustic or acid leaves black smut and an open skin.",
      source: "ASTM B252; from memory",
    },
  ],
  goesWrong: [
    { classSlug: "peeling", words: "Blisters at corners and parting lines, worse after heat." },
    {
      classSlug: "immersion-deposit",
      words: "Copper wipes off: it met acid copper, or an old acid dip with copper in it.",
    },
    { classSlug: "bleed-out", words: "Stain from a seam or cold shut after a day." },
    { classSlug: "no-deposit", words: "Bare recess: too little throw, or no live entry." },
  ],
};
