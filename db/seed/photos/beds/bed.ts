import type { Noise } from "../noise";

/** The colour under the part at a point of the photo. */
export type Bed = (place: BedPlace, colour: BedColour) => void;

/** A point in screen units; `down` is 0 at the top of the photo, 1 at the bottom. */
export type BedPlace = { x: number; y: number; down: number };

/** Linear light; `mirror` is how much the bed throws back of the part, 0 to 1. */
export type BedColour = { red: number; green: number; blue: number; mirror: number };

/** What a bed is made from, once a photo. */
export type BedScene = { noise: Noise; random: () => number; wet: boolean };
