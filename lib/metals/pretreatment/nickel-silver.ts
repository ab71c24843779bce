import { ACID, FLUORIDE, LEAD_DUST, SHEET } from "./cautions";
import type { WrittenRoute } from "./route";
import { COMMON, MEMORY } from "./sources";
import { acidDip, cyanideStrike, electroclean, look, rinseBeforeCyanide, soak, waterBreak } from "./steps";
import { STRIKES } from "./strikes";

/** Nickel silver: copper, nickel and zinc, no silver in it. */
export const nickelSilver: WrittenRoute = {
  baseMetal: "nickel-silver",
  title: "Nickel silver",
  summary: "Brass with nickel in it: clean it as brass, then mind that the nickel makes it passive while you walk.",
  steps: [
    soak({ detail: "Mild alkaline cleaner, 50 to 70 °C." }),
    electroclean({
      title: "Electroclean, cathodic",
      detail: "2 to 5 A/dm², 50 to 70 °C. End cathodic: anodic makes the nickel in it passive.",
      minutesWords: "1 to 2 min",
    }),
    waterBreak(),
    acidDip({
      title: "Sulfuric dip",
      detail: "10 % by volume, room temperature. Straight on: under 15 s to the strike.",
      minutesWords: "30 to 60 s",
      proof: "Even, slightly matt. Polished shine left in patches means it is not awake.",
      source: `ASTM B281; strength and times ${MEMORY}`,
    }),
    rinseBeforeCyanide(),
    cyanideStrike(),
    look(),
  ],
  variants: [
    {
      title: "Leaded grades, C79200 and key stock",
      words: "Treat as leaded brass: fluoboric acid 10 to 30 % by volume, at most 2 min, in place of sulfuric.",
      cautions: [FLUORIDE, ACID, SHEET, LEAD_DUST],
      steps: [],
      source: `trade column, leaded brass; its use here ${MEMORY}`,
    },
  ],
  strike: {
    suits: [
      { name: STRIKES.cyanide, why: "Holds when it goes on at once.", source: `Guidebook, copper; ${COMMON}` },
      { name: STRIKES.woods, why: "Where copper straight on gives haze.", source: `${COMMON}, ${MEMORY}` },
    ],
    unsuitable: [{ name: STRIKES.acid, why: "Swaps copper for zinc, loose.", source: `CRC potentials; ${COMMON}` }],
  },
  watchOuts: [
    {
      classSlug: "underactivation",
      title: "Passive in minutes",
      words: "It looks the same awake or asleep. Keep the walk short and wet.",
      source: `${COMMON}; time ${MEMORY}`,
    },
    {
      classSlug: "peeling",
      title: "Taken for silver or stainless",
      words: "White, no pull on the magnet, 8.7 g/cm³. Weigh it before you choose a card.",
      source: COMMON,
    },
    {
      classSlug: "overactivation",
      title: "Zinc goes first",
      words: "Strong hydrochloric takes zinc and leaves a dark face.",
      source: COMMON,
    },
  ],
  goesWrong: [
    { classSlug: "underactivation", words: "Pale haze that lifts: anodic last, a spent dip, or a long walk." },
    { classSlug: "overactivation", words: "Dark smut on the cloth after too much acid." },
    { classSlug: "peeling", words: "Grey on the back of the copper: a leaded grade." },
  ],
};
