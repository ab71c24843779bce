import { ACID, CYANIDE_NEXT, FLUORIDE, LEAD_DUST, NICKEL, POWER, SHEET } from "./cautions";
import type { RouteStep, WrittenRoute } from "./route";
import { COMMON, MEMORY } from "./sources";
import { acidDip, cyanideStrike, electroclean, look, rinseBeforeCyanide, soak, waterBreak } from "./steps";
import { STRIKES } from "./strikes";

const ALUMINIUM_BRONZE_STEPS: readonly RouteStep[] = [
  acidDip({
    title: "Fluoride dip in place of sulfuric",
    detail:
      "Acid salt with fluoride, 30 to 120 g/L, room temperature, until the face is even and matt. Then two rinses.",
    minutesWords: "10 to 60 s",
    proof: "Water film holds; no grey bloom comes back in the rinse.",
    cautions: [FLUORIDE, ACID, SHEET],
  }),
  {
    station: "strike",
    title: "Chloride nickel strike, if copper hazes",
    detail:
      "Woods kind, 225 to 240 g/L nickel chloride, 110 to 125 mL/L hydrochloric acid. Copper after it, still wet.",
    minutesWords: "30 s to 3 min",
    liquid: "acid",
    cautions: [NICKEL, ACID, POWER],
    source: `trade columns, Woods; its use here ${MEMORY}`,
  },
  rinseBeforeCyanide({ cautions: [CYANIDE_NEXT] }),
];

/** Bronze: tin and phosphor bronze; aluminium bronze apart. */
export const bronze: WrittenRoute = {
  baseMetal: "bronze",
  title: "Bronze, tin and phosphor",
  summary:
    "As copper, with a touch more acid; but aluminium bronze wears aluminium's film and leaded bronze wears lead.",
  steps: [
    soak({ detail: "Mild alkaline cleaner, 50 to 70 °C. Bearing bronze holds oil: repeat until the film holds." }),
    electroclean({
      title: "Electroclean, cathodic",
      detail: "2 to 5 A/dm², 50 to 70 °C. Anodic tarnishes it.",
      minutesWords: "1 to 2 min",
    }),
    waterBreak(),
    acidDip({
      title: "Dilute sulfuric dip",
      detail: "10 % by volume, room temperature, until even and pink-brown.",
      minutesWords: "15 to 60 s",
      proof: "No white bloom: that would be tin oxide.",
      source: `ASTM B281; strength and times ${MEMORY}`,
    }),
    rinseBeforeCyanide(),
    cyanideStrike(),
    look(),
  ],
  variants: [
    {
      title: "Aluminium bronze, C61400 to C95800",
      words:
        "Its film is alumina. Sulfuric leaves it, and copper goes on hazy and lifts. A faint pull on a magnet and a gold colour give it away.",
      cautions: [],
      steps: ALUMINIUM_BRONZE_STEPS,
      source: `${COMMON}, ${MEMORY}`,
    },
    {
      title: "Leaded bronze, C93200 and bearing grades",
      words:
        "As leaded brass: fluoboric acid 10 to 30 % by volume, at most 2 min, in place of sulfuric. Castings hold oil and acid in pores.",
      cautions: [FLUORIDE, ACID, LEAD_DUST],
      steps: [],
      source: `trade column, leaded brass; its use on bronze ${MEMORY}`,
    },
  ],
  strike: {
    suits: [
      { name: STRIKES.cyanide, why: "Holds on tin and phosphor bronze.", source: "Guidebook, copper" },
      {
        name: STRIKES.pyrophosphate,
        why: "Works on clean phosphor bronze strip.",
        source: `Guidebook, copper; ${COMMON}`,
      },
      { name: STRIKES.woods, why: "For aluminium and silicon bronze.", source: MEMORY },
    ],
    unsuitable: [
      {
        name: `${STRIKES.acid} on aluminium bronze`,
        why: "Plates over the alumina film and lifts.",
        source: `${COMMON}, ${MEMORY}`,
      },
      { name: `${STRIKES.acid} on leaded bronze`, why: "Sulfate on lead under the copper.", source: COMMON },
    ],
  },
  watchOuts: [
    {
      classSlug: "underactivation",
      title: "Which bronze?",
      words: "Ask for the number. Aluminium bronze on a phosphor bronze card looks fine wet and lifts dry.",
      source: COMMON,
    },
    {
      classSlug: "bleed-out",
      title: "Bearing bronze holds oil",
      words: "Sintered and cast grades weep oil into every tank. Bake or vacuum it out before the soak.",
      source: COMMON,
    },
    {
      classSlug: "overactivation",
      title: "Nitric leaves tin white",
      words: "A nitric bright dip (trained people only) turns tin to white oxide. Not before a strike.",
      source: `${COMMON}, ${MEMORY}`,
    },
  ],
  goesWrong: [
    { classSlug: "underactivation", words: "Haze that lifts on tape: aluminium bronze, or a spent dip." },
    { classSlug: "dewetting", words: "Round bare spots: oil from the pores." },
    { classSlug: "bleed-out", words: "Dark halo round a pore hours later." },
    { classSlug: "oxidation", words: "Brown from anodic cleaning." },
  ],
};
