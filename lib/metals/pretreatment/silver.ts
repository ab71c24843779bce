import { ACID, NITRIC, SHEET } from "./cautions";
import type { WrittenRoute } from "./route";
import { COMMON, MEMORY } from "./sources";
import { acidDip, cyanideStrike, electroclean, look, rinseBeforeCyanide, soak, waterBreak } from "./steps";
import { STRIKES } from "./strikes";

/** Silver and sterling. */
export const silver: WrittenRoute = {
  baseMetal: "silver",
  title: "Silver and sterling",
  summary: "Reduce the tarnish, keep chloride away, and dip in sulfuric only.",
  steps: [
    soak({
      detail: "Alkaline cleaner, 50 to 70 °C. Tripoli and rouge need the warm end and a soft brush.",
      source: `Guidebook, surface preparation; figures ${MEMORY}`,
    }),
    electroclean({
      title: "Electroclean, cathodic only",
      detail: "2 to 5 A/dm², 50 to 70 °C. Reduces light tarnish too. Anodic dissolves and blackens.",
      minutesWords: "30 s to 2 min",
      proof: "White, no yellow in corners.",
    }),
    waterBreak(),
    acidDip({
      title: "Dilute sulfuric dip",
      detail: "5 to 10 % by volume, room temperature. No hydrochloric.",
      minutesWords: "10 to 30 s",
      proof: "Clean matt white; pink patches are copper left by an old pickle.",
      source: `Guidebook, surface preparation; time ${MEMORY}`,
    }),
    rinseBeforeCyanide(),
    cyanideStrike({
      detail:
        "Free cyanide 11 to 15 g/L, 24 to 66 °C, 0.5 to 4 A/dm². In with the current on: cyanide dissolves silver.",
      source: `Guidebook, copper; live entry ${COMMON}`,
    }),
    look(),
  ],
  variants: [
    {
      title: "Fire-stained sterling",
      words:
        "Grey-violet shadows are copper oxide inside the face. Polish or warm sulfuric pickle first. Old nitric dips take it, with silver: trained people only.",
      cautions: [NITRIC, ACID, SHEET],
      steps: [],
      source: `${COMMON}, ${MEMORY}`,
    },
    {
      title: "Silver plate on another metal",
      words: "Find the metal below. Where silver is worn through, its route rules: strip the silver or mask it.",
      cautions: [],
      steps: [],
      source: COMMON,
    },
  ],
  strike: {
    suits: [
      {
        name: STRIKES.cyanide,
        why: "Holds on clean silver; a barrier before nickel.",
        source: `Guidebook, copper; ${COMMON}`,
      },
      { name: STRIKES.silver, why: "Where the final plate is silver: no copper needed.", source: COMMON },
    ],
    unsuitable: [
      { name: STRIKES.woods, why: "Chloride makes a film on silver that nothing holds on.", source: COMMON },
    ],
  },
  watchOuts: [
    {
      classSlug: "underactivation",
      title: "Chloride film",
      words: "Hydrochloric, salt on hands, tap water with much chloride: a grey film that copper lifts from.",
      source: `${COMMON}, ${MEMORY}`,
    },
    {
      classSlug: "oxidation",
      title: "Tarnishes by sulfur",
      words: "Rubber, gloves, paper and town air yellow it overnight. Strike the day it is cleaned.",
      source: `Guidebook, surface preparation; ${COMMON}`,
    },
    {
      classSlug: "immersion-deposit",
      title: "Pink from the pickle",
      words: "Steel tongs in a pickle plate copper onto silver by themselves.",
      source: COMMON,
    },
    {
      classSlug: "handling",
      title: "Prints show",
      words: "Salt and sulfur of a finger etch polished silver. Cotton or nitrile.",
      source: COMMON,
    },
  ],
  goesWrong: [
    { classSlug: "underactivation", words: "Grey haze that lifts: chloride or sulfide film." },
    { classSlug: "immersion-deposit", words: "Pink blush before any current." },
    { classSlug: "handling", words: "A print that came through the strike." },
  ],
};
