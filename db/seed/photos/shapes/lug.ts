import { ramp } from "../curves";
import { box, circle, cut, type Shape } from "./shape";

/** A cable lug: a flat palm with a bolt hole, and a round barrel. */
export const lug: Shape = {
  form: "flat",
  halfWidth: 1.2,
  halfHeight: 0.52,
  wall: 0.04,
  distance: (x, y) => {
    const palm = Math.min(circle(x + 0.68, y, 0.52), box(x + 0.3, y, 0.4, 0.5, 0.12));
    const neck = box(x - 0.2, y, 0.3, 0.44, 0.1);
    const barrel = box(x - 0.72, y, 0.48, 0.4, 0.05);
    return cut(Math.min(palm, neck, barrel), circle(x + 0.66, y, 0.2));
  },
  relief: (x, y, slope) => {
    const barrel = ramp(0.05, 0.3, x);
    slope.y += y * 0.1 * (1 - barrel) + Math.max(-1, Math.min(1, y / 0.4)) * 0.86 * barrel;
    slope.x += x * 0.05 - Math.max(0, 1 - Math.abs(x - 0.16) / 0.16) * 0.36;
  },
  recess: (x, y) => Math.min(circle(x + 0.66, y, 0.2), box(x - 1.18, y, 0.06, 0.4, 0.04)),
  seam: (x) => x - 0.3,
};
