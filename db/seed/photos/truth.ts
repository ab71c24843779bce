import type { Frame } from "./frame";
import { outlineRings, type Ring } from "./outline";

/** What the renderer put on the part, counted over the pixels where the part is seen. All shares are 0 to 1. */
export type PartTruth = {
  /** Copper that shows: at least half of what is seen. `copperShare + bareShare + darkShare` is 1. */
  copperShare: number;
  /** Base metal that shows. */
  bareShare: number;
  /** Smut, soot or a hole that hides the copper, or lies where there is none. */
  darkShare: number;
  /** Thin deposit, opacity 0.25 to 0.75; these pixels are also counted above. */
  hazeShare: number;
  /** Deposit of opacity 0.5 and more, whether smut hides it or not. */
  depositShare: number;
  /** How much of the photo the part fills. */
  partShare: number;
  /** Outer ring first, then holes. */
  outline: Ring[];
  /** Corners of the grey card's grey field, when it is in the photo. */
  card?: Ring;
};

/** Counts the maps. Throws RangeError when no part pixel is in the photo: a share of nothing would mean nothing. */
export function countTruth(frame: Frame): PartTruth {
  const { partMask, copperMap, darkMap, width, height } = frame;
  let part = 0;
  let copper = 0;
  let dark = 0;
  let haze = 0;
  let deposit = 0;
  for (let pixel = 0; pixel < partMask.length; pixel++) {
    if (partMask[pixel] !== 1) continue;
    part++;
    const opacity = (copperMap[pixel] ?? 0) / 255;
    const smut = (darkMap[pixel] ?? 0) / 255;
    if (opacity >= 0.5) deposit++;
    if (opacity > 0.25 && opacity < 0.75) haze++;
    if (opacity * (1 - smut) >= 0.5) copper++;
    else if (smut >= 1 - opacity) dark++;
  }
  if (part === 0) throw new RangeError("centre and zoom leave no part in the photo");
  return {
    copperShare: copper / part,
    bareShare: (part - copper - dark) / part,
    darkShare: dark / part,
    hazeShare: haze / part,
    depositShare: deposit / part,
    partShare: part / partMask.length,
    outline: outlineRings(partMask, width, height),
  };
}
