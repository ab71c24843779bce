/** The strikes that a route speaks of, by the names a shop uses. */
export const STRIKES = {
  cyanide: "Copper cyanide strike",
  lowCyanide: "Copper cyanide strike, low free cyanide",
  pyrophosphate: "Copper pyrophosphate strike",
  alkaline: "Alkaline non-cyanide copper",
  acid: "Acid copper",
  woods: "Chloride nickel strike (Woods kind), then copper",
  neutralNickel: "Neutral nickel strike",
  electrolessNickel: "Electroless nickel, alkaline strike bath",
  silver: "Silver strike",
  gold: "Acid gold strike",
  watts: "Bright or Watts nickel straight on",
} as const;
