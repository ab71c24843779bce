import { ramp } from "./curves";
import type { Random } from "./random";
import type { Slope } from "./shapes/shape";

const SIDE = 160;
const CHANNELS = 4;

/** What falls on a point from its slope: the mirrored room in three colours, and the plain light. */
export type Lit = { red: number; green: number; blue: number; plain: number };

export type Light = {
  /** Fills `lit` for a slope in the photo's frame; both slopes are -1 to 1. */
  look(slope: Slope, lit: Lit): void;
  /** Slope at which a drop of water flashes. */
  flashX: number;
  flashY: number;
};

/** A shop with a warm tube above, a cool window to the right and a dark bench below. The seed turns it a little. */
export function roomLight(random: Random): Light {
  const turn = (random() - 0.5) * 0.7;
  const cos = Math.cos(turn);
  const sin = Math.sin(turn);
  const tubeWidth = 0.14 + random() * 0.09;
  const table = new Float32Array(SIDE * SIDE * CHANNELS);
  for (let row = 0; row < SIDE; row++) {
    for (let column = 0; column < SIDE; column++) {
      const slopeX = (column / (SIDE - 1)) * 2 - 1;
      const slopeY = (row / (SIDE - 1)) * 2 - 1;
      fill(
        table,
        (row * SIDE + column) * CHANNELS,
        slopeX * cos + slopeY * sin,
        slopeY * cos - slopeX * sin,
        tubeWidth,
      );
    }
  }
  return { look: lookUp(table), flashX: -0.38 * cos + 0.42 * sin, flashY: -0.42 * cos - 0.38 * sin };
}

function fill(table: Float32Array, at: number, slopeX: number, slopeY: number, tubeWidth: number): void {
  const square = Math.min(0.96, slopeX * slopeX + slopeY * slopeY);
  const upright = Math.sqrt(1 - square);
  const mirrorX = 2 * upright * slopeX;
  const mirrorY = 2 * upright * slopeY;
  const ceiling = 0.27 + 0.4 * ramp(0.5, -0.7, mirrorY);
  const tube = 1.2 * Math.exp(-(((mirrorY + 0.32 + mirrorX * 0.35) / tubeWidth) ** 2));
  const window = 0.34 * Math.exp(-(((mirrorX - 0.55) / 0.2) ** 2));
  const person = 0.17 * Math.exp(-(((mirrorY - 0.3) / 0.2) ** 2) - (mirrorX / 0.7) ** 2);
  const even = Math.max(0.06, ceiling - person);
  table[at] = even + tube * 1.02 + window * 0.94;
  table[at + 1] = even + tube + window;
  table[at + 2] = even + tube * 0.97 + window * 1.08;
  table[at + 3] = 0.24 + 0.72 * Math.max(0, upright * 0.76 - slopeY * 0.46 - slopeX * 0.26);
}

/** Reads the table between its entries, so that smooth metal shows no steps. */
function lookUp(table: Float32Array): Light["look"] {
  return (slope, lit) => {
    const fineX = Math.min(SIDE - 1.001, Math.max(0, (slope.x + 1) * 0.5 * (SIDE - 1)));
    const fineY = Math.min(SIDE - 1.001, Math.max(0, (slope.y + 1) * 0.5 * (SIDE - 1)));
    const column = fineX | 0;
    const row = fineY | 0;
    const right = fineX - column;
    const low = fineY - row;
    const a = (row * SIDE + column) * CHANNELS;
    const c = a + SIDE * CHANNELS;
    const shareA = (1 - right) * (1 - low);
    const shareB = right * (1 - low);
    const shareC = (1 - right) * low;
    const shareD = right * low;
    lit.red =
      (table[a] ?? 0) * shareA + (table[a + 4] ?? 0) * shareB + (table[c] ?? 0) * shareC + (table[c + 4] ?? 0) * shareD;
    lit.green =
      (table[a + 1] ?? 0) * shareA +
      (table[a + 5] ?? 0) * shareB +
      (table[c + 1] ?? 0) * shareC +
      (table[c + 5] ?? 0) * shareD;
    lit.blue =
      (table[a + 2] ?? 0) * shareA +
      (table[a + 6] ?? 0) * shareB +
      (table[c + 2] ?? 0) * shareC +
      (table[c + 6] ?? 0) * shareD;
    lit.plain =
      (table[a + 3] ?? 0) * shareA +
      (table[a + 7] ?? 0) * shareB +
      (table[c + 3] ?? 0) * shareC +
      (table[c + 7] ?? 0) * shareD;
  };
}
