import { ACID, HOT_ALKALI, HOT_PART, HYDROGEN, POWER } from "./cautions";
import type { RouteStep, WrittenRoute } from "./route";
import { COMMON, MEMORY } from "./sources";
import { acidDip, cyanideStrike, electroclean, look, rinseBeforeCyanide, soak, waterBreak } from "./steps";
import { STRIKES } from "./strikes";

const HIGH_STRENGTH_STEPS: readonly RouteStep[] = [
  {
    station: "clean",
    title: "Relieve stress first",
    detail:
      "If ground, straightened or formed after hardening: bake at 190 to 230 °C before any plating, by the engineer's card.",
    liquid: "none",
    cautions: [HOT_PART],
    source: "ASTM B849",
  },
  {
    station: "clean",
    title: "Clean without acid",
    detail: "Fine blast or wet abrasive for scale, then anodic electroclean only, 1 to 3 min. Never cathodic.",
    proof: "Water film holds.",
    liquid: "alkali",
    cautions: [HYDROGEN, HOT_ALKALI, POWER],
    source: `ASTM B242; times ${MEMORY}`,
  },
  {
    station: "finish",
    title: "Bake after plating",
    detail:
      "Within 4 h of the last plate: 190 to 220 °C for 8 h (1001 to 1100 MPa) rising by 2 h a step to 22 h (1701 to 1800 MPa).",
    minutesWords: "8 to 22 h",
    liquid: "none",
    cautions: [HOT_PART],
    source: `ASTM B850; the 4 h ${MEMORY}`,
  },
];

/** Low and medium carbon steel. */
export const steel: WrittenRoute = {
  baseMetal: "steel",
  title: "Steel, low and medium carbon",
  summary: "Clean anodic, wake it in dilute acid, and get it wet into an alkaline copper strike before it rusts.",
  steps: [
    soak({ detail: "Heavy-duty alkaline cleaner, 60 to 80 °C. Take buffing compound off while it is fresh." }),
    electroclean({
      title: "Electroclean, anodic last",
      detail: "5 to 10 A/dm², 60 to 80 °C, part anodic at the end so that smut leaves and hydrogen stays out.",
      minutesWords: "1 to 3 min",
    }),
    waterBreak(),
    acidDip({
      title: "Dilute acid dip",
      detail: "Sulfuric 5 to 10 %, or hydrochloric 10 to 50 % by volume where there is rust. No longer than it needs.",
      minutesWords: "15 s to 2 min",
      proof: "Even fine gas, even grey, no black on a white cloth.",
      cautions: [ACID, HYDROGEN],
      source: `ASTM B183; strengths and times ${MEMORY}`,
    }),
    rinseBeforeCyanide(),
    cyanideStrike(),
    look(),
  ],
  variants: [
    {
      title: "High-strength or hardened, above about 1000 MPa (31 HRC)",
      words:
        "Springs, fasteners, case-hardened and spring steel. No acid pickle and no cathodic cleaning. Hold it until an engineer has said how it is cleaned, plated and baked.",
      cautions: [HYDROGEN],
      steps: HIGH_STRENGTH_STEPS,
      source: "ASTM B849; ASTM B850; ASTM B242",
    },
    {
      title: "High carbon, not hardened",
      words:
        "Long acid raises black carbon smut. Sulfuric at 3 to 5 % by volume, seconds; lift smut anodic in the cleaner, not with more acid.",
      cautions: [ACID],
      steps: [],
      source: "Guidebook, surface preparation; ASTM B242",
    },
  ],
  strike: {
    suits: [
      {
        name: STRIKES.cyanide,
        why: "Holds on clean steel and cleans a little as it goes.",
        source: "Guidebook, copper",
      },
      {
        name: STRIKES.pyrophosphate,
        why: "Diluted, with a high ratio, and only on well-woken steel.",
        source: "Guidebook, copper",
      },
      {
        name: STRIKES.woods,
        why: "For alloyed grades that will not wake, copper after it.",
        source: `${COMMON}; trade columns, Woods`,
      },
    ],
    unsuitable: [
      {
        name: STRIKES.acid,
        why: "Copper drops out loose by displacement, before any current.",
        source: "Guidebook, copper; CRC potentials",
      },
    ],
  },
  watchOuts: [
    {
      classSlug: "oxidation",
      title: "It rusts in the walk",
      words: "Wet bare steel flashes brown in a minute or two. No stop between acid and strike.",
      source: `${COMMON}; time ${MEMORY}`,
    },
    {
      classSlug: "overactivation",
      title: "Acid smut",
      words: "Too long in acid leaves carbon on the face. Wipe with a white cloth before the strike.",
      source: COMMON,
    },
    {
      classSlug: "peeling",
      title: "Hydrogen",
      words: "Acid and cathodic current put it in. Ask the strength before the first dip.",
      source: "ASTM B850",
    },
    {
      classSlug: "immersion-deposit",
      title: "No acid copper first",
      words: "An immersion deposit wipes off with a thumb.",
      source: "Guidebook, copper",
    },
  ],
  goesWrong: [
    { classSlug: "oxidation", words: "Rust bloom through thin copper: it stood wet, or the strike left pores." },
    { classSlug: "overactivation", words: "Black smut under the copper from too long or too strong an acid." },
    {
      classSlug: "immersion-deposit",
      words: "Copper that was there before the current: acid copper, or copper in the acid dip.",
    },
    { classSlug: "underactivation", words: "Haze on heat-treated or rolled faces: scale, or a spent acid." },
  ],
};
