import { bell, ramp } from "../curves";
import { tint, type Fault } from "../surface";

/** No current reached it: clean bare metal in and around recesses and contact points, with a thin brownish margin. */
export const noDeposit: Fault = (scene) => {
  const { shape, noise, amount, reach } = scene;
  const width = 0.13 * amount * reach;
  return ({ x, y }, surface) => {
    const away = shape.recess(x, y);
    if (away > 0.5) return;
    const outside = away - width + (noise.cloud(x * 5, y * 5, 170, 2) - 0.5) * 0.16 * reach;
    surface.copper -= ramp(0.035, -0.02, outside);
    const margin = bell(outside - 0.04, 0.035);
    tint(surface, 0.45, 0.2, 0.13, margin * 0.55);
    surface.gloss *= 1 - margin * 0.3;
  };
};
