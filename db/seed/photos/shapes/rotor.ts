import { bell } from "../curves";
import { circle, cut, type Shape } from "./shape";

const TEETH = 14;
const HOLES = Array.from({ length: 5 }, (_, i) => {
  const angle = i * ((2 * Math.PI) / 5) + 0.3;
  return { x: 0.53 * Math.cos(angle), y: 0.53 * Math.sin(angle) };
});

function holes(x: number, y: number, count: number): number {
  let nearest = Infinity;
  for (let i = 0; i < count; i++) {
    const hole = HOLES[i];
    if (hole) nearest = Math.min(nearest, circle(x - hole.x, y - hole.y, 0.1));
  }
  return nearest;
}

/** A small toothed wheel with a bore and five lightening holes. */
export const rotor: Shape = {
  form: "turned",
  halfWidth: 0.92,
  halfHeight: 0.92,
  wall: 0.045,
  distance: (x, y) => {
    const wave = Math.cos(Math.atan2(y, x) * TEETH) * 3;
    const rim = (circle(x, y, 0.84) - 0.07 * Math.max(-1, Math.min(1, wave))) * 0.75;
    return cut(cut(rim, circle(x, y, 0.25)), holes(x, y, HOLES.length));
  },
  relief: (x, y, slope) => {
    const radius = Math.sqrt(x * x + y * y) + 1e-6;
    const step = bell(radius - 0.37, 0.025) * 0.4 - bell(radius - 0.72, 0.03) * 0.4;
    slope.x += x * 0.1 + (x / radius) * step;
    slope.y += y * 0.1 + (y / radius) * step;
  },
  recess: (x, y) => Math.min(circle(x, y, 0.25), holes(x, y, 3)),
  seam: (x, y) => circle(x, y, 0.37),
};
