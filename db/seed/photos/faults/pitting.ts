import { bell, ramp } from "../curves";
import { scatter, type Disc } from "../scatter";
import { placeOn, type Fault, type Surface } from "../surface";

/** Gas or dirt on the face: round pits with a bright lip, and nodules that stand up. Clustered, as they are on real parts. */
export const pitting: Fault = (scene) => {
  const { random, amount, reach } = scene;
  const discs: Disc[] = [];
  const clusters = 5 + Math.floor(random() * 3);
  for (let cluster = 0; cluster < clusters; cluster++) {
    const heart = placeOn(scene, 0.04);
    for (let i = 0; i < Math.round(9 + 8 * amount); i++) {
      const away = random() * random() * 0.55 * reach;
      const turn = random() * 6.28;
      const radius = (0.011 + random() * random() * 0.028) * (0.7 + 0.3 * amount) * Math.max(0.75, reach);
      discs.push({ x: heart.x + Math.cos(turn) * away, y: heart.y + Math.sin(turn) * away, radius, kind: random() });
    }
  }
  const near = scatter(discs, 0.05);
  return ({ x, y }, surface) => {
    const found = near(x, y);
    for (let i = 0; i < found.length; i++) {
      const disc = found[i];
      if (!disc) continue;
      const dx = (x - disc.x) / disc.radius;
      const dy = (y - disc.y) / disc.radius;
      const away = Math.sqrt(dx * dx + dy * dy);
      if (away > 2) continue;
      if (disc.kind < 0.68) pit(surface, dx, dy, away);
      else nodule(surface, dx, dy, away);
    }
  };
};

function pit(surface: Surface, dx: number, dy: number, away: number): void {
  surface.dark = Math.max(surface.dark, ramp(1.08, 0.55, away) * 0.92);
  const lip = bell(away - 1.2, 0.28) * 0.6;
  surface.tiltX -= (dx / (away + 1e-4)) * lip;
  surface.tiltY -= (dy / (away + 1e-4)) * lip;
}

function nodule(surface: Surface, dx: number, dy: number, away: number): void {
  const height = ramp(1.35, 0.9, away) * 0.8;
  surface.tiltX += dx * height;
  surface.tiltY += dy * height;
  surface.dark = Math.max(surface.dark, bell(away - 1.4, 0.22) * 0.4);
}
