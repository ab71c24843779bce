import { bell, ramp } from "../curves";
import { lay, placeOn, tint, type Fault, type Paint } from "../surface";

/** Touched after the strike: fingerprints etched brown by sweat, a smear, and the line where the rack held the part. */
export const handling: Fault = (scene) => {
  const { random, amount, reach } = scene;
  const prints = Array.from({ length: 2 + Math.round(random() + 0.4 * amount) }, () => fingerprint(scene));
  const contact = placeOn(scene, 0.05);
  const lean = (random() - 0.5) * 0.5;
  return (point, surface) => {
    for (let i = 0; i < prints.length; i++) prints[i]?.(point, surface);
    const across = point.x - contact.x + (point.y - contact.y) * lean;
    const along = Math.abs(point.y - contact.y);
    if (Math.abs(across) > 0.12 || along > 0.34 * reach) return;
    const ends = ramp(0.32 * reach, 0.26 * reach, along);
    surface.copper -= ramp(0.02, 0.009, Math.abs(across)) * ends * 0.92;
    surface.dark = Math.max(surface.dark, bell(Math.abs(across) - 0.03, 0.012) * ends * 0.6);
  };
};

/** A whorl or loop: ridges follow a stretched spiral; sweat leaves a brown film on them and dulls what lies between. */
const fingerprint: Fault = (scene): Paint => {
  const { noise, random, amount, reach } = scene;
  const centre = placeOn(scene, 0.1 * reach);
  const size = (0.31 + random() * 0.07) * Math.max(0.8, reach);
  const turn = (random() - 0.5) * 1.8;
  const cos = Math.cos(turn);
  const sin = Math.sin(turn);
  const ridges = 70 / size;
  const loop = 0.25 + random() * 0.5;
  const channel = 220 + Math.floor(random() * 20);
  const strength = 0.5 + 0.4 * amount;
  return ({ x, y }, surface) => {
    const dx = x - centre.x;
    const dy = y - centre.y;
    if (dx * dx + dy * dy > size * size * 2.4) return;
    const u = (dx * cos + dy * sin) * 1.3;
    const v = dy * cos - dx * sin;
    const blot = noise.cloud(x * 4.5, y * 4.5, channel, 2) - 0.5;
    const press = ramp(size * 1.08, size * 0.72, Math.sqrt(u * u + v * v) + blot * size * 0.6);
    if (press <= 0) return;
    const core = Math.sqrt(u * u + (v - size * 0.2) * (v - size * 0.2) * (v > size * 0.2 ? loop : 1)) + blot * 0.09;
    const ridge = ramp(-0.15, 0.55, Math.sin(core * ridges));
    const broken = 0.3 + 0.7 * ramp(0.25, 0.6, noise.cloud(x * 16, y * 16, channel + 1, 2));
    lay(surface, 0.17, 0.08, 0.05, Math.min(0.8, press * ridge * broken * strength * 0.92));
    tint(surface, 0.5, 0.27, 0.2, press * 0.5 * strength);
    surface.gloss *= 1 - press * 0.35;
  };
};
