import type { BaseMetal, ShelfClass } from "@/lib/cases/case-words";

/** The parts that the demo shop plates. Each has its file in `shapes/`. */
export const PART_SHAPES = ["coupon", "shell", "bracket", "pin", "rotor", "bar", "lug", "spoon"] as const;
export type PartShape = (typeof PART_SHAPES)[number];

/** What the part lies on when it is photographed. */
export const PART_BEDS = ["tray", "towel", "bench"] as const;
export type PartBed = (typeof PART_BEDS)[number];

/** Everything that decides a rendered photo: the same spec gives the same bytes. */
export type PartSpec = {
  shape: PartShape;
  fault: ShelfClass;
  baseMetal: BaseMetal;
  /** Whole number. The same part keeps its seed from the snap to the re-strike. */
  seed: number;
  width: number;
  height: number;
  bed: PartBed;
  /** An 18 % grey card in the lower right corner. */
  greyCard?: boolean;
  /** A gloved finger that steadies the part. */
  glove?: boolean;
  /** Water still on the part; true unless said otherwise. */
  wet?: boolean;
  /** 1 shows the whole part, 2.5 is a close-up. */
  zoom?: number;
  /** The point of the part in the middle of the frame, in half heights of a disc from its centre. */
  centre?: { x: number; y: number };
  /** How bad the fault is, 0.3 (faint) to 1.3 (bad); 1 unless said otherwise. */
  amount?: number;
  /** warmth -1 (cool) to 1 (warm) is what the camera failed to correct; exposure 1 is right, 0.7 is dark. */
  light?: { warmth: number; exposure: number };
};

/** Refuses a spec that cannot be rendered. Throws RangeError naming the field. */
export function checkSpec(spec: PartSpec): void {
  for (const [field, value] of [
    ["width", spec.width],
    ["height", spec.height],
  ] as const) {
    if (!Number.isInteger(value) || value < 16 || value > 8192) {
      throw new RangeError(`${field} must be a whole number from 16 to 8192, got ${value}`);
    }
  }
  if (!Number.isInteger(spec.seed)) throw new RangeError(`seed must be a whole number, got ${spec.seed}`);
  const amount = spec.amount ?? 1;
  if (!(amount >= 0.3 && amount <= 1.3)) throw new RangeError(`amount must be 0.3 to 1.3, got ${amount}`);
  const zoom = spec.zoom ?? 1;
  if (!(zoom >= 0.3 && zoom <= 8)) throw new RangeError(`zoom must be 0.3 to 8, got ${zoom}`);
}
