import type { BaseMetal } from "@/lib/cases/case-words";

/** Linear-light red, green and blue reflectance, 0 to 1. */
export type Rgb = readonly [number, number, number];

/**
 * A fresh copper strike, pink. Red to green 2.21 and green to blue 1.43 in linear light; the ratios from memory, after phone photos of
 * copper strikes (2.14 and 1.34 in reference/photo-notes.md).
 */
export const STRIKE: Rgb = [0.79, 0.358, 0.25];

/**
 * Base metals as they look after cleaning and activation, worked and slightly matt. Ratios between the channels after published normal
 * reflectances of the pure metals; alloys from memory.
 */
export const METAL_COLOURS: Record<BaseMetal, Rgb> = {
  steel: [0.42, 0.43, 0.445],
  stainless: [0.53, 0.52, 0.5],
  iron: [0.27, 0.265, 0.26],
  brass: [0.68, 0.53, 0.235],
  bronze: [0.55, 0.38, 0.205],
  copper: [0.6, 0.31, 0.2],
  "nickel-silver": [0.61, 0.585, 0.51],
  nickel: [0.56, 0.53, 0.465],
  zinc: [0.53, 0.56, 0.59],
  aluminium: [0.71, 0.72, 0.735],
  silver: [0.81, 0.8, 0.76],
  gold: [0.8, 0.61, 0.26],
  pewter: [0.46, 0.465, 0.47],
  other: [0.5, 0.5, 0.49],
};

/** How much a bare face mirrors, 0 to 1; castings are dull. From memory. */
export const METAL_GLOSS: Record<BaseMetal, number> = {
  steel: 0.5,
  stainless: 0.62,
  iron: 0.22,
  brass: 0.58,
  bronze: 0.48,
  copper: 0.5,
  "nickel-silver": 0.58,
  nickel: 0.58,
  zinc: 0.36,
  aluminium: 0.44,
  silver: 0.66,
  gold: 0.64,
  pewter: 0.34,
  other: 0.45,
};

/** Metals whose pores bloom orange under a wet strike; the others tarnish brown and iridescent. */
export function rusts(metal: BaseMetal): boolean {
  return metal === "steel" || metal === "iron";
}

/** The oxide or salt that creeps out of a seam: rust on ferrous parts, green on copper alloys, pale on light metals. */
export function weepColour(metal: BaseMetal): Rgb {
  switch (metal) {
    case "steel":
    case "iron":
      return [0.22, 0.085, 0.03];
    case "brass":
    case "bronze":
    case "copper":
    case "nickel-silver":
    case "gold":
      return [0.13, 0.16, 0.085];
    case "zinc":
    case "aluminium":
    case "pewter":
      return [0.36, 0.34, 0.31];
    default:
      return [0.17, 0.12, 0.07];
  }
}
