import { bell, ramp } from "../curves";
import { scatter, type Disc } from "../scatter";
import { lay, placeOn, tint, type Fault, type Paint, type Surface } from "../surface";

/** Poor rinsing or slow drying: tide rings with a pale middle, and tear tracks that ran down and stopped in a bead. */
export const waterSpots: Fault = (scene) => {
  const { noise, random, amount, reach } = scene;
  const rings: Disc[] = [];
  const count = Math.round(7 + 6 * amount);
  for (let i = 0; i < count; i++) {
    rings.push({ ...placeOn(scene, 0.02), radius: (0.055 + random() * random() * 0.22) * reach, kind: random() });
  }
  const near = scatter(rings, 0.1);
  const strength = 0.45 + 0.4 * amount;
  const tracks = tearTracks(rings.filter((ring) => ring.kind > 0.45).slice(0, 5), strength);
  return (point, surface) => {
    const { x, y } = point;
    const discs = near(x, y);
    const wobble = discs.length > 0 ? (noise.cloud(x * 7, y * 7, 140, 2) - 0.5) * 0.05 : 0;
    for (let i = 0; i < discs.length; i++) {
      const disc = discs[i];
      if (!disc) continue;
      const dx = x - disc.x;
      const dy = y - disc.y;
      ring(surface, Math.sqrt(dx * dx + dy * dy * (0.8 + 0.5 * disc.kind)) - disc.radius + wobble, strength);
    }
    tracks(point, surface);
  };
};

/** One tide mark: a thin brown outer line, a fainter one inside it, a pale dried middle. */
function ring(surface: Surface, outside: number, strength: number): void {
  if (outside > 0.04) return;
  const line = bell(outside, 0.015) + 0.4 * bell(outside + 0.042, 0.016);
  lay(surface, 0.2, 0.105, 0.075, Math.min(0.86, line * strength * 0.9));
  if (outside < 0) {
    tint(surface, 0.76, 0.54, 0.46, 0.62 * strength * ramp(0, -0.03, outside));
    surface.gloss *= 0.85;
  }
}

function tearTracks(starts: readonly Disc[], strength: number): Paint {
  return ({ x, y }, surface) => {
    for (let i = 0; i < starts.length; i++) {
      const start = starts[i];
      if (!start) continue;
      const fall = y - start.y - start.radius * 0.9;
      const length = 0.25 + 0.6 * start.kind;
      if (fall < 0 || fall > length + 0.08) continue;
      const across = Math.abs(x - start.x - Math.sin(y * 5 + start.x * 9) * 0.025);
      if (across > 0.12) continue;
      const half = 0.022 + 0.016 * ramp(length * 0.7, length, fall);
      const end = Math.sqrt(across * across + (fall - length) * (fall - length));
      const line = fall < length ? bell(across - half, 0.011) : bell(end - half, 0.011);
      lay(surface, 0.22, 0.12, 0.085, line * 0.75 * strength);
      if (across < half && fall < length) tint(surface, 0.76, 0.54, 0.46, 0.4 * strength);
    }
  };
}
