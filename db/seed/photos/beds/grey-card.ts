import { ramp } from "../curves";
import { box } from "../shapes/shape";
import type { Frame } from "../frame";

/** Card reflectance in linear light: the photographers' 18 % grey (common practice), and its white border. */
const GREY = 0.18;
const WHITE = 0.72;
const HALF = 0.082;

/** Lays the card into the lower right corner. Returns the grey field's corners as shares of the photo's width and height. */
export function drawGreyCard(frame: Frame): [number, number][] {
  const { width, height, colour, partMask } = frame;
  const side = Math.min(width, height);
  const middleX = width - side * 0.125;
  const middleY = height - side * 0.115;
  const tilt = 0.05;
  const pixel = 1 / side;
  const toCard = (column: number, row: number): [number, number] => {
    const dx = (column + 0.5 - middleX) / side;
    const dy = (row + 0.5 - middleY) / side;
    return [dx + dy * tilt, dy - dx * tilt];
  };
  for (let row = Math.floor(middleY - side * 0.13); row < height; row++) {
    for (let column = Math.floor(middleX - side * 0.13); column < width; column++) {
      const at = row * width + column;
      const [x, y] = toCard(column, row);
      const shadow = 1 - 0.35 * ramp(0.02, -0.01, box(x - 0.006, y - 0.009, HALF, HALF, 0.004));
      const card = ramp(pixel, -pixel, box(x, y, HALF, HALF, 0.004));
      const grey = ramp(pixel, -pixel, box(x, y, HALF * 0.84, HALF * 0.84, 0));
      const level = WHITE + (GREY - WHITE) * grey;
      if (card > 0.5) partMask[at] = 0;
      for (let channel = 0; channel < 3; channel++) {
        const under = (colour[at * 3 + channel] ?? 0) * shadow;
        colour[at * 3 + channel] = under + (level - under) * card;
      }
    }
  }
  const inner = HALF * 0.78;
  const corners = [
    [-inner, -inner],
    [inner, -inner],
    [inner, inner],
    [-inner, inner],
  ] as const;
  return corners.map(([x, y]) => [
    (middleX + (x - y * tilt) * side) / width,
    (middleY + (y + x * tilt) * side) / height,
  ]);
}
