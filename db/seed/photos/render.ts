import { drawBed } from "./beds/draw-bed";
import { drawGlove } from "./beds/glove";
import { drawGreyCard } from "./beds/grey-card";
import { develop } from "./camera";
import { drawPart } from "./draw-part";
import { FAULTS } from "./faults/by-class";
import { openFrame } from "./frame";
import { roomLight } from "./light";
import { makeNoise } from "./noise";
import { checkSpec, type PartSpec } from "./part-spec";
import { seededRandom } from "./random";
import { SHAPES } from "./shapes/by-name";
import { bareSurface, layStrike, settle } from "./strike";
import type { FaultScene, Paint } from "./surface";
import { countTruth, type PartTruth } from "./truth";
import { wetLook, type Water } from "./wet";

export type RenderedPart = {
  /** sRGB, three bytes a pixel, row by row. */
  data: Uint8Array;
  width: number;
  height: number;
  truth: PartTruth;
  /** 1 where the part is seen, one byte a pixel. */
  partMask: Uint8Array;
  /** Opacity of copper and strength of smut on the part, 0 to 255, one byte a pixel. */
  copperMap: Uint8Array;
  darkMap: Uint8Array;
};

/**
 * Renders one photo of a copper-struck part with its fault, for demos, drills and tests. Nothing here is a photograph.
 * The same spec gives the same bytes. Throws RangeError naming the field when the spec cannot be rendered.
 */
export function renderPart(spec: PartSpec): RenderedPart {
  checkSpec(spec);
  const { seed } = spec;
  const noise = makeNoise(seed);
  const frame = openFrame(spec);
  // Each subject draws from its own numbers, so that a re-strike differs from the snap in its fault alone.
  const bedScene = { noise, random: seededRandom(Math.imul(seed, 31) + 5), wet: spec.wet ?? true };
  drawBed(frame, spec.bed, bedScene);
  const surface = bareSurface();
  const water: Water = { drop: 0 };
  const scene = faultScene(spec, noise);
  drawPart(frame, {
    shape: scene.shape,
    noise,
    light: roomLight(seededRandom(Math.imul(seed, 613) + 17)),
    paints: paintsFor(spec, scene, water),
    settle: settle(scene),
    surface,
    water,
  });
  if (spec.glove) drawGlove(frame, bedScene);
  const card = spec.greyCard ? drawGreyCard(frame) : undefined;
  const data = develop(frame, spec.light ?? roomMood(seed), seed);
  const { width, height, partMask, copperMap, darkMap } = frame;
  return { data, width, height, partMask, copperMap, darkMap, truth: { ...countTruth(frame), card } };
}

function faultScene(spec: PartSpec, noise: FaultScene["noise"]): FaultScene {
  const shape = SHAPES[spec.shape];
  const reach = Math.min(1, Math.sqrt(shape.halfWidth * shape.halfHeight) / 0.88, shape.halfHeight * 1.7);
  const random = seededRandom(Math.imul(spec.seed, 104729) + 11);
  return { shape, baseMetal: spec.baseMetal, noise, random, amount: spec.amount ?? 1, reach };
}

function paintsFor(spec: PartSpec, scene: FaultScene, water: Water): Paint[] {
  const own = (step: number): FaultScene => ({ ...scene, random: seededRandom(Math.imul(spec.seed, 7717) + step) });
  const paints = [layStrike(own(1)), FAULTS[spec.fault](scene)];
  if (spec.wet ?? true) paints.push(wetLook(own(2), water));
  return paints;
}

/** The light that a photo gets when its spec names none: near right, seldom quite. */
function roomMood(seed: number): { warmth: number; exposure: number } {
  const random = seededRandom(Math.imul(seed, 401) + 29);
  return { warmth: (random() - 0.5) * 0.9, exposure: 0.9 + random() * 0.2 };
}
