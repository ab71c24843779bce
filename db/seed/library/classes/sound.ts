/** Sound: the baseline every suspect is held against. No fault, so no causes and no fixes. */
import type { ShelfPart } from "@/lib/library/library-entry";

export const sound: ShelfPart = {
  class: {
    slug: "sound",
    title: "Sound",
    short: "Even pink copper, whole in every recess, that holds on tape. No fault seen.",
    atStrike:
      "Even salmon-pink, as bright or matt as the base metal under it, with copper in recesses and at contacts. First copper came in about 30 s (common practice). Tape lifts nothing and a white cloth stays white.",
    inFinalPlate: "Plates even and holds. What fails later did not show at the strike.",
    tells: [
      { versus: "underactivation", tell: "No haze that fades, and tape lifts nothing." },
      {
        versus: "oxidation",
        tell: "Pink, not brown. A strike that is seconds old may look salmon; it must not deepen while you watch.",
      },
      {
        versus: "water-spots",
        tell: "A mark that a damp cloth takes off whole copper is water on top, not a fault of the strike.",
      },
      { versus: "peeling", tell: "Looks decide nothing here: tape at an edge and the middle lifts no flake." },
    ],
    checks: [
      "Tilt it under one lamp, wet and dry.",
      "Tape at an edge and in the middle of one part in the rack.",
      "White cloth, then a look into recesses and at contacts.",
    ],
    prevention: [
      "Photograph a sound strike of each base metal you run, wet, under the lamp that suspects are photographed under: it is what every suspect is held against.",
      "Take that picture again after a bath, an activator or a lamp was changed. Yesterday's pink is no measure for today's bath.",
      "Log the time to first copper on sound racks too. Only then does a slow one show.",
    ],
    stripNote:
      "Nothing to take off. Sound is said of the strike only; whether a part is fit for its use is for its engineer. High-strength steel still needs its bake (ASTM B850), sound or not.",
    otherLikelihood: 0,
    sourceKeys: ["astm-b850", "common-practice", "from-memory"],
    synonyms: [
      "good strike",
      "all good",
      "perfect",
      "bright and even",
      "even copper",
      "no problem",
      "fully covered",
      "pass",
      "good",
      "good copper",
      "no fault",
      "nothing wrong",
      "ok",
      "false alarm",
      "normal",
      "looks right",
      "salmon pink",
      "even pink",
      "passes tape",
      "clean strike",
      "what good looks like",
    ],
    position: 12,
  },
  causes: [],
  fixes: [],
};
