import { ramp } from "../curves";
import type { Frame } from "../frame";
import type { BedScene } from "./bed";

/** Nitrile blue, black or green, in linear light; from memory. */
const GLOVES = [
  [0.05, 0.17, 0.42],
  [0.03, 0.032, 0.036],
  [0.04, 0.26, 0.2],
] as const;

/** A gloved fingertip comes in from a lower corner and steadies the part; what it covers no longer counts as part. */
export function drawGlove(frame: Frame, { noise, random }: BedScene): void {
  const { width, height, scalePx, colour, partMask } = frame;
  const tone = GLOVES[Math.floor(random() * GLOVES.length)] ?? GLOVES[0];
  const halfX = width / 2 / scalePx;
  const halfY = height / 2 / scalePx;
  const tipX = -halfX * (0.66 + random() * 0.1);
  const tipY = halfY * (0.5 + random() * 0.2);
  const rootX = tipX - halfX * 0.9;
  const rootY = tipY + halfY * 0.75;
  const length = Math.hypot(rootX - tipX, rootY - tipY);
  const alongX = (rootX - tipX) / length;
  const alongY = (rootY - tipY) / length;
  for (let row = 0; row < height; row++) {
    const y = (row + 0.5 - height / 2) / scalePx;
    for (let column = 0; column < width; column++) {
      const x = (column + 0.5 - width / 2) / scalePx;
      const along = (x - tipX) * alongX + (y - tipY) * alongY;
      const across = (y - tipY) * alongX - (x - tipX) * alongY;
      const radius = 0.15 * halfY + 0.03 * Math.max(0, along);
      const away = along > 0 ? Math.abs(across) : Math.hypot(along, across);
      if (away > radius * 1.45) continue;
      const at = (row * width + column) * 3;
      const cover = ramp(radius, radius - 2 / scalePx, away);
      const side = across / radius;
      const upright = Math.sqrt(Math.max(0.04, 1 - (away / radius) ** 2));
      const crease = noise.value(along * 16, across * 3, 90) - 0.5 + (noise.cloud(x * 11, y * 11, 91, 2) - 0.5) * 0.8;
      const light = 0.3 + 0.85 * Math.max(0, upright * 0.7 - side * 0.5 + crease * 0.18);
      const shine = 0.1 * ramp(0.3, 0, Math.abs(side + 0.42 + crease * 0.16)) * upright;
      const shadow = 1 - 0.45 * ramp(radius * 1.45, radius * 0.95, away);
      if (cover > 0.5) partMask[row * width + column] = 0;
      for (let channel = 0; channel < 3; channel++) {
        const under = (colour[at + channel] ?? 0) * shadow;
        colour[at + channel] = under + ((tone[channel] ?? 0) * light + shine - under) * cover;
      }
    }
  }
}
