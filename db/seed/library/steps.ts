/**
 * The steps that nearly every rework shares, so that their cautions are the same on every card.
 * Minutes are working minutes from memory; the shop's recorded ones replace them.
 */
import type { FixStep } from "@/lib/library/library-entry";

type Detail = { detail: string; minutes?: number; cautionKeys?: string[] };

const ACID_CAUTIONS = ["acid-cyanide", "acid-splash", "sheet"];

/** Takes the strike off by abrasion. Part by part, at the bench. */
export function polishBack({ detail, minutes = 6, cautionKeys = [] }: Detail): FixStep {
  return {
    title: "Polish the strike back",
    detail,
    minutes,
    perPart: true,
    cautionKeys: ["polishing-dust", ...cautionKeys],
    station: null,
  };
}

export function clean(title: string, { detail, minutes = 6, cautionKeys = [] }: Detail): FixStep {
  return {
    title,
    detail,
    minutes,
    perPart: false,
    cautionKeys: ["hot-alkali", "power", ...cautionKeys],
    station: "clean",
  };
}

/** Rinse that ends in the water-break test, the gate of every rework. */
export function rinseToWaterBreak({ detail, minutes = 3, cautionKeys = [] }: Partial<Detail> = {}): FixStep {
  return {
    title: "Rinse and read the water break",
    detail:
      detail ??
      "Two rinses, then hold the part still and let it drain. The film must stay one sheet. If it breaks anywhere, go back to the cleaner, not on to the acid.",
    minutes,
    perPart: false,
    cautionKeys,
    station: "rinse",
  };
}

export function rinse(title: string, { detail, minutes = 2, cautionKeys = [] }: Detail): FixStep {
  return { title, detail, minutes, perPart: false, cautionKeys, station: "rinse" };
}

/** An acid dip. Steel may be in any rack, so the hydrogen stop stands beside it unless the card is for another metal. */
export function activate(title: string, { detail, minutes = 3, cautionKeys = ["embrittlement"] }: Detail): FixStep {
  return {
    title,
    detail,
    minutes,
    perPart: false,
    cautionKeys: [...ACID_CAUTIONS, ...cautionKeys],
    station: "activate",
  };
}

export function strike({ detail, minutes = 5, cautionKeys = [] }: Detail): FixStep {
  return {
    title: "Strike and time the first copper",
    detail,
    minutes,
    perPart: false,
    cautionKeys: ["acid-cyanide", "cyanide", "power", ...cautionKeys],
    station: "strike",
  };
}

/** Photo and tape on the fresh strike. Tape is shop practice on a strike: ASTM D3359 is written for paint. */
export function photographAndTape({ detail, minutes = 2 }: Partial<Detail> = {}): FixStep {
  return {
    title: "Photograph, then tape",
    detail:
      detail ??
      "Rinse, photograph the same side at the same tilt, dry one spot, press tape on hard and pull it back on itself in one go. No copper on the tape.",
    minutes,
    perPart: true,
    cautionKeys: [],
    station: "inspect",
  };
}

/** A change made to a tank or a tool, not to a part. */
export function mend(
  station: FixStep["station"],
  title: string,
  { detail, minutes = 15, cautionKeys = [] }: Detail,
): FixStep {
  return { title, detail, minutes, perPart: false, cautionKeys, station };
}

/** The nickel strike that wakes stainless, nickel and old plate. Its recipe is the trade columns'; their currents disagree. */
export function nickelStrike({ detail, minutes = 4, cautionKeys = [] }: Detail): FixStep {
  return {
    title: "Woods nickel strike",
    detail: `${detail} Nickel chloride 225 to 240 g/L, hydrochloric acid 110 to 125 mL/L, 21 to 32 °C (trade columns); current as this tank proves.`,
    minutes,
    perPart: false,
    cautionKeys: ["nickel", "acid-cyanide", "acid-splash", "power", "embrittlement", ...cautionKeys],
    station: "strike",
  };
}

/** One step of a brush sequence, part by part: its own anode, cover and tray, solution and current in the same hand. */
export function brushStep(
  station: FixStep["station"],
  title: string,
  { detail, minutes = 5, cautionKeys = [] }: Detail,
): FixStep {
  return {
    title,
    detail,
    minutes,
    perPart: true,
    cautionKeys: ["brush-power", "acid-cyanide", "sheet", ...cautionKeys],
    station,
  };
}

/** What comes before any strip of a finished part: what is on it, and whether it will survive. */
export function beforeStripping({ detail, minutes = 5, cautionKeys = [] }: Detail): FixStep {
  return {
    title: "Before any strip: gauge, lift the edge, ask",
    detail,
    minutes,
    perPart: true,
    cautionKeys,
    station: "inspect",
  };
}
