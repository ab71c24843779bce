/** How a part answers a hand magnet. */
export const PULLS = ["none", "faint", "strong"] as const;
export type Pull = (typeof PULLS)[number];
export const PULL_TITLES: Record<Pull, string> = { none: "Not at all", faint: "A little", strong: "Hard" };

/** The colour of the metal itself, seen where it was filed. */
export const COLOURS = ["yellow", "red", "blue-grey", "silver-white", "grey"] as const;
export type Colour = (typeof COLOURS)[number];
export const COLOUR_TITLES: Record<Colour, string> = {
  yellow: "Yellow",
  red: "Red",
  "blue-grey": "Blue-grey",
  "silver-white": "Silver-white",
  grey: "Grey",
};
