import type { Candidate } from "@/lib/metals/candidates";
import type { Material } from "@/lib/metals/material";
import type { PartCheck, PartCheckInput } from "@/lib/metals/part-check";
import type { RuledOut } from "@/lib/metals/ruled-out";
import { DEFAULT_BALANCE_ERROR_G } from "@/lib/metals/weigh-part";

/** A part check as `POST /api/part-check` sends it. Densities in g/cm³, fit 0 to 1. */
export function partCheckAnswer(input: PartCheckInput, check: PartCheck) {
  const { densityGPerCm3, uncertaintyGPerCm3, waterDensityGPerCm3 } = check.measured;
  return {
    densityGPerCm3,
    uncertaintyGPerCm3,
    waterDensityGPerCm3,
    candidates: check.candidates.map((each: Candidate) => ({ ...sentMetal(each), fit: each.fit })),
    ruledOut: check.ruledOut.map((each: RuledOut) => ({ ...sentMetal(each), reason: each.reason })),
    route: check.route,
    warnings: check.warnings,
    given: {
      weightAirG: input.weightAirG,
      weightWaterG: input.weightWaterG,
      waterTempC: input.waterTempC,
      balanceErrorG: input.balanceErrorG ?? DEFAULT_BALANCE_ERROR_G,
      magnetic: input.pull ?? null,
      colour: input.colour ?? null,
    },
    sources: check.sources,
    assumed: check.assumed,
  };
}

function sentMetal({ name, baseMetal, lowGPerCm3, typicalGPerCm3, highGPerCm3, source }: Material) {
  return { metal: name, baseMetal, rangeGPerCm3: [lowGPerCm3, highGPerCm3], typicalGPerCm3, source };
}
