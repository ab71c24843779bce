import { ACID, CYANIDE, FLUORIDE, LEAD_DUST, LIVE_ENTRY, SHEET } from "./cautions";
import type { WrittenRoute } from "./route";
import { COMMON, MEMORY } from "./sources";
import { acidDip, electroclean, liveCyanideStrike, look, rinseBeforeCyanide, soak, waterBreak } from "./steps";
import { STRIKES } from "./strikes";

/** Pewter and britannia: tin with antimony and copper; old pewter has lead. */
export const pewter: WrittenRoute = {
  baseMetal: "pewter",
  title: "Pewter",
  summary:
    "Soft, low-melting and fond of alkali: mild cleaner, a seconds-long fluoboric dip, and a live copper strike.",
  steps: [
    soak({ detail: "Mild cleaner, 45 to 60 °C. No caustic: it dissolves tin.", minutesWords: "1 to 3 min" }),
    electroclean({
      title: "Electroclean, cathodic and short",
      detail: "1 to 3 A/dm², 45 to 60 °C. Anodic darkens it.",
      minutesWords: "15 to 45 s",
      proof: "Bright, with no grey wipe.",
    }),
    waterBreak(),
    acidDip({
      title: "Fluoboric dip",
      detail: "Fluoboric acid 5 to 10 % by volume, room temperature. No sulfuric or hydrochloric on leaded pewter.",
      minutesWords: "5 to 20 s",
      proof: "Even and slightly matt; the white cloth stays clean.",
      cautions: [FLUORIDE, ACID, SHEET],
      source: MEMORY,
    }),
    rinseBeforeCyanide(),
    liveCyanideStrike({
      detail: "In with the current on, room temperature to 45 °C, low end of 0.5 to 4 A/dm² and no gassing at first.",
      minutesWords: "2 to 4 min",
      proof: "Whole pink. The strike must be shut before any acid bath.",
      cautions: [CYANIDE, LIVE_ENTRY],
      source: `Guidebook, copper; temperature, time and low start ${MEMORY}`,
    }),
    look({
      detail: "Tape gently: the metal is soft. Never a heat test: pewter melts from about 170 to 240 °C.",
      source: `${COMMON}; melting range ${MEMORY}`,
    }),
  ],
  variants: [
    {
      title: "Old pewter, with lead",
      words:
        "Darker, heavier (above about 7.4 g/cm³), marks paper. Fluoboric only, and the lead smut test by white cloth each time.",
      cautions: [LEAD_DUST, FLUORIDE],
      steps: [],
      source: MEMORY,
    },
  ],
  strike: {
    suits: [
      { name: STRIKES.cyanide, why: "Alkaline and quick to shut the face.", source: `Guidebook, copper; ${COMMON}` },
      { name: STRIKES.pyrophosphate, why: "Mild; slower to cover.", source: `Guidebook, copper; ${MEMORY}` },
    ],
    unsuitable: [
      { name: STRIKES.acid, why: "Copper drops out loose on tin.", source: `CRC potentials; ${COMMON}` },
      { name: STRIKES.woods, why: "The acid etches tin.", source: `${COMMON}, ${MEMORY}` },
    ],
  },
  watchOuts: [
    {
      classSlug: "overactivation",
      title: "Alkali dissolves tin",
      words: "A hot caustic soak leaves antimony as black smut.",
      source: `${COMMON}, ${MEMORY}`,
    },
    {
      classSlug: "peeling",
      title: "Soft below the plate",
      words: "Bend and tape say little: the metal gives first. Burnish instead.",
      source: `${COMMON}, ${MEMORY}`,
    },
    {
      classSlug: "bleed-out",
      title: "Spun and soldered seams hold liquid",
      words: "Handles and beads weep. Drain and rinse each side.",
      source: COMMON,
    },
    { classSlug: "oxidation", title: "Low melting", words: "No bake, no hot dry, no torch. Cool air.", source: COMMON },
  ],
  goesWrong: [
    { classSlug: "overactivation", words: "Black wipe before the strike: too much alkali or acid." },
    { classSlug: "peeling", words: "Lifts with grey on its back: lead or tin oxide." },
    { classSlug: "burning", words: "Dark edges: too much current at first." },
    { classSlug: "bleed-out", words: "Stain at a soldered seam." },
  ],
};
