/**
 * The shop's words as closed lists: what a stored column may hold and what a form may send.
 * Drizzle columns, zod schemas, screens and seeds all import them from here.
 */

/** The defect classes of the shelf, in the order in which they are shown. `sound` is the baseline, not a fault. */
export const SHELF_CLASSES = [
  "dewetting",
  "underactivation",
  "overactivation",
  "water-spots",
  "oxidation",
  "burning",
  "no-deposit",
  "peeling",
  "immersion-deposit",
  "bleed-out",
  "pitting",
  "handling",
  "sound",
] as const;
export type ShelfClass = (typeof SHELF_CLASSES)[number];

export const CLASS_TITLES: Record<ShelfClass, string> = {
  dewetting: "Dewetting",
  underactivation: "Underactivation",
  overactivation: "Overactivation",
  "water-spots": "Water spots",
  oxidation: "Oxidation",
  burning: "Burning",
  "no-deposit": "No deposit",
  peeling: "Peeling",
  "immersion-deposit": "Immersion deposit",
  "bleed-out": "Bleed-out",
  pitting: "Pitting",
  handling: "Handling",
  sound: "Sound",
};

/** What a plater can tick, said as they see it. Each picture button shows the glyph of the class it speaks for most. */
export const SYMPTOMS = {
  "patchy-haze": { words: "Patchy, hazy", glyph: "underactivation" },
  "bare-islands": { words: "Bare islands", glyph: "dewetting" },
  "dark-smut": { words: "Dark smut", glyph: "overactivation" },
  "rings-tracks": { words: "Rings, tear tracks", glyph: "water-spots" },
  "brown-rainbow": { words: "Brown, rainbow", glyph: "oxidation" },
  "burnt-edges": { words: "Burnt edges", glyph: "burning" },
  "bare-recess": { words: "Bare in a recess", glyph: "no-deposit" },
  "lifts-on-tape": { words: "Lifts on tape", glyph: "peeling" },
  "wipes-off": { words: "Wipes off", glyph: "immersion-deposit" },
  "stain-from-seam": { words: "Stain from a seam", glyph: "bleed-out" },
  "pits-lumps": { words: "Pits, lumps", glyph: "pitting" },
  "finger-rack-mark": { words: "Finger, rack mark", glyph: "handling" },
} as const satisfies Record<string, { words: string; glyph: ShelfClass }>;
export type Symptom = keyof typeof SYMPTOMS;
export const SYMPTOM_KEYS = Object.keys(SYMPTOMS) as [Symptom, ...Symptom[]];

export const BASE_METALS = [
  "steel",
  "stainless",
  "iron",
  "brass",
  "bronze",
  "copper",
  "nickel-silver",
  "nickel",
  "zinc",
  "aluminium",
  "silver",
  "gold",
  "pewter",
  "other",
] as const;
export type BaseMetal = (typeof BASE_METALS)[number];

export const BASE_METAL_TITLES: Record<BaseMetal, string> = {
  steel: "Steel",
  stainless: "Stainless steel",
  iron: "Cast iron",
  brass: "Brass",
  bronze: "Bronze",
  copper: "Copper",
  "nickel-silver": "Nickel silver",
  nickel: "Nickel",
  zinc: "Zinc die cast",
  aluminium: "Aluminium",
  silver: "Silver",
  gold: "Gold alloy",
  pewter: "Pewter",
  other: "Another metal",
};

export const METHODS = ["bath", "brush"] as const;
export type Method = (typeof METHODS)[number];
export const METHOD_TITLES: Record<Method, string> = { bath: "Bath", brush: "Brush" };

/** Where the fault was seen. Cost depends on it above all. */
export const STAGES_FOUND = ["at-strike", "after-final-plate", "returned"] as const;
export type StageFound = (typeof STAGES_FOUND)[number];
export const STAGE_TITLES: Record<StageFound, string> = {
  "at-strike": "At the strike",
  "after-final-plate": "After the final plate",
  returned: "Returned by the customer",
};

/** How sure a person is of a call: a notch on a three-notch dial. */
export const SURENESS = [1, 2, 3] as const;
export type Sureness = (typeof SURENESS)[number];
export const SURENESS_TITLES: Record<Sureness, string> = { 1: "A guess", 2: "Fairly sure", 3: "Certain" };

/** What is to be done with the part (rework, scrap, concession, regrade as ISO 9000 defines them). */
export const DISPOSITIONS = ["rework", "scrap", "concession", "regrade"] as const;
export type Disposition = (typeof DISPOSITIONS)[number];
export const DISPOSITION_TITLES: Record<Disposition, string> = {
  rework: "Rework",
  scrap: "Scrap",
  concession: "Concession",
  regrade: "Regrade",
};

/** What the re-strike showed. */
export const OUTCOMES = ["sound", "same-fault", "another-fault"] as const;
export type Outcome = (typeof OUTCOMES)[number];
export const OUTCOME_TITLES: Record<Outcome, string> = {
  sound: "Sound",
  "same-fault": "Same fault",
  "another-fault": "Another fault",
};

/** How a case ended. `released` is a false alarm: the part was sound all along. */
export const CLOSINGS = ["sound", "scrap", "concession", "regrade", "released"] as const;
export type Closing = (typeof CLOSINGS)[number];

export const STATION_KINDS = ["clean", "rinse", "activate", "strike", "inspect", "plate", "finish"] as const;
export type StationKind = (typeof STATION_KINDS)[number];

export const ROLES = ["plater", "trainee", "senior", "owner"] as const;
export type Role = (typeof ROLES)[number];
export const ROLE_TITLES: Record<Role, string> = {
  plater: "Plater",
  trainee: "Trainee",
  senior: "Senior tech",
  owner: "Owner",
};

/** Limits that forms, routes and columns share. */
export const LIMITS = {
  photosPerSnap: 6,
  photoBytes: 32 * 1024 * 1024,
  photoPixels: 60_000_000,
  noteChars: 2000,
  nameChars: 120,
  quantity: 100_000,
  minutes: 24 * 60,
} as const;
