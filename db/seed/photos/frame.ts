import { seededRandom } from "./random";
import type { PartSpec } from "./part-spec";
import { SHAPES } from "./shapes/by-name";

/** Where the part lies in the photo. Screen units are the part's own, turned upright: x to the right, y down, 0 in the middle. */
export type Placing = {
  width: number;
  height: number;
  /** Pixels in one unit. */
  scalePx: number;
  offsetX: number;
  offsetY: number;
  cos: number;
  sin: number;
};

/** The maps that a photo is drawn into. Colours are linear light, three a pixel. */
export type Frame = Placing & {
  /** Distance to the part's outline at each pixel's middle, in part units, below zero inside. */
  distance: Float32Array;
  colour: Float32Array;
  /** 1 where the part is seen. */
  partMask: Uint8Array;
  /** Opacity of copper and of smut where the part is seen, 0 to 255. */
  copperMap: Uint8Array;
  darkMap: Uint8Array;
};

/** The pose comes from the seed alone, so that the snap and the re-strike show the part alike. */
export function placePart(spec: PartSpec): Placing {
  const { width, height, seed } = spec;
  const shape = SHAPES[spec.shape];
  const zoom = spec.zoom ?? 1;
  const random = seededRandom(Math.imul(seed, 7919) + 3);
  const turn = (random() - 0.5) * 0.5;
  const jitterX = (random() - 0.5) * 0.1;
  const jitterY = (random() - 0.5) * 0.06;
  const centre = spec.centre ?? { x: jitterX, y: jitterY };
  const reachX = shape.halfWidth * Math.cos(turn) + shape.halfHeight * Math.abs(Math.sin(turn)) * 0.3;
  const reachY = Math.max(shape.halfHeight, shape.halfWidth * Math.abs(Math.sin(turn)) + shape.halfHeight * 0.7);
  const scalePx = Math.min(width / 2 / (reachX * 1.16), height / 2 / (reachY * 1.16)) * zoom;
  return { width, height, scalePx, offsetX: centre.x, offsetY: centre.y, cos: Math.cos(turn), sin: Math.sin(turn) };
}

/** Fills the distance map; the other maps start empty. */
export function openFrame(spec: PartSpec): Frame {
  const placing = placePart(spec);
  const { width, height, scalePx, cos, sin } = placing;
  const shape = SHAPES[spec.shape];
  const distance = new Float32Array(width * height);
  for (let row = 0; row < height; row++) {
    const screenY = (row + 0.5 - height / 2) / scalePx + placing.offsetY;
    for (let column = 0; column < width; column++) {
      const screenX = (column + 0.5 - width / 2) / scalePx + placing.offsetX;
      distance[row * width + column] = shape.distance(screenX * cos + screenY * sin, screenY * cos - screenX * sin);
    }
  }
  return {
    ...placing,
    distance,
    colour: new Float32Array(width * height * 3),
    partMask: new Uint8Array(width * height),
    copperMap: new Uint8Array(width * height),
    darkMap: new Uint8Array(width * height),
  };
}

/** The distance map at a pixel, or at the nearest one inside the photo. */
export function distanceAt(frame: Frame, column: number, row: number): number {
  const x = column < 0 ? 0 : column >= frame.width ? frame.width - 1 : column;
  const y = row < 0 ? 0 : row >= frame.height ? frame.height - 1 : row;
  return frame.distance[y * frame.width + x] ?? 0;
}
