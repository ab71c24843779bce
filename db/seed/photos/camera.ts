import type { Frame } from "./frame";
import { seededRandom } from "./random";

const STEPS = 8192;
const BRIGHTEST = 2.2;
const GRAINS = 8192;

/** sRGB transfer (IEC 61966-2-1) after a soft shoulder, as phones develop their photos. Index: linear light / BRIGHTEST. */
const TONE = Int16Array.from({ length: STEPS }, (_, i) => {
  const light = (i / (STEPS - 1)) * BRIGHTEST;
  const held = Math.min(1, (light * 1.14) / (1 + light * 0.24));
  return Math.round(255 * (held <= 0.0031308 ? 12.92 * held : 1.055 * held ** (1 / 2.4) - 0.055));
});

/** Exposure, a white balance that is not quite right, lens fall-off, tone and sensor noise: linear light to 8-bit sRGB. */
export function develop(frame: Frame, light: { warmth: number; exposure: number }, seed: number): Uint8Array {
  const { width, height, colour } = frame;
  const bytes = new Uint8ClampedArray(width * height * 3);
  const grain = sensorGrain(seed);
  const gains = [1 + 0.13 * light.warmth, 1, 1 - 0.17 * light.warmth].map(
    (gain) => (gain * light.exposure * (STEPS - 1)) / BRIGHTEST,
  );
  const [gainRed = 1, gainGreen = 1, gainBlue = 1] = gains;
  let next = Math.imul(seed, 2654435761) >>> 0;
  for (let row = 0; row < height; row++) {
    const fallY = (row / height - 0.5) ** 2;
    for (let column = 0; column < width; column++) {
      const at = (row * width + column) * 3;
      const fall = 1 - 0.5 * ((column / width - 0.5) ** 2 + fallY);
      next = (Math.imul(next, 1664525) + 1013904223) >>> 0;
      const speck = next >>> 8;
      const shared = grain[speck & (GRAINS - 1)] ?? 0;
      const tint = (grain[(speck >>> 11) & (GRAINS - 1)] ?? 0) >> 1;
      bytes[at] = tone((colour[at] ?? 0) * fall * gainRed) + shared + tint;
      bytes[at + 1] = tone((colour[at + 1] ?? 0) * fall * gainGreen) + shared;
      bytes[at + 2] = tone((colour[at + 2] ?? 0) * fall * gainBlue) + shared - tint;
    }
  }
  return new Uint8Array(bytes.buffer);
}

function tone(step: number): number {
  return TONE[step <= 0 ? 0 : step >= STEPS - 1 ? STEPS - 1 : step | 0] ?? 255;
}

/** Noise of about 1.4 levels (8-bit), near enough to a bell: the sum of three even draws. */
function sensorGrain(seed: number): Int8Array {
  const random = seededRandom(seed ^ 0x5eed);
  return Int8Array.from({ length: GRAINS }, () => Math.round((random() + random() + random() - 1.5) * 2.8));
}
