import { candidatesFor, type Candidate } from "@/lib/metals/candidates";
import type { Looks } from "@/lib/metals/material";
import { MAGNET_SOURCE } from "@/lib/metals/materials";
import { partWarnings } from "@/lib/metals/part-warnings";
import { pretreatmentFor } from "@/lib/metals/pretreatment/pretreatment";
import type { PretreatmentRoute } from "@/lib/metals/pretreatment/route";
import type { RuledOut } from "@/lib/metals/ruled-out";
import { AIR_DENSITY_SOURCE, WATER_DENSITY_SOURCE } from "@/lib/metals/water-density";
import { DEFAULT_BALANCE_ERROR_G, measureDensity, type MeasuredDensity, type Weighing } from "@/lib/metals/weigh-part";

export interface PartCheckInput extends Weighing, Looks {}

/** What one part, weighed twice, may be made of, and how that metal is brought to the strike. */
export interface PartCheck {
  measured: MeasuredDensity;
  /** Best fit first; empty when nothing in the table fits. */
  candidates: Candidate[];
  ruledOut: RuledOut[];
  /** For the best candidate's base metal; null when there is none, or no route for it. */
  route: PretreatmentRoute | null;
  warnings: string[];
  sources: string[];
  /** What was taken for granted because nobody said otherwise. */
  assumed: string[];
}

/**
 * What is this part? Density from two weighings, the metals that fit, the near ones that do not, and the pretreatment of
 * the likeliest. Throws `InputError` as `measureDensity` does.
 *
 * Example: 100 g in air, 84.86 g in water of 20 °C, no pull, blue-grey: zinc die cast.
 */
export function checkPart(input: PartCheckInput): PartCheck {
  const measured = measureDensity(input);
  const { candidates, ruledOut } = candidatesFor(measured, input);
  const [best] = candidates;
  return {
    measured,
    candidates,
    ruledOut,
    route: best ? pretreatmentFor(best.baseMetal) : null,
    warnings: partWarnings(measured, candidates, input),
    sources: [
      WATER_DENSITY_SOURCE,
      AIR_DENSITY_SOURCE,
      "Uncertainty: JCGM 100 (GUM), two readings of the balance, 95 %",
      "Densities of the metals: named beside each",
      MAGNET_SOURCE,
    ],
    assumed: assumedIn(input),
  };
}

function assumedIn(input: PartCheckInput): string[] {
  const always = ["The part is solid, bare metal of one kind."];
  if (input.balanceErrorG !== undefined) return always;
  return [`The balance may be off by ${DEFAULT_BALANCE_ERROR_G} g (a bench balance, from memory).`, ...always];
}
