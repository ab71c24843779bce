import { ACID, CYANIDE_NEXT, HYDROGEN, NICKEL, NITRIC, POWER, SHEET } from "./cautions";
import type { WrittenRoute } from "./route";
import { COMMON, MEMORY } from "./sources";
import { acidDip, cyanideStrike, electroclean, look, rinseBeforeCyanide, soak, waterBreak } from "./steps";
import { STRIKES } from "./strikes";

/** Stainless steel, 300-series first. */
export const stainless: WrittenRoute = {
  baseMetal: "stainless",
  title: "Stainless steel",
  summary:
    "Nothing holds on its own film: break it in acid, seal it under a chloride nickel strike, and keep it wet until the copper.",
  steps: [
    soak({ detail: "Alkaline cleaner, 60 to 80 °C. Take heat tint and weld scale off first, wet and by abrasive." }),
    electroclean({
      title: "Electroclean, cathodic last",
      detail: "3 to 8 A/dm², 60 to 80 °C. End cathodic: anodic thickens the film.",
      minutesWords: "1 to 3 min",
    }),
    waterBreak(),
    acidDip({
      title: "Hydrochloric dip",
      detail: "20 to 50 % by volume, room temperature. Then straight on, wet, with no stop.",
      minutesWords: "30 to 60 s",
      source: `ASTM B254; strength and time ${MEMORY}`,
    }),
    {
      station: "strike",
      title: "Chloride nickel strike (Woods kind)",
      detail:
        "Nickel chloride 225 to 240 g/L, hydrochloric acid 110 to 125 mL/L, 21 to 32 °C. Current by what this tank proves.",
      minutesWords: "30 s to 3 min",
      proof: "Even, matt, pale grey nickel all over. Tape one part.",
      liquid: "acid",
      cautions: [NICKEL, ACID, POWER, SHEET],
      source: "trade columns, Woods (current: 1.1 to 32 A/dm², they do not agree)",
    },
    rinseBeforeCyanide({
      title: "Rinse twice, wet all the way",
      detail: "This strike is strong acid, and cyanide is next. Under 15 s, never dry.",
      cautions: [CYANIDE_NEXT],
    }),
    cyanideStrike(),
    look(),
  ],
  variants: [
    {
      title: "400-series, hardened or spring temper",
      words:
        "Martensitic and precipitation-hardened grades take up hydrogen as carbon steel does. No acid and no cathodic current until an engineer has said how.",
      cautions: [HYDROGEN],
      steps: [],
      source: "ASTM B849; ASTM B850",
    },
    {
      title: "Passivated by the maker",
      words:
        "A nitric passivation leaves a tougher film. Wet abrasion, or an anodic etch in sulfuric by a proven card, before the dip.",
      cautions: [NITRIC],
      steps: [],
      source: `ASTM B254; ${MEMORY}`,
    },
  ],
  strike: {
    suits: [
      {
        name: STRIKES.woods,
        why: "Strips the film and plates in one tank.",
        source: "ASTM B254; trade columns, Woods",
      },
      {
        name: "Acid sulfamate nickel strike, then copper",
        why: "Milder; some shops hold adhesion on easy grades with it.",
        source: COMMON,
      },
    ],
    unsuitable: [
      {
        name: STRIKES.cyanide,
        why: "Straight on, it plates over the film and lifts in a sheet.",
        source: "ASTM B254; from memory",
      },
      { name: STRIKES.acid, why: "Same film, and loose copper besides.", source: COMMON },
      { name: STRIKES.watts, why: "Not acid enough to break the film.", source: COMMON },
    ],
  },
  watchOuts: [
    {
      classSlug: "underactivation",
      title: "Passive again in seconds",
      words: "The film re-forms in a rinse that is warm, aired or long. Go wet and at once.",
      source: "ASTM B254; time from memory",
    },
    {
      classSlug: "peeling",
      title: "Copper straight on",
      words: "It looks whole and comes off in one sheet on tape.",
      source: COMMON,
    },
    {
      classSlug: "underactivation",
      title: "Anodic last",
      words: "Ending the electroclean anodic undoes the acid that follows.",
      source: COMMON,
    },
    {
      classSlug: "overactivation",
      title: "Free-machining 303",
      words: "Sulfides smut in hydrochloric. Short dip, wipe with a white cloth.",
      source: `${COMMON}, ${MEMORY}`,
    },
  ],
  goesWrong: [
    { classSlug: "underactivation", words: "Pale haze that lifts: film left, or made again in the walk." },
    { classSlug: "peeling", words: "A whole sheet comes off bright stainless: no nickel strike, or it dried between." },
    { classSlug: "burning", words: "Dark edges from forcing the copper to cover a passive face." },
    { classSlug: "overactivation", words: "Black on the cloth: 303 or hardened grades, too long in acid." },
  ],
};
