import { ramp } from "../curves";
import { tint, type Fault } from "../surface";

/** Copper by displacement, without current: dull, spongy and loose all over; a thumb has wiped it off in a streak. */
export const immersionDeposit: Fault = (scene) => {
  const { noise, random, amount, reach, shape } = scene;
  const angle = (random() - 0.5) * 1.2 + 0.5;
  const alongX = Math.cos(angle);
  const alongY = Math.sin(angle);
  // A ring has no middle: the thumb goes across its rim instead.
  const middle = shape.distance(0, 0) > 0 ? { x: 0, y: 0.7 } : { x: 0, y: 0 };
  const half = (0.15 + 0.08 * amount) * reach;
  const length = 0.75 * reach * (0.7 + 0.4 * amount);
  return ({ x, y }, surface) => {
    const sponge = noise.cloud(x * 24, y * 24, 190, 3);
    const patch = noise.cloud(x * 3, y * 3, 193, 2);
    const loose = 0.5 + 0.55 * sponge + 0.35 * (patch - 0.5);
    surface.red = 0.53 * loose;
    surface.green = 0.2 * loose * (0.85 + 0.3 * sponge);
    surface.blue = 0.115 * loose * (0.85 + 0.3 * sponge);
    surface.gloss *= 0.12;
    surface.rough += 0.85;
    const dx = x - middle.x;
    const dy = y - middle.y;
    const along = dx * alongX + dy * alongY;
    const across = dy * alongX - dx * alongY + along * along * 0.12;
    const streak = (noise.value(along * 2.2, across * 58, 195) - 0.5) * 0.2;
    const ends = length + (noise.value(across * 26, 3, 196) - 0.5) * 0.34;
    const wiped =
      ramp(half * 1.15, half * 0.7, Math.abs(across) + streak * 0.5) * ramp(ends, ends - 0.22, Math.abs(along));
    surface.copper -= Math.min(0.96, wiped * (0.9 + streak));
    surface.gloss += wiped * 0.35;
    surface.rough -= wiped * 0.7;
    // The powder heaps up dark where the wipe stopped.
    const heap =
      ramp(ends - 0.05, ends + 0.03, along) *
      ramp(ends + 0.2, ends + 0.05, along) *
      ramp(half * 1.2, half * 0.5, Math.abs(across));
    tint(surface, 0.24, 0.09, 0.05, heap * 0.7);
  };
};
