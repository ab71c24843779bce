import { bell, ramp } from "../curves";
import { scatter, type Disc } from "../scatter";
import { surveyPart } from "../survey";
import { placeOn, tint, type Fault, type Paint } from "../surface";

/** After the tape test: torn patches lifted in a straight strip, lips curled up with a shadow under them, blisters beside it. */
export const peeling: Fault = (scene) => {
  const { shape, noise, random, amount, reach } = scene;
  const angle = (random() - 0.5) * 1.6;
  const alongX = Math.cos(angle);
  const alongY = Math.sin(angle);
  const middle = placeOn(scene, 0.1 * reach);
  const half = (0.2 + 0.12 * amount) * reach;
  const lifted = surveyPart(shape, (x, y) => {
    const across = Math.abs((x - middle.x) * -alongY + (y - middle.y) * alongX);
    const torn = noise.cloud((x * 4.2) / reach, (y * 4.2) / reach, 180, 3);
    return torn - 1.6 * ramp(half * 0.75, half * 1.1, across + (torn - 0.5) * 0.1);
  });
  const level = lifted.levelFor(0.12 * amount);
  const blisters = blisterField(scene);
  const step = 0.014;
  return (point, surface) => {
    const { x, y } = point;
    const at = lifted.at(x, y);
    // About the distance to the tear: the field climbs some 0.9 a unit of length at this fineness.
    const inside = ((at - level) * reach) / 1.1;
    blisters(point, surface);
    if (inside < -0.12) return;
    const tear = ramp(-0.004, 0.004, inside);
    surface.copper -= surface.copper * tear;
    const slopeX = (lifted.at(x + step, y) - at) / step;
    const slopeY = (lifted.at(x, y + step) - at) / step;
    const steep = Math.sqrt(slopeX * slopeX + slopeY * slopeY) + 1e-3;
    const lip = bell(inside + 0.022, 0.018) * (1 - tear);
    surface.tiltX -= (slopeX / steep) * lip * 0.75;
    surface.tiltY -= (slopeY / steep) * lip * 0.75;
    tint(surface, 0.92, 0.52, 0.4, lip * 0.55);
    if (inside > 0) surface.dark = Math.max(surface.dark, Math.exp(-inside * 34) * 0.7);
    else surface.dark = Math.max(surface.dark, bell(inside + 0.062, 0.016) * 0.22);
  };
};

const blisterField: Fault = (scene): Paint => {
  const { random, reach } = scene;
  const discs: Disc[] = Array.from({ length: 9 }, () => ({
    ...placeOn(scene, 0.06),
    radius: (0.02 + random() * 0.04) * reach,
    kind: random(),
  }));
  const near = scatter(discs, 0.01);
  return ({ x, y }, surface) => {
    const found = near(x, y);
    for (let i = 0; i < found.length; i++) {
      const disc = found[i];
      if (!disc) continue;
      const dx = (x - disc.x) / disc.radius;
      const dy = (y - disc.y) / disc.radius;
      const away = dx * dx + dy * dy;
      if (away > 1) continue;
      surface.tiltX += dx * 0.6;
      surface.tiltY += dy * 0.6;
    }
  };
};
