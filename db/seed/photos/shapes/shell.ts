import { bell, ramp } from "../curves";
import { box, circle, cut, type Shape } from "./shape";

/** A connector shell seen end on: a ring with two keyways and a stepped face. */
export const shell: Shape = {
  form: "turned",
  halfWidth: 0.9,
  halfHeight: 0.9,
  wall: 0.05,
  distance: (x, y) => {
    const ring = cut(circle(x, y, 0.9), circle(x, y, 0.5));
    const keyed = cut(ring, box(x, y + 0.52, 0.075, 0.1, 0.02));
    return cut(keyed, box((x - y) * 0.7071, (x + y) * 0.7071 - 0.52, 0.05, 0.08, 0.02));
  },
  relief: (x, y, slope) => {
    const radius = Math.sqrt(x * x + y * y) + 1e-6;
    const ridge = bell(radius - 0.7, 0.028) * (radius > 0.7 ? 0.6 : -0.6);
    const inner = ramp(0.58, 0.55, radius) * 0.35;
    slope.x += x * 0.1 + (x / radius) * (ridge - inner);
    slope.y += y * 0.1 + (y / radius) * (ridge - inner);
  },
  recess: (x, y) => circle(x, y, 0.5),
  seam: (x, y) => circle(x, y, 0.7),
};
