import { canLook, canPull, overlaps, type Looks, type Material } from "@/lib/metals/material";
import type { Pull } from "@/lib/metals/material-words";
import { MATERIALS } from "@/lib/metals/materials";
import type { MeasuredDensity } from "@/lib/metals/weigh-part";

/** A metal that the part is not, though it is near. */
export interface RuledOut extends Material {
  /** Why not, in a few words: "too heavy by 1.55". */
  reason: string;
}

const MOST_SHOWN = 8;

/**
 * The nearest metals that the part is not: those of the right density that magnet or colour exclude, then by how far
 * their range lies from the reading in g/cm³. At most 8.
 */
export function ruledOutBy(measured: MeasuredDensity, looks: Looks): RuledOut[] {
  return MATERIALS.flatMap((material) => {
    const reason = reasonAgainst(measured, material, looks);
    if (reason === undefined) return [];
    return [{ gap: overlaps(measured, material) ? 0 : gapTo(measured, material), metal: { ...material, reason } }];
  })
    .sort((a, b) => a.gap - b.gap || a.metal.name.localeCompare(b.metal.name, "en"))
    .slice(0, MOST_SHOWN)
    .map(({ metal }) => metal);
}

function reasonAgainst(measured: MeasuredDensity, material: Material, { pull, colour }: Looks): string | undefined {
  if (!overlaps(measured, material)) {
    const way = material.lowGPerCm3 > measured.densityGPerCm3 ? "heavy" : "light";
    return `too ${way} by ${gapTo(measured, material).toFixed(2)}`;
  }
  if (pull !== undefined && !canPull(material, pull)) return pullReason(material, pull);
  if (colour !== undefined && !canLook(material, colour)) return `it would be ${material.colour}`;
  return undefined;
}

/** From the reading to the nearer end of the metal's range, g/cm³. */
function gapTo({ densityGPerCm3 }: MeasuredDensity, { lowGPerCm3, highGPerCm3 }: Material): number {
  return Math.max(lowGPerCm3 - densityGPerCm3, densityGPerCm3 - highGPerCm3);
}

function pullReason(material: Material, pull: Pull): string {
  if (material.pull.includes("strong")) return "a magnet would pull hard";
  if (material.pull.includes("faint")) return "a magnet would pull a little at most";
  return pull === "faint" ? "bare, a magnet would not pull it" : "a magnet would not pull it";
}
