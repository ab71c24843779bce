import { ramp } from "../curves";
import { surveyPart } from "../survey";
import { tint, type Fault } from "../surface";

/** Too much voltage: edges and corners that face the anode turn brick red, then dark and powdery; the middle stays good. */
export const burning: Fault = ({ noise, random, amount, shape, reach }) => {
  const side = random() * 6.28;
  const towardX = Math.cos(side) / shape.halfWidth;
  const towardY = Math.sin(side) / shape.halfHeight;
  const current = surveyPart(shape, (x, y, edge) => {
    const outward = Math.hypot(x / shape.halfWidth, y / shape.halfHeight);
    const facing = 0.22 * (x * towardX + y * towardY);
    return (
      1.5 * ramp(-0.42 * reach, 0.02, edge) * (0.3 + 0.7 * outward) +
      facing +
      0.9 * (noise.cloud(x * 5, y * 5, 160, 3) - 0.5)
    );
  });
  const from = current.levelFor(0.44 * Math.min(1.1, amount));
  const full = current.levelFor(0.17 * amount);
  return ({ x, y }, surface) => {
    const at = current.at(x, y);
    const near = ramp(from - 0.1, from + 0.5 * (full - from), at);
    if (near <= 0) return;
    const grain = noise.value(x * 90, y * 90, 165);
    const powder = ramp(from, full, at + (grain - 0.5) * 0.35);
    tint(surface, 0.4, 0.12, 0.07, near * 0.8);
    surface.dark = Math.max(surface.dark, powder * (0.8 + 0.15 * noise.value(x * 40, y * 40, 166)));
    surface.gloss *= 1 - near * 0.95;
    surface.rough += near * 0.5 + powder * 1.1;
  };
};
