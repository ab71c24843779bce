import { box, type Shape } from "./shape";

const BODY = 0.3;
const COLLAR = 0.42;
const TIP = 0.17;

/** A turned pin, lying: knurled body, collar, tip. */
export const pin: Shape = {
  form: "round",
  halfWidth: 1.28,
  halfHeight: 0.42,
  wall: 0,
  distance: (x, y) =>
    Math.min(
      box(x + 0.55, y, 0.62, BODY, 0.04),
      box(x - 0.3, y, 0.36, COLLAR, 0.05),
      box(x - 0.86, y, 0.42, TIP, 0.13),
    ),
  relief: (x, y, slope) => {
    const radius = x < -0.06 ? BODY : x < 0.66 ? COLLAR : TIP;
    const across = Math.max(-1, Math.min(1, y / radius));
    slope.y += across * 0.9;
    if (x < -0.12 && x > -1.05) {
      const slant = Math.sin((x + y * 0.5) * 64) + Math.sin((x - y * 0.5) * 64);
      slope.x += slant * 0.15;
    } else if (x > 0.02 && x < 0.6) {
      slope.x += Math.max(-1, Math.min(1, Math.sin((x - 0.02) * 32.5) * 3)) * 0.12;
    }
  },
  recess: (x, y) => Math.min(box(x - 0.72, y, 0.1, 0.3, 0.03), box(x + 1.02, y, 0.05, 0.3, 0.02)),
  seam: (x) => x - 0.3,
};
