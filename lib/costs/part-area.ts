import { InputError, requirePositive } from "@/lib/input-error";

/** Shapes whose plated area follows from a few lengths; `typed` when somebody knows the area itself. */
export const AREA_SHAPES = ["typed", "plate", "rod", "tube", "box", "disc", "sphere"] as const;
export type AreaShape = (typeof AREA_SHAPES)[number];
export type SimpleShape = Exclude<AreaShape, "typed">;

export const AREA_SHAPE_TITLES: Record<AreaShape, string> = {
  typed: "I know the area",
  plate: "Plate, both sides",
  rod: "Bar or rod",
  tube: "Tube, in and out",
  box: "Box or block",
  disc: "Disc, both faces",
  sphere: "Ball",
};

export const SHAPE_LENGTHS = ["length", "width", "height", "diameter", "inside"] as const;
export type ShapeLength = (typeof SHAPE_LENGTHS)[number];
export const SHAPE_LENGTH_TITLES: Record<ShapeLength, string> = {
  length: "Length",
  width: "Width",
  height: "Height",
  diameter: "Diameter",
  inside: "Inside diameter",
};

/** The lengths that each shape asks for, in the order in which they are asked. */
export const LENGTHS_OF: Record<SimpleShape, readonly ShapeLength[]> = {
  plate: ["length", "width"],
  rod: ["diameter", "length"],
  tube: ["diameter", "inside", "length"],
  box: ["length", "width", "height"],
  disc: ["diameter"],
  sphere: ["diameter"],
};

/** The formula as it stands beside the drawing. l length, w width, h height, d diameter, i inside diameter. */
export const AREA_FORMULAS: Record<SimpleShape, string> = {
  plate: "2 × l × w, edges left out",
  rod: "π × d × l + 2 × π/4 × d², both ends in",
  tube: "π × (d + i) × l + 2 × π/4 × (d² − i²), both ends in",
  box: "2 × (l × w + l × h + w × h)",
  disc: "2 × π/4 × d², edge left out",
  sphere: "π × d²",
};

/** No side is longer: beyond it is a slip of the keyboard. Of any length, cm. */
export const LONGEST_CM = 10_000;
const CM2_PER_DM2 = 100;

/**
 * Plated area of one part of a simple shape, dm², from its lengths in cm. Source: plane and solid geometry.
 * Throws `InputError` naming the length that is missing, not above 0 or absurd; for a tube also when the inside is not
 * smaller than the outside.
 *
 * Example: a plate of 10 × 5 cm has 1 dm² on its two sides.
 */
export function partAreaDm2(shape: SimpleShape, lengthsCm: Readonly<Partial<Record<ShapeLength, number>>>): number {
  const of = (name: ShapeLength) => requirePositive(name, lengthsCm[name] ?? NaN, LONGEST_CM);
  return areaCm2(shape, of) / CM2_PER_DM2;
}

function areaCm2(shape: SimpleShape, of: (name: ShapeLength) => number): number {
  switch (shape) {
    case "plate":
      return 2 * of("length") * of("width");
    case "rod":
      return Math.PI * of("diameter") * of("length") + 2 * circle(of("diameter"));
    case "tube":
      return tubeCm2(of("diameter"), of("inside"), of("length"));
    case "box":
      return 2 * (of("length") * of("width") + of("length") * of("height") + of("width") * of("height"));
    case "disc":
      return 2 * circle(of("diameter"));
    case "sphere":
      return Math.PI * of("diameter") ** 2;
  }
}

function tubeCm2(outside: number, inside: number, length: number): number {
  if (inside >= outside) throw new InputError("inside", "The inside is smaller than the outside.");
  return Math.PI * (outside + inside) * length + 2 * (circle(outside) - circle(inside));
}

const circle = (diameter: number) => (Math.PI / 4) * diameter ** 2;
