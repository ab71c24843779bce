import { bell, ramp } from "../curves";
import { scatter, type Disc } from "../scatter";
import { placeOn, tint, type Fault } from "../surface";

const MARGIN = 0.2;

/** The water film broke: bare islands with crisp scalloped edges, a dark rim, and copper that thins towards them. */
export const dewetting: Fault = (scene) => {
  const { noise, random, amount, reach } = scene;
  const islands: Disc[] = [];
  const count = 8 + Math.floor(random() * 6);
  for (let i = 0; i < count; i++) {
    const radius = (0.06 + random() * random() * 0.2) * reach * amount;
    const main = placeOn(scene, radius * 0.3);
    islands.push({ ...main, radius, kind: random() });
    for (let satellite = 0; satellite < 3; satellite++) {
      const turn = random() * 6.28;
      const away = radius * (1.25 + random() * 0.9);
      const x = main.x + Math.cos(turn) * away;
      const y = main.y + Math.sin(turn) * away;
      islands.push({ x, y, radius: (0.012 + random() * 0.03) * reach * amount, kind: random() });
    }
  }
  const near = scatter(islands, MARGIN);
  return (point, surface) => {
    const { x, y } = point;
    const discs = near(x, y);
    if (discs.length === 0) return;
    const wobble = (noise.cloud(x * 6, y * 6, 110, 3) - 0.5) * 0.3 * reach;
    const outside = nearestShore(discs, x, y, wobble);
    surface.copper -= ramp(0.009, -0.009, outside);
    if (outside > -0.01) tint(surface, 0.34, 0.13, 0.075, bell(outside - 0.014, 0.016) * 0.65);
    if (outside > 0) {
      const thin = Math.exp(-outside * 16) * 0.3;
      surface.copper -= thin * 0.55;
      tint(surface, 0.6, 0.26, 0.17, thin);
    }
  };
};

/** Distance to the nearest island's shore, below zero on bare metal. Small islands wobble less, or they would vanish. */
function nearestShore(discs: readonly Disc[], x: number, y: number, wobble: number): number {
  let nearest = 9;
  for (let i = 0; i < discs.length; i++) {
    const disc = discs[i];
    if (!disc) continue;
    const dx = x - disc.x;
    const dy = (y - disc.y) * (0.85 + 0.4 * disc.kind);
    const own = Math.sqrt(dx * dx + dy * dy) - disc.radius + wobble * Math.min(1, disc.radius * 8);
    if (own < nearest) nearest = own;
  }
  return nearest;
}
