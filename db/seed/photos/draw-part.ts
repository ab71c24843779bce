import { ramp } from "./curves";
import { distanceAt, type Frame } from "./frame";
import type { Light, Lit } from "./light";
import type { Noise } from "./noise";
import type { Shape, Slope } from "./shapes/shape";
import type { Albedo } from "./strike";
import type { Paint, Point, Surface } from "./surface";
import type { Water } from "./wet";

/** Everything that one part's pixels are drawn from. `paints` run in order over one reused surface. */
export type PartPaint = {
  shape: Shape;
  noise: Noise;
  light: Light;
  paints: readonly Paint[];
  settle: (point: Point, surface: Surface, albedo: Albedo) => void;
  surface: Surface;
  water: Water;
};

/**
 * The pixel being drawn. Its numbers travel in this one record, not as arguments: a number passed to a function that the engine does not
 * inline costs an allocation, and a photo has a million of them.
 */
type Pixel = {
  point: Point;
  /** Distance to the outline, and the share of the pixel that the top face and the whole part cover. */
  away: number;
  top: number;
  cover: number;
  /** Slope of the face in the photo's frame, and how open it lies to the light. */
  slope: Slope;
  open: number;
  albedo: Albedo;
};

const BEVEL = 0.055;

/** Draws every pixel of the part, top face and the strip of side wall below it, and fills the mask and the truth maps. */
export function drawPart(frame: Frame, part: PartPaint): void {
  const { width, height, partMask, copperMap, darkMap } = frame;
  const { paints, surface, water, settle } = part;
  const pixel = blankPixel();
  const place = placer(frame, part.shape, pixel);
  const tilt = tilter(frame, part, pixel);
  const shade = shader(part, pixel);
  const blend = blender(frame, pixel);
  for (let row = 0; row < height; row++) {
    for (let column = 0; column < width; column++) {
      if (!place(column, row)) continue;
      water.drop = 0;
      for (let i = 0; i < paints.length; i++) paints[i]?.(pixel.point, surface);
      settle(pixel.point, surface, pixel.albedo);
      const index = row * width + column;
      if (pixel.cover >= 0.5) {
        partMask[index] = 1;
        copperMap[index] = surface.copper * 255 + 0.5;
        darkMap[index] = surface.dark * 255 + 0.5;
      }
      tilt(column, row);
      shade();
      blend(index);
    }
  }
}

function blankPixel(): Pixel {
  const half = 0.5;
  return {
    point: { x: half, y: half, edge: half },
    away: half,
    top: half,
    cover: half,
    slope: { x: half, y: half },
    open: half,
    albedo: { red: half, green: half, blue: half, gloss: half },
  };
}

/** Finds out whether the part covers the pixel, by how much, and which point of the part that is. */
function placer(frame: Frame, shape: Shape, pixel: Pixel) {
  const { width, height, scalePx, cos, sin, offsetX, offsetY, distance } = frame;
  const soft = 0.75 / scalePx;
  const wallPx = Math.round(shape.wall * scalePx);
  const { point } = pixel;
  return (column: number, row: number): boolean => {
    const away = distance[row * width + column] ?? 0;
    if (away > soft + shape.wall) return false;
    const top = ramp(soft, -soft, away);
    let cover = top;
    if (top < 1 && wallPx > 0) {
      const half = distanceAt(frame, column, row - (wallPx >> 1));
      const full = distanceAt(frame, column, row - wallPx);
      cover = Math.max(top, ramp(soft, -soft, Math.min(half, full)));
    }
    if (cover === 0) return false;
    const screenX = (column + 0.5 - width / 2) / scalePx + offsetX;
    const screenY = (row + 0.5 - height / 2) / scalePx + offsetY;
    point.x = screenX * cos + screenY * sin;
    point.y = screenY * cos - screenX * sin;
    point.edge = Math.min(0, away);
    pixel.away = away;
    pixel.top = top;
    pixel.cover = cover;
    return true;
  };
}

/** Turns the painted tilt into the photo's frame, rounds the edge off, and darkens walls and the seam's groove. */
function tilter(frame: Frame, { surface, noise, shape }: PartPaint, pixel: Pixel) {
  const { scalePx, cos, sin } = frame;
  const { point, slope } = pixel;
  return (column: number, row: number): void => {
    if (surface.rough > 0.03) {
      surface.tiltX += (noise.value(point.x * 74, point.y * 74, 50) - 0.5) * 0.42 * surface.rough;
      surface.tiltY += (noise.value(point.x * 74, point.y * 74, 51) - 0.5) * 0.42 * surface.rough;
    }
    const onWall = 1 - pixel.top;
    const flat = 1 - 0.7 * onWall;
    slope.x = (surface.tiltX * cos - surface.tiltY * sin) * flat;
    slope.y = (surface.tiltX * sin + surface.tiltY * cos) * flat;
    pixel.open = 1;
    if (pixel.away > -BEVEL) {
      const bevel = ramp(-BEVEL, 0, pixel.away) * 0.75 * pixel.top + onWall * 0.86;
      const rise = scalePx * 0.5 * bevel;
      slope.x += (distanceAt(frame, column + 1, row) - distanceAt(frame, column - 1, row)) * rise;
      slope.y += (distanceAt(frame, column, row + 1) - distanceAt(frame, column, row - 1)) * rise;
      pixel.open = (0.74 + 0.26 * ramp(0, -0.03, pixel.away)) * (1 - 0.35 * onWall);
    }
    const seam = Math.abs(shape.seam(point.x, point.y)) * scalePx;
    if (seam < 2.6) pixel.open *= 0.84 + 0.16 * ramp(0.6, 2.6, seam);
  };
}

/** Turns the albedo into the colour that leaves the point: plain light on the matt share, the mirrored room on the glossy one. */
function shader({ light, water }: PartPaint, pixel: Pixel) {
  const { slope, albedo } = pixel;
  const lit: Lit = { red: 0.5, green: 0.5, blue: 0.5, plain: 0.5 };
  return (): void => {
    light.look(slope, lit);
    const { open } = pixel;
    const matt = lit.plain * (1 - albedo.gloss);
    const gloss = albedo.gloss * 1.42;
    // Metal tints what it mirrors; a bright tube still leaves a trace of white.
    const white = Math.max(0, lit.green - 0.95) * albedo.gloss * 0.12;
    let flash = 0;
    if (water.drop > 0) {
      const dx = slope.x - light.flashX;
      const dy = slope.y - light.flashY;
      flash = 0.75 * Math.exp(-(dx * dx + dy * dy) / 0.012);
    }
    albedo.red = (albedo.red * (matt + lit.red * gloss) + white) * open + flash;
    albedo.green = (albedo.green * (matt + lit.green * gloss) + white) * open + flash;
    albedo.blue = (albedo.blue * (matt + lit.blue * gloss) + white) * open + flash;
  };
}

/** Mixes the lit colour over the bed by how much of the pixel the part covers. */
function blender({ colour }: Frame, pixel: Pixel) {
  const { albedo } = pixel;
  return (index: number): void => {
    const at = index * 3;
    const under = 1 - pixel.cover;
    colour[at] = (colour[at] ?? 0) * under + albedo.red * pixel.cover;
    colour[at + 1] = (colour[at + 1] ?? 0) * under + albedo.green * pixel.cover;
    colour[at + 2] = (colour[at + 2] ?? 0) * under + albedo.blue * pixel.cover;
  };
}
