import { seededRandom } from "./random";

/** Smooth random fields over the plane. `channel` picks one of many independent fields of the same seed. */
export type Noise = {
  /** One field in 0..1 with bumps about one unit apart. */
  value(x: number, y: number, channel: number): number;
  /** Clouds in 0..1, mean 0.5: `octaves` fields, each twice as fine and half as strong as the last. */
  cloud(x: number, y: number, channel: number, octaves: number): number;
};

const SIDE = 256;
const LAST = SIDE - 1;

/** Fills the lattice once, so that a pixel costs four look-ups a field and no allocation. */
export function makeNoise(seed: number): Noise {
  const lattice = Float32Array.from({ length: SIDE * SIDE }, seededRandom(seed));

  function value(x: number, y: number, channel: number): number {
    // Truncating a shifted number is a cheaper floor; no photo reaches -4096.
    const floorX = ((x + 4096) | 0) - 4096;
    const floorY = ((y + 4096) | 0) - 4096;
    const partX = x - floorX;
    const partY = y - floorY;
    const u = partX * partX * (3 - 2 * partX);
    const v = partY * partY * (3 - 2 * partY);
    const column = (floorX + channel * 57) & LAST;
    const nextColumn = (column + 1) & LAST;
    const row = ((floorY + channel * 131) & LAST) << 8;
    const nextRow = (row + SIDE) & (SIDE * SIDE - 1);
    const a = lattice[row | column] ?? 0;
    const b = lattice[row | nextColumn] ?? 0;
    const c = lattice[nextRow | column] ?? 0;
    const d = lattice[nextRow | nextColumn] ?? 0;
    return a + (b - a) * u + (c - a) * v + (a - b - c + d) * u * v;
  }

  function cloud(x: number, y: number, channel: number, octaves: number): number {
    let sum = 0;
    let weight = 0.5;
    let total = 0;
    for (let octave = 0; octave < octaves; octave++) {
      sum += weight * value(x, y, channel + octave * 7);
      total += weight;
      weight *= 0.5;
      // Turned as well as doubled, so that the lattice does not show as squares.
      const turned = x * 1.62 - y * 1.18;
      y = x * 1.18 + y * 1.62 + 3.7;
      x = turned;
    }
    return sum / total;
  }

  return { value, cloud };
}
