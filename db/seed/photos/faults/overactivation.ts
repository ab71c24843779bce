import { ramp } from "../curves";
import { surveyPart } from "../survey";
import { tint, type Fault } from "../surface";

/** Etched too far: loose dark smut lies under the copper in sooty clouds, heavier toward the edges, with an etched grain. */
export const overactivation: Fault = ({ shape, noise, amount, reach }) => {
  const scale = 1.35 / reach;
  const clouds = surveyPart(shape, (x, y, edge) => {
    const pull = noise.value(x * scale, y * scale, 130) - 0.5;
    return noise.cloud(x * scale + pull, y * scale * 1.25 - pull, 131, 4) + 0.13 * ramp(-0.3 * reach, 0, edge);
  });
  const from = clouds.levelFor(Math.min(0.96, 0.88 * amount));
  const full = clouds.levelFor(0.05 * amount);
  return ({ x, y }, surface) => {
    const soot = noise.cloud(x * 14, y * 14, 136, 3) - 0.5;
    const at = ramp(from, full, clouds.at(x, y) + soot * 0.16);
    const grain = noise.value(x * 85, y * 85, 139);
    surface.dark = Math.max(surface.dark, Math.min(0.92, at * (0.78 + 0.3 * grain)));
    // The thin margin is copper dulled to brown before it turns black.
    tint(surface, 0.4, 0.2, 0.15, ramp(0, 0.5, at) * 0.75);
    surface.copper -= at * 0.25;
    surface.gloss *= 1 - at * 0.85;
    surface.rough += at * 0.75;
  };
};
