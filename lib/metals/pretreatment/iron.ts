import { ACID, CYANIDE_NEXT, FLUORIDE, SHEET } from "./cautions";
import type { WrittenRoute } from "./route";
import { COMMON, MEMORY } from "./sources";
import { acidDip, cyanideStrike, electroclean, look, rinse, rinseBeforeCyanide, soak, waterBreak } from "./steps";
import { STRIKES } from "./strikes";

/** Cast iron: grey, ductile and malleable. */
export const iron: WrittenRoute = {
  baseMetal: "iron",
  title: "Cast iron",
  summary:
    "Porous and full of graphite: blast rather than pickle, short weak acid, hot and cold rinses, and a strike that throws.",
  steps: [
    {
      station: "clean",
      title: "Blast or tumble",
      detail: "Fine grit or mass finishing for sand, skin and rust, in place of a long pickle.",
      liquid: "none",
      cautions: [],
      source: "Guidebook, surface preparation; ASTM B320",
    },
    soak({ detail: "Alkaline cleaner, 60 to 80 °C. Drain every core and boss." }),
    rinse({
      title: "Hot and cold rinse by turns",
      detail: "Hot water opens and empties the pores, cold stops the rust. Two or three turns.",
      source: "Guidebook, surface preparation; turns from memory",
    }),
    electroclean({
      title: "Electroclean, anodic",
      detail: "5 to 8 A/dm², 60 to 80 °C. Lifts graphite that has come loose; scrub what stays.",
      minutesWords: "1 to 2 min",
    }),
    waterBreak({ proof: "The film holds on machined faces. On raw skin look for bare spots, not a perfect sheet." }),
    acidDip({
      title: "Short weak acid",
      detail: "Sulfuric 3 to 5 % by volume, or hydrochloric 10 to 20 %. Seconds only.",
      minutesWords: "5 to 15 s",
      proof: "White cloth comes off nearly clean.",
      source: `ASTM B320; strength and time ${MEMORY}`,
    }),
    rinseBeforeCyanide({ detail: "Two rinses, the first long enough to empty the pores. Cyanide is next." }),
    cyanideStrike({
      detail:
        "Free cyanide 11 to 15 g/L, 24 to 66 °C. High end of 0.5 to 4 A/dm² at first: iron gasses before it covers.",
    }),
    look({
      detail: "Look again after 10 min dry: pores weep late. Tape one part, then the final plate.",
      source: `${COMMON}; 10 min ${MEMORY}`,
    }),
  ],
  variants: [
    {
      title: "Crusted with sand or silica",
      words:
        "A seconds-long dip in an acid salt with fluoride takes it. Trained people only; rinse twice before any cyanide.",
      cautions: [FLUORIDE, CYANIDE_NEXT, ACID, SHEET],
      steps: [],
      source: `ASTM B320; ${MEMORY}`,
    },
  ],
  strike: {
    suits: [
      {
        name: STRIKES.cyanide,
        why: "Throws into rough skin and covers over graphite.",
        source: `Guidebook, copper; ${COMMON}`,
      },
      {
        name: STRIKES.woods,
        why: "Covers iron that gasses under cyanide; watch what stays in the pores.",
        source: `${COMMON}, ${MEMORY}`,
      },
    ],
    unsuitable: [
      {
        name: STRIKES.acid,
        why: "Loose copper by displacement, and acid shut in the pores.",
        source: "Guidebook, copper; CRC potentials",
      },
      { name: STRIKES.pyrophosphate, why: "Too slow to cover graphite.", source: `${COMMON}, ${MEMORY}` },
    ],
  },
  watchOuts: [
    {
      classSlug: "bleed-out",
      title: "Pores hold liquid",
      words: "Cleaner and acid come back hours later as rings and stains. Hot and cold rinses by turns; bake dry.",
      source: "Guidebook, surface preparation",
    },
    {
      classSlug: "overactivation",
      title: "Acid raises graphite",
      words: "Each second in acid leaves more black. Blast instead.",
      source: "Guidebook, surface preparation; ASTM B320",
    },
    {
      classSlug: "no-deposit",
      title: "Gasses instead of plating",
      words: "Graphite lets hydrogen off easily, so copper comes late. Start at high current.",
      source: "Guidebook, surface preparation",
    },
    {
      classSlug: "oxidation",
      title: "Rusts in the rinse",
      words: "Faster than steel, worst after hot water. Keep moving.",
      source: COMMON,
    },
  ],
  goesWrong: [
    { classSlug: "bleed-out", words: "Stain creeping from a pore or a core seam after it dried." },
    { classSlug: "no-deposit", words: "Bare dull spots where graphite lay open." },
    { classSlug: "overactivation", words: "Black on the cloth and no grip: graphite from the acid." },
    { classSlug: "pitting", words: "Pits at sand holes; the casting's own, not the bath's." },
  ],
};
