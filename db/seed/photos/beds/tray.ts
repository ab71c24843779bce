import { bell, mix, ramp } from "../curves";
import { scatter, type Disc } from "../scatter";
import { surveyField } from "../survey";
import type { Bed, BedScene } from "./bed";

/** A stainless tray: brushed, brighter toward the light, with water standing on it. */
export function tray({ noise, random, wet }: BedScene): Bed {
  const drops: Disc[] = wet
    ? Array.from({ length: 26 }, () => ({
        x: (random() - 0.5) * 3,
        y: (random() - 0.5) * 2.2,
        radius: 0.012 + random() * random() * 0.05,
        kind: random(),
      }))
    : [];
  const near = scatter(drops, 0.02);
  const lean = (random() - 0.5) * 0.8;
  const bright = 0.85 + random() * 0.3;
  const cloudAt = surveyField(2, 1.6, 12, (x, y) => noise.cloud(x * 1.2, y * 1.2, 62, 2) - 0.5);
  return ({ x, y, down }, colour) => {
    const brushed = noise.value(x * 2.2, y * 78, 60) - 0.5 + (noise.value(x * 5, y * 190, 61) - 0.5) * 0.7;
    const cloud = cloudAt(x, y);
    let level = mix(0.5, 0.29, down) * (1 + brushed * 0.07 + cloud * 0.22) + 0.17 * bell(x * lean + y + 0.85, 0.36);
    const discs = near(x, y);
    for (let i = 0; i < discs.length; i++) {
      const disc = discs[i];
      if (!disc) continue;
      const dx = (x - disc.x) / disc.radius;
      const dy = (y - disc.y) / disc.radius;
      const away = Math.sqrt(dx * dx + dy * dy);
      if (away > 1) continue;
      level *= 0.82 + 0.3 * (dy * 0.7 + dx * 0.3) - 0.2 * ramp(0.75, 1, away);
      level += 0.6 * bell(Math.hypot(dx + 0.38, dy + 0.42), 0.16);
    }
    level *= bright;
    colour.red = level * 0.965;
    colour.green = level;
    colour.blue = level * 1.03;
    colour.mirror = 0.34;
  };
}
