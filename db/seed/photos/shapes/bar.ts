import { bell } from "../curves";
import { box, circle, cut, type Shape } from "./shape";

/** A bus bar with three bolt holes and a lapped joint. */
export const bar: Shape = {
  form: "flat",
  halfWidth: 1.3,
  halfHeight: 0.4,
  wall: 0.06,
  distance: (x, y) => {
    const holed = cut(box(x, y, 1.3, 0.4, 0.06), circle(Math.abs(x) - 1.02, y, 0.13));
    return cut(holed, circle(x + 0.62, y, 0.13));
  },
  relief: (x, y, slope) => {
    slope.x += x * 0.06 + bell(x - 0.22, 0.02) * 0.34;
    slope.y += y * 0.14;
  },
  recess: (x, y) => Math.min(circle(x + 1.02, y, 0.13), circle(x + 0.62, y, 0.13)),
  seam: (x) => x - 0.22,
};
