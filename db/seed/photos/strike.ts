import { METAL_COLOURS, METAL_GLOSS, STRIKE } from "./metals";
import type { FaultScene, Paint, Point, Surface } from "./surface";
import type { Slope } from "./shapes/shape";
import { surveyField, surveyLine } from "./survey";

/** A record for `layStrike` to fill; made once a photo. */
export function bareSurface(): Surface {
  // Halves, not whole numbers, so that every field is a double from the start.
  const half = 0.5;
  return {
    copper: half,
    red: half,
    green: half,
    blue: half,
    dark: half,
    film: half,
    filmRed: half,
    filmGreen: half,
    filmBlue: half,
    gloss: half,
    rough: half,
    tiltX: half,
    tiltY: half,
  };
}

/** A good strike on the worked face of this part: what every fault is then painted over. */
export function layStrike(scene: FaultScene): Paint {
  const { shape, noise, random } = scene;
  const warm = 0.96 + 0.08 * random();
  const strength = 0.96 + 0.07 * random();
  const red = STRIKE[0] * strength;
  const green = STRIKE[1] * strength * warm;
  const blue = STRIKE[2] * strength * warm * (0.96 + 0.08 * random());
  const polish = 0.44 + 0.14 * random();
  const slope: Slope = { x: 0.5, y: 0.5 };
  const work = workedFace(scene, slope);
  const shades = surveyField(
    shape.halfWidth,
    shape.halfHeight,
    24,
    (x, y) => 0.95 + 0.1 * noise.cloud(x * 2.6, y * 2.6, 10, 2),
  );
  return (point, surface) => {
    const { x, y } = point;
    const shade = shades(x, y);
    const grain = 0.98 + 0.04 * noise.value(x * 34, y * 34, 14);
    surface.copper = 1;
    surface.red = red * shade;
    surface.green = green * shade * grain;
    surface.blue = blue * shade * grain;
    surface.dark = 0;
    surface.film = 0;
    surface.gloss = polish;
    surface.rough = 0;
    slope.x = 0;
    slope.y = 0;
    shape.relief(x, y, slope);
    work(point, surface);
    surface.tiltX = slope.x;
    surface.tiltY = slope.y;
  };
}

/** Turning rings, linishing lines or a cylinder's fine marks, on a face that is never quite flat. */
function workedFace({ shape, noise }: FaultScene, slope: Slope): Paint {
  const { halfWidth, halfHeight, form } = shape;
  const unevenX = surveyField(halfWidth, halfHeight, 16, (x, y) => (noise.value(x * 1.7, y * 1.7, 24) - 0.5) * 0.2);
  const unevenY = surveyField(halfWidth, halfHeight, 16, (x, y) => (noise.value(x * 1.7, y * 1.7, 25) - 0.5) * 0.2);
  if (form === "turned") {
    const rings = surveyLine(
      1.4,
      900,
      (radius) => (noise.value(radius * 52, 3, 20) - 0.5) * 0.11 + (noise.value(radius * 118, 5, 21) - 0.5) * 0.06,
    );
    return ({ x, y }) => {
      const radius = Math.sqrt(x * x + y * y) + 1e-6;
      const ring = rings(radius) / radius;
      slope.x += unevenX(x, y) + x * ring;
      slope.y += unevenY(x, y) + y * ring;
    };
  }
  const round = form === "round";
  const lengthways = round ? 60 : 1.4;
  const across = round ? 1.4 : 66;
  return ({ x, y }) => {
    const line =
      noise.value(x * lengthways, y * across, 22) -
      0.5 +
      (noise.value(x * lengthways * 2, y * across * 2, 23) - 0.5) * 0.6;
    slope.x += unevenX(x, y) + (round ? line * 0.05 : 0);
    slope.y += unevenY(x, y) + (round ? 0 : line * 0.1);
  };
}

/** The colour that the light meets, once the fault has said how much copper, film and smut there is. */
export type Albedo = { red: number; green: number; blue: number; gloss: number };

/** Lays the surface's films in order: base metal, copper, coloured film, smut. Clamps what a fault overdid. */
export function settle({ baseMetal, noise }: FaultScene): (point: Point, surface: Surface, albedo: Albedo) => void {
  const [baseRed, baseGreen, baseBlue] = METAL_COLOURS[baseMetal];
  const baseGloss = METAL_GLOSS[baseMetal];
  const castGrain = baseMetal === "iron" || baseMetal === "zinc" || baseMetal === "aluminium" ? 0.16 : 0.06;
  return (point, surface, albedo) => {
    const copper = Math.min(1, Math.max(0, surface.copper));
    surface.copper = copper;
    surface.dark = Math.min(0.95, surface.dark);
    if (copper < 1) {
      const metal = 1 - castGrain + 2 * castGrain * noise.value(point.x * 44, point.y * 44, 30);
      surface.red = baseRed * metal + (surface.red - baseRed * metal) * copper;
      surface.green = baseGreen * metal + (surface.green - baseGreen * metal) * copper;
      surface.blue = baseBlue * metal + (surface.blue - baseBlue * metal) * copper;
      surface.gloss = baseGloss + (surface.gloss - baseGloss) * copper;
    }
    const { film, dark } = surface;
    const clear = 1 - dark;
    albedo.red = (surface.red + (surface.filmRed - surface.red) * film) * clear + 0.046 * dark;
    albedo.green = (surface.green + (surface.filmGreen - surface.green) * film) * clear + 0.035 * dark;
    albedo.blue = (surface.blue + (surface.filmBlue - surface.blue) * film) * clear + 0.032 * dark;
    albedo.gloss = Math.max(0.04, surface.gloss) * (1 - dark * 0.7);
  };
}
