import { ACID, CYANIDE_NEXT, FLUORIDE, HOT_ALKALI, HOT_PART, LIVE_ENTRY, CYANIDE, NITRIC, SHEET } from "./cautions";
import type { RouteStep, WrittenRoute } from "./route";
import { COMMON, MEMORY } from "./sources";
import { acidDip, liveCyanideStrike, look, rinse, rinseBeforeCyanide, soak, waterBreak } from "./steps";
import { STRIKES } from "./strikes";

/** Both coats are the same bath; the second is the one that holds. */
function zincateCoat(own: Pick<RouteStep, "title" | "minutesWords" | "proof"> & { detail: string }): RouteStep {
  return {
    station: "activate",
    liquid: "alkali",
    cautions: [HOT_ALKALI],
    source: `ASTM B253; Guidebook, aluminium; times ${MEMORY}`,
    ...own,
  };
}

/** Aluminium: zincate twice, then an alkaline or neutral strike. */
export const aluminium: WrittenRoute = {
  baseMetal: "aluminium",
  title: "Aluminium",
  summary:
    "Its oxide comes back in a breath, so trade it for zinc: etch, desmut, zincate twice, then strike live at once.",
  steps: [
    soak({ detail: "Non-etching cleaner for aluminium, 50 to 65 °C.", minutesWords: "2 to 5 min" }),
    waterBreak(),
    {
      station: "clean",
      title: "Etch",
      detail: "Mild or inhibited caustic etch, 40 to 60 °C. Thin walls and polished faces: the least that works.",
      minutesWords: "20 to 60 s",
      proof: "Even satin with even smut.",
      liquid: "alkali",
      cautions: [HOT_ALKALI],
      source: `Guidebook, aluminium; figures ${MEMORY}`,
    },
    rinse(),
    acidDip({
      title: "Desmut in nitric",
      detail: "Wrought: nitric acid 50 to 100 % by volume, or 15 to 25 % with sulfuric 10 to 20 %. Room temperature.",
      minutesWords: "15 to 60 s",
      proof: "White, and a white paper towel wipes off clean.",
      cautions: [NITRIC, ACID],
      source: `Guidebook, aluminium; time ${MEMORY}`,
    }),
    rinse(),
    zincateCoat({
      title: "Zincate, first coat",
      detail: "20 to 27 °C, still or slow movement.",
      minutesWords: "30 to 60 s",
      proof: "Even grey. Gassing in the zincate means the desmut missed.",
    }),
    rinse(),
    acidDip({
      title: "Strip the first coat in nitric",
      detail: "Nitric acid 50 % by volume, until the zinc is gone and the face is even.",
      minutesWords: "10 to 30 s",
      cautions: [NITRIC, ACID],
      source: `Guidebook, aluminium; time ${MEMORY}`,
    }),
    rinse({
      title: "Rinse three times",
      detail: "No acid may ride on: it would strip the second coat, and the strike behind is cyanide.",
      cautions: [CYANIDE_NEXT],
    }),
    zincateCoat({
      title: "Zincate, second coat",
      detail: "Same bath, shorter.",
      minutesWords: "15 to 30 s",
      proof: "Thin, tight, even blue-grey. Spongy or sparkling: strip and start again.",
    }),
    rinseBeforeCyanide({
      title: "Rinse twice, cold and quick",
      detail: "No acid from here on: it would take the zincate, and cyanide is next.",
      cautions: [CYANIDE_NEXT],
    }),
    liveCyanideStrike({
      title: "Copper strike for zincate, live entry",
      detail: "Copper cyanide 26 to 30 g/L, free cyanide 1.5 to 3 g/L, in with the current on, to 3 to 5 µm.",
      minutesWords: "until whole",
      proof: "Pink everywhere within the first half minute. Grey patches: the zincate was eaten.",
      cautions: [CYANIDE, LIVE_ENTRY],
      source: `Guidebook, aluminium; Guidebook, copper (3 to 5 µm); half a minute ${COMMON}`,
    }),
    look({
      detail: "Tape one part, then heat one to 220 °C and quench: zincate faults blister. Then the final plate.",
      cautions: [HOT_PART],
      source: `${COMMON}; 220 °C (ISO 2819) ${MEMORY}`,
    }),
  ],
  variants: [
    {
      title: "Silicon casting: A380, 413, 356",
      words:
        "Nitric leaves silicon as black smut. A fluoride desmut takes it. Without fluoride training and exhaust, send it out.",
      cautions: [],
      steps: [
        acidDip({
          title: "Fluoride desmut in place of nitric",
          detail:
            "Nitric 50 %, sulfuric 20 to 25 % by volume, ammonium bifluoride 120 to 240 g/L, the high end at about 12 % silicon.",
          minutesWords: "5 to 30 s",
          proof: "White towel stays clean.",
          cautions: [FLUORIDE, NITRIC, ACID, SHEET],
          source: `Guidebook, aluminium; time ${MEMORY}`,
        }),
        rinse({ title: "Rinse three times" }),
      ],
      source: "Guidebook, aluminium",
    },
    {
      title: "Anodised or chromated",
      words:
        "Neither etches off evenly. Strip by a proven card first. A chromate film holds hexavalent chromium, which causes cancer: no dry sanding.",
      cautions: [
        {
          level: "stop",
          text: "Chromate film: hexavalent chromium. Trained people only, wet, with its own waste line.",
        },
      ],
      steps: [],
      source: COMMON,
    },
  ],
  strike: {
    suits: [
      {
        name: STRIKES.lowCyanide,
        why: "Low free cyanide and mild pH leave the zincate whole.",
        source: "Guidebook, aluminium; ASTM B253",
      },
      { name: STRIKES.neutralNickel, why: "No cyanide; listed for zincate.", source: "ASTM B253" },
      {
        name: STRIKES.electrolessNickel,
        why: "Even in holes; goes straight on zincate.",
        source: `ASTM B253; ${COMMON}`,
      },
    ],
    unsuitable: [
      {
        name: STRIKES.acid,
        why: "Takes the zincate and drops loose copper.",
        source: "Guidebook, copper; CRC potentials",
      },
      { name: STRIKES.woods, why: "The acid strips the zincate and pits.", source: COMMON },
      {
        name: "Copper cyanide at high free cyanide or pH",
        why: "Eats the zincate before copper covers.",
        source: "Guidebook, aluminium",
      },
    ],
  },
  watchOuts: [
    {
      classSlug: "peeling",
      title: "Oxide in a breath",
      words: "Bare aluminium re-oxidises between tanks. Only zincate stops it.",
      source: "ASTM B253; from memory",
    },
    {
      classSlug: "overactivation",
      title: "Smut of its alloy",
      words: "Copper and silicon stay behind after the etch. Towel test before the zincate.",
      source: "Guidebook, aluminium",
    },
    {
      classSlug: "peeling",
      title: "Zincate is not plate",
      words: "Too thick is as bad as none: spongy zinc under copper lifts in heat.",
      source: `Guidebook, aluminium; ${COMMON}`,
    },
    {
      classSlug: "bleed-out",
      title: "Die castings weep",
      words: "Caustic in a pore comes back for days. Short soaks, many rinses.",
      source: COMMON,
    },
  ],
  goesWrong: [
    { classSlug: "peeling", words: "Blisters in heat or a sheet on tape, with grey zinc on its back." },
    { classSlug: "overactivation", words: "Black on the towel: silicon or copper smut left." },
    { classSlug: "immersion-deposit", words: "Loose red copper: zincate missing, copper swapped with aluminium." },
    { classSlug: "underactivation", words: "Patchy cover where the first zincate did not take." },
  ],
};
