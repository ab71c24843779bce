import { bell, mix, ramp } from "../curves";
import { rusts } from "../metals";
import { scatter, type Disc } from "../scatter";
import { surveyPart } from "../survey";
import { lay, placeOn, tint, type Fault, type Paint } from "../surface";

/** Left wet or in air: brown and iridescent bands; on iron and steel an orange bloom from the pores as well. */
export const oxidation: Fault = (scene) => {
  const tarnish = tarnishBands(scene);
  if (!rusts(scene.baseMetal)) return tarnish;
  const bloom = rustBloom(scene);
  return (point, surface) => {
    tarnish(point, surface);
    bloom(point, surface);
  };
};

/** Orange brown, brown, rose, violet, blue, straw and again brown: a thickening oxide film on copper (from memory). */
const BANDS = [
  [0.62, 0.33, 0.16],
  [0.42, 0.185, 0.085],
  [0.4, 0.15, 0.12],
  [0.29, 0.12, 0.22],
  [0.15, 0.19, 0.3],
  [0.36, 0.3, 0.13],
  [0.24, 0.115, 0.055],
  [0.15, 0.075, 0.045],
] as const;

const tarnishBands: Fault = (scene) => {
  const { shape, noise, amount, random, reach, baseMetal } = scene;
  const turn = random() * 6.28;
  const leanX = Math.cos(turn) * 0.16;
  const leanY = Math.sin(turn) * 0.16;
  const scale = 1.5 / reach;
  const film = surveyPart(shape, (x, y) => noise.cloud(x * scale, y * scale, 150, 4) + leanX * x + leanY * y);
  const share = rusts(baseMetal) ? 0.42 : 0.7;
  const from = film.levelFor(Math.min(0.92, share * amount));
  const full = film.levelFor(0.04);
  return ({ x, y }, surface) => {
    const at = (film.at(x, y) - from) / (full - from);
    if (at <= 0) return;
    const step = Math.min(BANDS.length - 1.001, at * (BANDS.length - 1));
    const index = Math.floor(step);
    const low = BANDS[index] ?? BANDS[0];
    const high = BANDS[index + 1] ?? BANDS[7];
    const part = step - index;
    const share = ramp(0, 0.16, at) * 0.88;
    lay(surface, mix(low[0], high[0], part), mix(low[1], high[1], part), mix(low[2], high[2], part), share);
    surface.gloss *= 1 - 0.25 * share;
  };
};

const rustBloom: Fault = (scene): Paint => {
  const { noise, random, amount, reach } = scene;
  const spots: Disc[] = [];
  for (let i = 0; i < Math.round(22 + 16 * amount); i++) {
    spots.push({ ...placeOn(scene, 0), radius: (0.015 + random() * random() * 0.11) * reach * amount, kind: random() });
  }
  const near = scatter(spots, 0.18);
  return ({ x, y }, surface) => {
    const discs = near(x, y);
    const wobble = discs.length > 0 ? (noise.cloud(x * 13, y * 13, 158, 3) - 0.5) * 0.12 : 0;
    for (let i = 0; i < discs.length; i++) {
      const disc = discs[i];
      if (!disc) continue;
      const dx = x - disc.x;
      const dy = y - disc.y - disc.radius * 0.3;
      const outside = Math.sqrt(dx * dx + dy * dy * 0.7) - disc.radius + wobble;
      if (outside > 0.1) continue;
      const core = ramp(0.02, -0.04, outside);
      tint(surface, 0.62, 0.24, 0.09, bell(Math.max(0, outside), 0.06) * 0.75);
      lay(surface, mix(0.46, 0.27, core), mix(0.16, 0.085, core), mix(0.04, 0.026, core), core * 0.92);
      surface.copper -= surface.copper * core * 0.7;
      surface.gloss *= 1 - core * 0.9;
      surface.rough += core * 0.5;
    }
  };
};
