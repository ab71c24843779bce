import { bell, ramp } from "../curves";
import { surveyPart } from "../survey";
import { tint, type Fault } from "../surface";

/** The oxide was not taken off everywhere: copper comes thin, milky and patchy with soft edges, and flakes where it is thinnest. */
export const underactivation: Fault = ({ shape, noise, amount, reach }) => {
  const scale = 1.75 / reach;
  const patches = surveyPart(shape, (x, y) => {
    const pullX = noise.value(x * scale * 0.9, y * scale * 0.9, 120) - 0.5;
    const pullY = noise.value(x * scale * 0.9, y * scale * 0.9, 121) - 0.5;
    return noise.cloud(x * scale + pullX * 1.2, y * scale + pullY * 1.2, 122, 3);
  });
  const hazeFrom = patches.levelFor(Math.min(0.92, 0.72 * amount));
  const hazeFull = patches.levelFor(0.24 * amount);
  const bareFull = patches.levelFor(0.02 * amount);
  return (point, surface) => {
    const { x, y } = point;
    const speck = noise.cloud(x * 19, y * 19, 126, 2) - 0.5;
    const at = patches.at(x, y) + speck * 0.085;
    const haze = ramp(hazeFrom, hazeFull, at);
    if (haze <= 0) return;
    const thin = ramp(hazeFrom + 0.25 * (hazeFull - hazeFrom), bareFull, at);
    surface.copper -= Math.min(0.97, haze * 0.22 + thin * 0.76);
    // The milky bloom lies over copper and base metal alike.
    tint(surface, 0.66, 0.46, 0.385, haze * 0.6);
    surface.gloss *= 1 - 0.75 * haze;
    surface.rough += haze * 0.16;
    if (thin < 0.5) return;
    const flakes = noise.cloud((x * 10) / reach, (y * 10) / reach, 129, 2);
    const late = ramp(0.5, 0.8, thin);
    surface.copper -= ramp(0.57, 0.6, flakes) * late * surface.copper * 0.9;
    surface.dark = Math.max(surface.dark, bell(flakes - 0.575, 0.012) * late * 0.32);
  };
};
