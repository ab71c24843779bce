import type { PartSpec } from "./part-spec";
import { PART_BEDS } from "./part-spec";
import { seededRandom } from "./random";

/** What makes two photos differ though part and fault are the same. */
type Chosen = Pick<PartSpec, "shape" | "fault" | "baseMetal" | "seed"> & Partial<PartSpec>;

/** Fills in what a shop's photos vary in: bed, light, card, glove, how bad. Whatever `chosen` names stays as named. 1024 x 768. */
export function varySpec(chosen: Chosen): PartSpec {
  const random = seededRandom(Math.imul(chosen.seed, 2011) + 101);
  const bed = PART_BEDS[Math.floor(random() * PART_BEDS.length)] ?? "tray";
  const light = { warmth: (random() - 0.5) * 1.2, exposure: 0.82 + random() * 0.3 };
  return {
    width: 1024,
    height: 768,
    bed,
    light,
    amount: 0.65 + random() * 0.55,
    greyCard: random() < 0.3,
    glove: random() < 0.2,
    wet: random() < 0.75,
    ...chosen,
  };
}
