import { ACID, HOT_PART, NICKEL, SHEET } from "./cautions";
import type { WrittenRoute } from "./route";
import { COMMON, MEMORY } from "./sources";
import { acidDip, cyanideStrike, electroclean, look, rinseBeforeCyanide, soak, waterBreak } from "./steps";
import { STRIKES } from "./strikes";

/** Gold alloys, 8 to 18 carat. */
export const gold: WrittenRoute = {
  baseMetal: "gold",
  title: "Gold alloys",
  summary:
    "The gold never tarnishes, its copper and silver do: take fire scale and compound off, dip short, and never run it anodic in cyanide.",
  steps: [
    soak({ detail: "Alkaline cleaner with a soft brush or ultrasonic, 50 to 70 °C. Stones: ask what they stand." }),
    electroclean({
      title: "Electroclean, cathodic only",
      detail: "2 to 5 A/dm², 50 to 70 °C. Reduces tarnish of the copper and silver in it. Never anodic.",
      minutesWords: "30 to 60 s",
    }),
    waterBreak(),
    acidDip({
      title: "Dilute sulfuric dip",
      detail: "5 to 10 % by volume, room temperature. Clean acid: no copper in it, no steel tongs.",
      minutesWords: "15 to 30 s",
      proof: "Colour even; no pink blush.",
    }),
    rinseBeforeCyanide({ detail: "Two rinses of their own. Hollow ware and settings carry acid: shake and drain." }),
    cyanideStrike(),
    look({ detail: "Look behind settings and at solder seams, tape where it will not show. Then the final plate." }),
  ],
  variants: [
    {
      title: "Cast or soldered, 8 to 14 carat",
      words:
        "Fire scale is copper oxide in the face. Warm sulfuric pickle, 10 % by volume at 50 to 60 °C, then polish and begin again.",
      cautions: [ACID, HOT_PART],
      steps: [],
      source: `${COMMON}, ${MEMORY}`,
    },
    {
      title: "White gold with nickel",
      words:
        "The nickel makes it passive. Cathodic in clean sulfuric, or an acid gold strike in place of copper; tape it.",
      cautions: [ACID, NICKEL, SHEET],
      steps: [],
      source: MEMORY,
    },
  ],
  strike: {
    suits: [
      { name: STRIKES.gold, why: "Holds best, where copper is not asked for.", source: COMMON },
      {
        name: STRIKES.cyanide,
        why: "Holds on clean alloy, levels solder seams.",
        source: `Guidebook, copper; ${COMMON}`,
      },
      {
        name: STRIKES.acid,
        why: "Holds on clean gold: it displaces nothing. Mind low carats with solder.",
        source: `CRC potentials; ${MEMORY}`,
      },
    ],
    unsuitable: [
      {
        name: "Copper under thin gold with no barrier",
        why: "Copper walks through thin gold and tarnishes. Nickel or palladium between.",
        source: COMMON,
      },
    ],
  },
  watchOuts: [
    {
      classSlug: "immersion-deposit",
      title: "Pink from the pickle",
      words: "Steel tongs or old acid plate copper on by themselves.",
      source: COMMON,
    },
    {
      classSlug: "bleed-out",
      title: "Hollow and set pieces hold liquid",
      words: "Cyanide and acid hide behind stones. Rinse each for long and apart.",
      source: COMMON,
    },
    {
      classSlug: "dewetting",
      title: "Rouge breaks the film",
      words: "Water runs off polished gold with compound in it. Brush, soak again.",
      source: COMMON,
    },
  ],
  goesWrong: [
    { classSlug: "dewetting", words: "Bare islands round prongs and engraving: compound left." },
    { classSlug: "peeling", words: "Lifts at solder or fire scale." },
    { classSlug: "bleed-out", words: "Green or brown creeping from a setting." },
  ],
};
