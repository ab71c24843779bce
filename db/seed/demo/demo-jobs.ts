import type { BaseMetal, Method, ShelfClass, Symptom } from "@/lib/cases/case-words";
import type { PartShape } from "@/db/seed/photos/part-spec";
import type { StoredLayer } from "@/db/schema/line";

/** Demo data: every customer, job and figure here is invented. */
export interface DemoJob {
  number: string;
  customer: string;
  partName: string;
  shape: PartShape;
  baseMetal: BaseMetal;
  alloy: string;
  quantity: number;
  areaDm2: number;
  partValueCents: number;
  finalStack: StoredLayer[];
  method: Method;
  /** Share of the shop's runs that this job is. */
  weight: number;
}

const nickelGold: StoredLayer[] = [
  { metal: "Ni", thicknessUm: 5 },
  { metal: "Au", thicknessUm: 0.8 },
];
const nickel: StoredLayer[] = [{ metal: "Ni", thicknessUm: 12 }];
const silver: StoredLayer[] = [
  { metal: "Ni", thicknessUm: 4 },
  { metal: "Ag", thicknessUm: 8 },
];

export const DEMO_JOBS: readonly DemoJob[] = [
  { number: "J-3318", customer: "Orrin & Pike", partName: "connector shell", shape: "shell", baseMetal: "brass", alloy: "C360", quantity: 480, areaDm2: 0.9, partValueCents: 3800, finalStack: nickelGold, method: "bath", weight: 5 },
  { number: "J-3290", customer: "Bellwether Controls", partName: "contact pin", shape: "pin", baseMetal: "copper", alloy: "C110", quantity: 2400, areaDm2: 0.15, partValueCents: 620, finalStack: nickelGold, method: "bath", weight: 3 },
  { number: "J-3301", customer: "Tarn Valley Marine", partName: "hinge bracket", shape: "bracket", baseMetal: "steel", alloy: "1018", quantity: 260, areaDm2: 2.4, partValueCents: 2900, finalStack: nickel, method: "bath", weight: 4 },
  { number: "J-3324", customer: "Halden Pumps", partName: "rotor", shape: "rotor", baseMetal: "steel", alloy: "4140", quantity: 36, areaDm2: 5.2, partValueCents: 41000, finalStack: nickel, method: "brush", weight: 2 },
  { number: "J-3307", customer: "Sextant Instruments", partName: "bus bar", shape: "bar", baseMetal: "copper", alloy: "C110", quantity: 140, areaDm2: 3.1, partValueCents: 5400, finalStack: silver, method: "bath", weight: 2 },
  { number: "J-3315", customer: "Lockyer Fittings", partName: "die-cast lug", shape: "lug", baseMetal: "zinc", alloy: "Alloy 3", quantity: 900, areaDm2: 0.7, partValueCents: 480, finalStack: nickel, method: "bath", weight: 3 },
  { number: "J-3329", customer: "Corrie Silversmiths", partName: "serving spoon", shape: "spoon", baseMetal: "nickel-silver", alloy: "C752", quantity: 96, areaDm2: 1.6, partValueCents: 2600, finalStack: silver, method: "bath", weight: 2 },
  { number: "J-3311", customer: "Anvik Aero", partName: "test coupon", shape: "coupon", baseMetal: "stainless", alloy: "304", quantity: 60, areaDm2: 0.5, partValueCents: 1800, finalStack: nickelGold, method: "brush", weight: 2 },
]; // prettier-ignore

/** How often a class comes up in the demo shop, and how its platers put it. Invented. */
export interface DemoFault {
  slug: Exclude<ShelfClass, "sound">;
  weight: number;
  symptoms: Symptom[];
  notes: string[];
}

export const DEMO_FAULTS: readonly DemoFault[] = [
  { slug: "underactivation", weight: 30, symptoms: ["patchy-haze", "lifts-on-tape"], notes: ["Hazy toward the rim, tape lifts it.", "Copper took its time coming.", "Pale and patchy on the second rack.", "Won't take near the keyway."] },
  { slug: "dewetting", weight: 20, symptoms: ["bare-islands"], notes: ["Water pulled back from it after the rinse.", "Islands by the stamped letters.", "Three of the rack, all from the left side."] },
  { slug: "water-spots", weight: 15, symptoms: ["rings-tracks"], notes: ["Tear tracks under the holes.", "Dried while the phone rang.", "Rings where the drops sat."] },
  { slug: "overactivation", weight: 12, symptoms: ["dark-smut"], notes: ["Black wipes off on the glove.", "Left in the dip over the break.", "Smoky all over."] },
  { slug: "oxidation", weight: 9, symptoms: ["brown-rainbow"], notes: ["Went brown waiting for nickel.", "Rust bloom at the edge.", "Rainbow on the flat."] },
  { slug: "peeling", weight: 4, symptoms: ["lifts-on-tape"], notes: ["Comes up in one sheet."] },
  { slug: "burning", weight: 3, symptoms: ["burnt-edges"], notes: ["Edges dark and powdery."] },
  { slug: "no-deposit", weight: 3, symptoms: ["bare-recess"], notes: ["Bare down in the slot."] },
  { slug: "handling", weight: 2, symptoms: ["finger-rack-mark"], notes: ["Thumb print, clear as day."] },
  { slug: "pitting", weight: 1, symptoms: ["pits-lumps"], notes: ["Rough to the nail."] },
  { slug: "immersion-deposit", weight: 1, symptoms: ["wipes-off"], notes: ["Wipes off with a cloth."] },
  { slug: "bleed-out", weight: 1, symptoms: ["stain-from-seam"], notes: ["Brown creeping from the seam overnight."] },
]; // prettier-ignore
