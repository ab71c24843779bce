import { ramp } from "../curves";
import { box, circle, type Shape } from "./shape";

/** A serving spoon, a customer's own piece for restoring: bowl, stem and a joint between them. */
export const spoon: Shape = {
  form: "flat",
  halfWidth: 1.3,
  halfHeight: 0.42,
  wall: 0.02,
  distance: (x, y) => {
    const bowl = circle((x + 0.72) * 0.74, y, 0.42);
    const stem = box(x - 0.35, y, 0.9, 0.055 + 0.075 * ramp(0.1, 1.2, x), 0.05);
    const shoulder = box(x + 0.2, y, 0.16, 0.1, 0.08);
    return Math.min(bowl, stem, shoulder) * 0.95;
  },
  relief: (x, y, slope) => {
    const inBowl = ramp(-0.1, -0.22, x);
    slope.x -= (x + 0.72) * 0.85 * inBowl;
    slope.y += (inBowl > 0.5 ? -y * 1.05 : y * 3.2) * Math.max(inBowl, ramp(-0.1, 0, x));
  },
  recess: (x, y) => Math.min(circle(x + 0.72, y, 0.16), circle(x - 1.16, y, 0.1)),
  seam: (x) => -(x + 0.18),
};
