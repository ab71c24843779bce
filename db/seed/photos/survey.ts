import type { Shape } from "./shapes/shape";

/** A field over the plane, read from a grid; outside the grid it keeps its edge value. */
export type Field = (x: number, y: number) => number;

/**
 * Works a slow field out once on a grid over -halfWidth..halfWidth, -halfHeight..halfHeight and reads between its entries, so that a pixel
 * costs four look-ups however many octaves the field has. `steps` entries a unit.
 */
export function surveyField(halfWidth: number, halfHeight: number, steps: number, field: Field): Field {
  const columns = Math.ceil(halfWidth * 2 * steps) + 2;
  const rows = Math.ceil(halfHeight * 2 * steps) + 2;
  const grid = new Float32Array(columns * rows);
  for (let row = 0; row < rows; row++) {
    for (let column = 0; column < columns; column++) {
      grid[row * columns + column] = field(column / steps - halfWidth, row / steps - halfHeight);
    }
  }
  const lastX = columns - 1.001;
  const lastY = rows - 1.001;
  return (x, y) => {
    const wideX = (x + halfWidth) * steps;
    const wideY = (y + halfHeight) * steps;
    const fineX = wideX < 0 ? 0 : wideX > lastX ? lastX : wideX;
    const fineY = wideY < 0 ? 0 : wideY > lastY ? lastY : wideY;
    const column = fineX | 0;
    const row = fineY | 0;
    const right = fineX - column;
    const at = row * columns + column;
    const a = grid[at] ?? 0;
    const c = grid[at + columns] ?? 0;
    const above = a + ((grid[at + 1] ?? 0) - a) * right;
    const below = c + ((grid[at + columns + 1] ?? 0) - c) * right;
    return above + (below - above) * (fineY - row);
  };
}

/** The same along one line from 0 to `end`. */
export function surveyLine(end: number, steps: number, field: (at: number) => number): (at: number) => number {
  const line = Float32Array.from({ length: Math.ceil(end * steps) + 2 }, (_, i) => field(i / steps));
  return (at) => {
    const fine = at * steps;
    const index = fine | 0;
    const low = line[index] ?? 0;
    return low + ((line[index + 1] ?? low) - low) * (fine - index);
  };
}

/** Entries a unit for a field over a part: finer than the finest octave that a fault uses. */
export const FINE = 60;

/** A field over a part, with the levels that a fault cuts it at. */
export type Survey = {
  at: Field;
  /** The value that `share` (0 to 1) of the part's face exceeds, good to about two points, so that a fault covers what it should. */
  levelFor(share: number): number;
};

const STEPS = 44;

/** Surveys a field over a part; `edge` is the distance to the outline, below zero inside. */
export function surveyPart(shape: Shape, field: (x: number, y: number, edge: number) => number): Survey {
  const { halfWidth, halfHeight } = shape;
  const at = surveyField(halfWidth + 0.05, halfHeight + 0.05, FINE, (x, y) => field(x, y, shape.distance(x, y)));
  const found: number[] = [];
  for (let row = 0; row < STEPS; row++) {
    for (let column = 0; column < STEPS; column++) {
      const x = (((column + 0.5) / STEPS) * 2 - 1) * halfWidth;
      const y = (((row + 0.5) / STEPS) * 2 - 1) * halfHeight;
      if (shape.distance(x, y) < 0) found.push(at(x, y));
    }
  }
  found.sort((a, b) => b - a);
  const levelFor = (share: number) =>
    found[Math.min(found.length - 1, Math.max(0, Math.round(share * found.length)))] ?? Infinity;
  return { at, levelFor };
}
