/** How a part was made decides how its face is worked: turned has rings, flat is linished lengthways, round is a lying cylinder. */
export type Form = "turned" | "flat" | "round";

/** A part's geometry, in its own frame: x to the right, y down, about -1.3 to 1.3. */
export type Shape = {
  form: Form;
  halfWidth: number;
  halfHeight: number;
  /** How thick the part looks where its side wall shows; 0 for round parts. */
  wall: number;
  /** Distance to the outline: below zero inside. */
  distance(x: number, y: number): number;
  /** Slope of the face beside its edge bevel; writes into `slope`. */
  relief(x: number, y: number, slope: Slope): void;
  /** Distance to what the current reaches badly: a recess, a hole or the contact point. */
  recess(x: number, y: number): number;
  /** Distance from the seam, above zero on the side that weeps. */
  seam(x: number, y: number): number;
};

export type Slope = { x: number; y: number };

export function circle(x: number, y: number, radius: number): number {
  return Math.sqrt(x * x + y * y) - radius;
}

/** A rectangle of half sizes `halfWidth` and `halfHeight` with rounded corners. */
export function box(x: number, y: number, halfWidth: number, halfHeight: number, corner: number): number {
  const overX = Math.abs(x) - halfWidth + corner;
  const overY = Math.abs(y) - halfHeight + corner;
  const outX = overX > 0 ? overX : 0;
  const outY = overY > 0 ? overY : 0;
  return Math.sqrt(outX * outX + outY * outY) + Math.min(Math.max(overX, overY), 0) - corner;
}

/** What is left of `solid` when `hole` is cut out. */
export function cut(solid: number, hole: number): number {
  return Math.max(solid, -hole);
}
