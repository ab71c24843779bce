import { bell } from "../curves";
import { box, circle, cut, type Shape } from "./shape";

/** A stamped bracket: a plate with two holes, a slot and a lap seam below it. */
export const bracket: Shape = {
  form: "flat",
  halfWidth: 1.12,
  halfHeight: 0.66,
  wall: 0.05,
  distance: (x, y) => {
    const plate = box(x, y, 1.12, 0.66, 0.16);
    const holed = cut(plate, circle(Math.abs(x) - 0.8, y + 0.3, 0.15));
    return cut(holed, box(x, y + 0.2, 0.46, 0.12, 0.12));
  },
  relief: (x, y, slope) => {
    slope.x += x * 0.08;
    slope.y += y * 0.12 + bell(y - 0.14, 0.022) * 0.34;
  },
  recess: (x, y) => Math.min(box(x, y + 0.2, 0.46, 0.12, 0.12), circle(x - 0.8, y + 0.3, 0.15)),
  seam: (_x, y) => y - 0.14,
};
