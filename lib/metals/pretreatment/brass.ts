import { ACID, FLUORIDE, LEAD_DUST, SHEET } from "./cautions";
import type { WrittenRoute } from "./route";
import { COMMON, MEMORY } from "./sources";
import { acidDip, cyanideStrike, electroclean, look, rinseBeforeCyanide, soak, waterBreak } from "./steps";
import { STRIKES } from "./strikes";

/** Brass, with leaded brass (C360) as its variant. */
export const brass: WrittenRoute = {
  baseMetal: "brass",
  title: "Brass",
  summary:
    "Mild cleaner, short anodic or none, a short sulfuric dip, and fluoride chemistry where the brass has lead in it.",
  steps: [
    soak({ detail: "Mild alkaline cleaner for copper alloys, 50 to 70 °C. Strong caustic stains and takes zinc." }),
    electroclean({
      title: "Electroclean, cathodic",
      detail: "2 to 5 A/dm², 50 to 70 °C. Anodic for the last seconds at most: longer tarnishes and takes zinc.",
      minutesWords: "30 s to 2 min",
      proof: "No brown or rainbow tarnish.",
    }),
    waterBreak(),
    acidDip({
      title: "Dilute sulfuric dip",
      detail: "5 to 10 % by volume, room temperature. Out when the face is even and matt.",
      minutesWords: "15 to 60 s",
      proof: "One even yellow. Red patches mean zinc has gone: too long, or copper in the acid.",
      source: `ASTM B281; strength and times ${COMMON}, ${MEMORY}`,
    }),
    rinseBeforeCyanide(),
    cyanideStrike(),
    look(),
  ],
  variants: [
    {
      title: "Leaded brass: C360, C353, C385",
      words:
        "Machining smears lead over the face. Cleaner leaves it, sulfuric turns it to a salt that no strike holds on. Swap the dip:",
      cautions: [LEAD_DUST],
      steps: [
        acidDip({
          title: "Fluoboric dip in place of sulfuric",
          detail:
            "Fluoboric acid 10 to 30 % by volume, room temperature; or an acid salt with fluoride. Then the same two rinses.",
          minutesWords: "at most 2 min",
          proof: "A white cloth comes off clean, with no grey.",
          cautions: [FLUORIDE, ACID, SHEET],
          source: "trade column, leaded brass",
        }),
        rinseBeforeCyanide(),
      ],
      source: "trade column, leaded brass",
    },
  ],
  strike: {
    suits: [
      {
        name: STRIKES.cyanide,
        why: "Holds on every brass; keeps zinc out of the baths behind it.",
        source: "Guidebook, copper",
      },
      {
        name: STRIKES.pyrophosphate,
        why: "Works without cyanide on well-cleaned, lead-free brass.",
        source: `Guidebook, copper; ${COMMON}`,
      },
      { name: STRIKES.alkaline, why: "Works with fresh activation; narrower window.", source: `${COMMON}, ${MEMORY}` },
    ],
    unsuitable: [
      {
        name: STRIKES.acid,
        why: "Swaps copper for zinc at once: red, loose, and it poisons the bath.",
        source: `CRC potentials; ${COMMON}`,
      },
    ],
  },
  watchOuts: [
    {
      classSlug: "peeling",
      title: "Lead smut",
      words: "Grey on a white cloth after the dip. Sulfuric and hydrochloric do not take it; fluoboric does.",
      source: "trade column, leaded brass",
    },
    {
      classSlug: "overactivation",
      title: "Zinc goes first",
      words:
        "Strong or long acid leaves a red, spongy copper face. Plate holds to it and it does not hold to the part.",
      source: COMMON,
    },
    {
      classSlug: "oxidation",
      title: "Tarnishes in air",
      words: "Minutes after the dip it yellows. Keep it wet, go at once.",
      source: `${COMMON}; time ${MEMORY}`,
    },
    {
      classSlug: "immersion-deposit",
      title: "Copper in the acid",
      words: "An old dip plates red copper on by itself. Change it by parts run, not by colour.",
      source: COMMON,
    },
  ],
  goesWrong: [
    { classSlug: "dewetting", words: "Bare islands where buffing compound or lead kept the film off." },
    { classSlug: "peeling", words: "Lifts on tape with grey on its back: lead was left." },
    { classSlug: "overactivation", words: "Dark or red under the copper: zinc taken out by the dip." },
    { classSlug: "oxidation", words: "Brown or rainbow: anodic too long, or it stood between dip and strike." },
  ],
};
