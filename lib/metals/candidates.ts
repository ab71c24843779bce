import { looksLike, overlaps, type Looks, type Material } from "@/lib/metals/material";
import { MATERIALS } from "@/lib/metals/materials";
import { ruledOutBy, type RuledOut } from "@/lib/metals/ruled-out";
import type { MeasuredDensity } from "@/lib/metals/weigh-part";

/** A metal that the part may be made of. */
export interface Candidate extends Material {
  /** 0 to 1: 1 when the part reads exactly the metal's typical density. An order of likeness, not a chance. */
  fit: number;
}

export interface Narrowed {
  candidates: Candidate[];
  ruledOut: RuledOut[];
}

/**
 * Metals whose published range overlaps what was measured (density ± its uncertainty), narrowed by magnet and colour,
 * best fit first, ties by name; and the near ones that are ruled out, each with why, nearest first, at most 8.
 * Fit is exp(−z²/2); z counts the deviation from the typical density in standard deviations, the reading's own
 * and the metal's, taken as a rectangular distribution (JCGM 100, 4.3.7) on the side where the reading lies.
 * Nothing that fits gives no candidates. Throws nothing.
 *
 * Example: 6.61 ± 0.02 gives zinc die cast Alloy 3 and Alloy 5.
 */
export function candidatesFor(measured: MeasuredDensity, looks: Looks = {}): Narrowed {
  const candidates = MATERIALS.filter((material) => overlaps(measured, material) && looksLike(material, looks))
    .map((material) => ({ ...material, fit: fitOf(measured, material) }))
    .sort((a, b) => byFit(a, b) || a.name.localeCompare(b.name, "en"));
  return { candidates, ruledOut: ruledOutBy(measured, looks) };
}

function fitOf({ densityGPerCm3, uncertaintyGPerCm3 }: MeasuredDensity, material: Material): number {
  const deviation = densityGPerCm3 - material.typicalGPerCm3;
  const edge = deviation < 0 ? material.lowGPerCm3 : material.highGPerCm3;
  const spread = Math.abs(edge - material.typicalGPerCm3) / Math.sqrt(3);
  const deviations = deviation === 0 ? 0 : deviation / Math.hypot(uncertaintyGPerCm3 / 2, spread);
  return Math.exp(-(deviations ** 2) / 2);
}

/** Fits that differ only by rounding are a tie. */
function byFit(a: Candidate, b: Candidate): number {
  return Math.round(b.fit * 1e6) - Math.round(a.fit * 1e6);
}
