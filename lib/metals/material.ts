import type { BaseMetal } from "@/lib/cases/case-words";
import type { Colour, Pull } from "@/lib/metals/material-words";
import type { MeasuredDensity } from "@/lib/metals/weigh-part";

/** What colour the metal itself has, and for which of the shop's words for a filed spot it can be taken. */
export const METAL_COLOURS = {
  yellow: ["yellow"],
  "yellow-red": ["yellow", "red"],
  red: ["red"],
  "brown-red": ["red"],
  "blue-grey": ["blue-grey", "grey"],
  grey: ["grey", "blue-grey"],
  "dull grey": ["grey", "blue-grey"],
  "silver-grey": ["silver-white", "grey"],
  "grey-white": ["silver-white", "grey"],
  "silver-white": ["silver-white"],
  white: ["silver-white"],
} as const satisfies Record<string, readonly Colour[]>;
export type MetalColour = keyof typeof METAL_COLOURS;

/** One solid metal that a part may be made of. */
export interface Material {
  name: string;
  baseMetal: BaseMetal;
  lowGPerCm3: number;
  typicalGPerCm3: number;
  highGPerCm3: number;
  /** How it may answer a magnet, bare of any nickel plate. */
  pull: readonly Pull[];
  colour: MetalColour;
  /** Where the densities come from; says "from memory" where they do. */
  source: string;
  /** What a job card may call it. */
  alloys: readonly string[];
}

/** Whether the metal, filed, can be taken for that colour. */
export function canLook(material: Material, colour: Colour): boolean {
  return METAL_COLOURS[material.colour].some((word) => word === colour);
}

/** A pull too weak to feel counts as none, so no pull rules out only a metal that always pulls hard. */
export function canPull(material: Material, pull: Pull): boolean {
  return pull === "none" ? material.pull.some((each) => each !== "strong") : material.pull.includes(pull);
}

/** What was seen besides the weights; left out where nobody looked. */
export interface Looks {
  pull?: Pull | undefined;
  colour?: Colour | undefined;
}

/** Whether nothing that was seen speaks against the metal. */
export function looksLike(material: Material, { pull, colour }: Looks): boolean {
  return (pull === undefined || canPull(material, pull)) && (colour === undefined || canLook(material, colour));
}

/** Whether a range of densities and the measured one, with its uncertainty, share a value. */
export function overlaps(measured: MeasuredDensity, range: { lowGPerCm3: number; highGPerCm3: number }): boolean {
  const { densityGPerCm3, uncertaintyGPerCm3 } = measured;
  return (
    range.lowGPerCm3 <= densityGPerCm3 + uncertaintyGPerCm3 && range.highGPerCm3 >= densityGPerCm3 - uncertaintyGPerCm3
  );
}
