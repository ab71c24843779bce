import { ACID, BERYLLIUM, FLUORIDE, SHEET } from "./cautions";
import type { WrittenRoute } from "./route";
import { COMMON, MEMORY } from "./sources";
import { acidDip, cyanideStrike, electroclean, look, rinseBeforeCyanide, soak, waterBreak } from "./steps";
import { STRIKES } from "./strikes";

/** Copper, with beryllium copper as its variant. */
export const copper: WrittenRoute = {
  baseMetal: "copper",
  title: "Copper",
  summary:
    "The easiest base metal and the hardest to judge: copper on copper shows no cover, so the tape and the clock decide.",
  steps: [
    soak({ detail: "Mild alkaline cleaner, 50 to 70 °C. Drawing oil and solder flux need longer." }),
    electroclean({
      title: "Electroclean, cathodic",
      detail: "2 to 5 A/dm², 50 to 70 °C. Anodic only for the last seconds, to lift smut.",
      minutesWords: "1 to 2 min",
    }),
    waterBreak(),
    acidDip({
      title: "Dilute sulfuric dip",
      detail: "5 to 10 % by volume, room temperature, until one even salmon pink.",
      minutesWords: "15 to 60 s",
      proof: "No brown left in corners, no dark line at solder.",
      source: `ASTM B281; strength and times ${COMMON}, ${MEMORY}`,
    }),
    rinseBeforeCyanide(),
    cyanideStrike({ proof: "Colour tells nothing here. Time, amps and a brass coupon on the same rack do." }),
    look({ detail: "Tape each kind of part: cover cannot be read by eye on copper. Then the final plate." }),
  ],
  variants: [
    {
      title: "Beryllium copper, C17200 and kin",
      words:
        "Heat treat leaves a beryllium oxide that sulfuric alone does not take. Send it to a shop with a proven card, or hold it.",
      cautions: [BERYLLIUM, ACID, SHEET],
      steps: [],
      source: `ASTM B281; ${MEMORY}`,
    },
    {
      title: "Soft-soldered",
      words:
        "Lead and tin darken in sulfuric. A fluoboric dip takes them. Without it, strike live and look at the joint first.",
      cautions: [FLUORIDE, ACID],
      steps: [],
      source: `${COMMON}, ${MEMORY}`,
    },
  ],
  strike: {
    suits: [
      {
        name: STRIKES.cyanide,
        why: "Covers solder and oxide traces that acid copper would lift from.",
        source: "Guidebook, copper",
      },
      {
        name: STRIKES.acid,
        why: "Holds on clean, freshly dipped copper: there is nothing to displace.",
        source: `CRC potentials; ${COMMON}`,
      },
      { name: STRIKES.pyrophosphate, why: "Works without cyanide.", source: "Guidebook, copper" },
    ],
    unsuitable: [
      {
        name: "Silver bath straight on",
        why: "Silver drops out by displacement and blisters. Strike first.",
        source: `CRC potentials; ${COMMON}`,
      },
      {
        name: "Gold bath straight on, thin",
        why: "It holds, but copper walks through thin gold. Nickel between.",
        source: COMMON,
      },
    ],
  },
  watchOuts: [
    {
      classSlug: "oxidation",
      title: "Tarnishes while you look",
      words: "Pink to brown in minutes when wet and warm.",
      source: `${COMMON}; time ${MEMORY}`,
    },
    {
      classSlug: "no-deposit",
      title: "Cover cannot be seen",
      words: "No photo reading is shown for copper on copper. Trust tape, time and a brass coupon.",
      source: COMMON,
    },
    {
      classSlug: "dewetting",
      title: "Inhibitor left on",
      words: "Stock often comes with a tarnish inhibitor. It breaks the film and survives a mild cleaner.",
      source: `${COMMON}, ${MEMORY}`,
    },
  ],
  goesWrong: [
    { classSlug: "oxidation", words: "Brown or rainbow under or in the strike: it waited." },
    { classSlug: "peeling", words: "Lifts with brown on its back: oxide or inhibitor left on." },
    { classSlug: "water-spots", words: "Rings that show only here, since the metal is its own mirror." },
  ],
};
