import type { BaseMetal } from "@/lib/cases/case-words";
import type { Noise } from "./noise";
import type { Random } from "./random";
import type { Shape } from "./shapes/shape";

/** A point of the part in its own frame; one unit is about half the height of a disc that fills the photo. */
export type Point = {
  x: number;
  y: number;
  /** Distance to the part's edge: below zero inside. */
  edge: number;
};

/**
 * What one point of the part is made of. One record is reused for every pixel and reset by `layStrike`: a paint changes it in place and
 * keeps nothing of it, so that a pixel depends on its point alone.
 */
export type Surface = {
  /** Opacity of the copper, 0 (base metal shows) to 1. */
  copper: number;
  red: number;
  green: number;
  blue: number;
  /** Smut, soot or shadowed hole, 0 to 1. */
  dark: number;
  /** A coloured film over everything, and its strength. */
  film: number;
  filmRed: number;
  filmGreen: number;
  filmBlue: number;
  gloss: number;
  /** Powder and grain, 0 to 1.5. */
  rough: number;
  tiltX: number;
  tiltY: number;
};

/** What a fault may know about the part it is on. */
export type FaultScene = {
  shape: Shape;
  baseMetal: BaseMetal;
  noise: Noise;
  random: Random;
  amount: number;
  /** About half the part's size; marks are scaled by it so that a pin does not get a disc's islands. */
  reach: number;
};

/** Changes the surface at one point. */
export type Paint = (point: Point, surface: Surface) => void;

/** Places the marks of a fault once for a part, and returns the paint for its points. */
export type Fault = (scene: FaultScene) => Paint;

/** A place on the part, at least `margin` inside its edge, so that marks do not fall into holes. */
export function placeOn(scene: FaultScene, margin: number): { x: number; y: number } {
  const { shape, random } = scene;
  let best = { x: 0, y: 0 };
  let bestEdge = Infinity;
  for (let attempt = 0; attempt < 60; attempt++) {
    const x = (random() * 2 - 1) * shape.halfWidth;
    const y = (random() * 2 - 1) * shape.halfHeight;
    const edge = shape.distance(x, y);
    if (edge < -margin) return { x, y };
    if (edge < bestEdge) {
      bestEdge = edge;
      best = { x, y };
    }
  }
  return best;
}

/** Mixes the deposit's colour towards another by `share`. */
export function tint(surface: Surface, red: number, green: number, blue: number, share: number): void {
  surface.red += (red - surface.red) * share;
  surface.green += (green - surface.green) * share;
  surface.blue += (blue - surface.blue) * share;
}

/** Lays a coloured film over the point; the stronger of two films wins. */
export function lay(surface: Surface, red: number, green: number, blue: number, share: number): void {
  if (share <= surface.film) return;
  surface.film = share;
  surface.filmRed = red;
  surface.filmGreen = green;
  surface.filmBlue = blue;
}
