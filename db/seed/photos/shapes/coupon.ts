import { bell } from "../curves";
import { box, circle, cut, type Shape } from "./shape";

/** A test disc with a hanging hole and a pressed-in centre. */
export const coupon: Shape = {
  form: "turned",
  halfWidth: 0.88,
  halfHeight: 0.88,
  wall: 0.035,
  distance: (x, y) => cut(circle(x, y, 0.88), circle(x, y + 0.68, 0.085)),
  relief: (x, y, slope) => {
    const radius = Math.sqrt(x * x + y * y) + 1e-6;
    const step = bell(radius - 0.34, 0.022) * 0.34;
    slope.x += x * 0.11 + (x / radius) * step;
    slope.y += y * 0.11 + (y / radius) * step;
  },
  recess: (x, y) => Math.min(circle(x, y + 0.68, 0.11), box(x - 0.12, y - 0.16, 0.26, 0.07, 0.05)),
  seam: (x, y) => circle(x, y, 0.34),
};
