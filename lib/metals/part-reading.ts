import { candidatesFor, type Narrowed } from "@/lib/metals/candidates";
import { MATERIALS } from "@/lib/metals/materials";
import { partWarnings } from "@/lib/metals/part-warnings";
import type { CheckInput } from "@/lib/metals/typed-check";
import { measureDensity, type MeasuredDensity } from "@/lib/metals/weigh-part";

/** A weighing and what it says, without the pretreatment: that is long, and the browser asks for it when it shows it. */
export interface PartReading extends Narrowed {
  measured: MeasuredDensity;
  warnings: string[];
}

/**
 * What a weighing says, for a screen that works it out at each key pressed.
 * Throws `InputError` as `measureDensity` does.
 */
export function readPart(input: CheckInput): PartReading {
  const measured = measureDensity(input);
  const narrowed = candidatesFor(measured, input);
  return { measured, ...narrowed, warnings: partWarnings(measured, narrowed.candidates, input) };
}

/** So many solid metals are in the table that a part is held against. */
export const METALS_KNOWN = MATERIALS.length;
