import { ramp } from "./curves";
import { surveyField } from "./survey";
import { scatter, type Disc } from "./scatter";
import { placeOn, type FaultScene, type Paint, type Surface } from "./surface";

/** What water adds to a point: 1 inside a drop, where the light flashes, else 0. */
export type Water = { drop: number };

/** Drops and a draining sheet on the part: a drop bends the light, the sheet darkens and smooths the face. */
export function wetLook(scene: FaultScene, water: Water): Paint {
  const { shape, noise, reach } = scene;
  const near = scatter(dropsOn(scene), 0.01);
  const sheetFrom = 0.56;
  const sheets = surveyField(
    shape.halfWidth,
    shape.halfHeight,
    40,
    (x, y) => noise.cloud((x * 1.1) / reach, (y * 0.8) / reach, 40, 2) + 0.09 * y,
  );
  return ({ x, y }, surface) => {
    const sheet = sheets(x, y);
    const wet = ramp(sheetFrom, sheetFrom + 0.012, sheet);
    if (wet > 0) {
      surface.gloss += (0.72 - surface.gloss) * wet * 0.35;
      surface.rough *= 1 - 0.5 * wet;
      const shade = 1 - 0.07 * wet;
      surface.red *= shade;
      surface.green *= shade;
      surface.blue *= shade;
    }
    water.drop = 0;
    const discs = near(x, y);
    for (let i = 0; i < discs.length; i++) {
      const disc = discs[i];
      if (!disc) continue;
      const dx = (x - disc.x) / disc.radius;
      const dy = (y - disc.y) / disc.radius;
      const away = dx * dx + dy * dy;
      if (away > 1) continue;
      water.drop = 1;
      lens(surface, dx, dy, away);
    }
  };
}

/** A drop is a lens: dark on the lit side, bright opposite, with a dark outline. */
function lens(surface: Surface, dx: number, dy: number, away: number): void {
  const shade = 0.9 + 0.16 * (dx * 0.5 + dy * 0.8) - 0.22 * ramp(0.72, 1, away);
  surface.red *= shade;
  surface.green *= shade;
  surface.blue *= shade;
  surface.tiltX = surface.tiltX * 0.3 + dx * 0.58;
  surface.tiltY = surface.tiltY * 0.3 + dy * 0.58;
  surface.gloss = Math.max(surface.gloss, 0.55);
}

function dropsOn(scene: FaultScene): Disc[] {
  const { random, reach } = scene;
  const count = 5 + Math.floor(random() * 12);
  return Array.from({ length: count }, () => {
    const at = placeOn(scene, 0.02);
    return { ...at, radius: (0.012 + random() * random() * 0.042) * Math.max(0.8, reach), kind: random() };
  });
}
