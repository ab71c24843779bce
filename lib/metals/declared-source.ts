import type { DeclaredFit } from "@/lib/metals/declared";
import type { Material } from "@/lib/metals/material";
import { MATERIALS } from "@/lib/metals/materials";
import { MORE_ALLOYS } from "@/lib/metals/more-alloys";

/**
 * Where the range of a declared alloy comes from. Undefined where the job names no alloy that is known: then the range is
 * the span of its whole base metal, and stands in no one place.
 */
export function declaredSource(declared: DeclaredFit): Pick<Material, "name" | "source"> | undefined {
  const { name, lowGPerCm3, highGPerCm3 } = declared;
  const row = [...MATERIALS, ...MORE_ALLOYS].find(
    (each) => each.lowGPerCm3 === lowGPerCm3 && each.highGPerCm3 === highGPerCm3,
  );
  return row && { name, source: row.source };
}
