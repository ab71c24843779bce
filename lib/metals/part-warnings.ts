import { BASE_METAL_TITLES, type BaseMetal } from "@/lib/cases/case-words";
import { candidatesFor, type Candidate } from "@/lib/metals/candidates";
import { canLook, METAL_COLOURS, type Looks, type Material } from "@/lib/metals/material";
import { PULLS } from "@/lib/metals/material-words";
import type { MeasuredDensity } from "@/lib/metals/weigh-part";

/** Beyond 1 % nickel silver, brass, bronze and copper run into each other. */
const WIDE_SHARE = 0.01;
/** Another base metal this near to the best fit cannot be told from it. Our own choice. */
const ALIKE_SHARE = 0.5;

const ALWAYS = [
  "A hollow, porous or plated part misleads: this weighs solid metal. Weigh a bare, solid piece, or one that is filed through.",
  "Air bubbles and water that clings make a part look lighter. Shake them off under water, and weigh dry in air.",
];
const NICKEL_PLATE =
  "A thick nickel plate makes brass or zinc pull a little. If this part is nickel-plated, leave the magnet out. From memory.";
const TUNGSTEN =
  "Tungsten weighs the same as fine gold, so this weighing cannot tell gold from gold-plated tungsten. File through it, or have it read by X-ray.";

/** What to keep in mind about this reading, in words, what bears most on it first. */
export function partWarnings(measured: MeasuredDensity, candidates: readonly Candidate[], looks: Looks): string[] {
  return [
    ...nothingFits(measured, candidates, looks),
    ...tooWide(measured),
    ...notTold(candidates, looks),
    ...(candidates.some(isGoldOrTungsten) ? [TUNGSTEN] : []),
    ...(looks.pull === "faint" ? [NICKEL_PLATE] : []),
    ...ALWAYS,
  ];
}

function nothingFits(measured: MeasuredDensity, candidates: readonly Candidate[], looks: Looks): string[] {
  if (candidates.length > 0) return [];
  const [byWeight] = candidatesFor(measured).candidates;
  if (byWeight) {
    const { pull, colour } = looks;
    const against =
      pull === undefined
        ? "the colour speaks"
        : colour === undefined
          ? "the magnet speaks"
          : "the magnet and the colour speak";
    return [`By weight it could be ${byWeight.name}, but ${against} against it. Look again.`];
  }
  const reads = `${measured.densityGPerCm3.toFixed(2)} g/cm³`;
  return [`No metal in the table reads ${reads}. The part may be hollow, porous, or of two metals; or weigh it again.`];
}

function tooWide({ densityGPerCm3, uncertaintyGPerCm3 }: MeasuredDensity): string[] {
  if (uncertaintyGPerCm3 <= WIDE_SHARE * densityGPerCm3) return [];
  return [
    `The reading may be off by ${uncertaintyGPerCm3.toFixed(2)} g/cm³: too wide to tell brass, bronze and copper apart. Weigh a heavier part, several at once, or use a finer balance.`,
  ];
}

function notTold(candidates: readonly Candidate[], looks: Looks): string[] {
  const [best] = candidates;
  const other = candidates.find((each) => best && isOther(best, each) && each.fit >= ALIKE_SHARE * best.fit);
  if (!best || !other) return [];
  const names = `${title(best.baseMetal)} and ${title(other.baseMetal)}`;
  return [`This weighing does not tell ${names} apart. ${furtherLook(best, other, looks)}`];
}

/** Metals outside our base metals share one word, but titanium is not lead. */
function isOther(best: Material, each: Material): boolean {
  return best.baseMetal !== each.baseMetal || (best.baseMetal === "other" && best.name !== each.name);
}

const title = (baseMetal: BaseMetal): string => BASE_METAL_TITLES[baseMetal].toLowerCase();

/** The cheapest look that has not been taken yet and on which the two differ. */
function furtherLook(best: Material, other: Material, looks: Looks): string {
  const samePull = PULLS.some((pull) => best.pull.includes(pull) && other.pull.includes(pull));
  if (looks.pull === undefined && !samePull) return "Hold a magnet to it.";
  const sameColour = METAL_COLOURS[best.colour].some((colour) => canLook(other, colour));
  if (looks.colour === undefined && !sameColour) return "File a spot and look at its colour.";
  return "Weigh a heavier part or use a finer balance; if they still overlap, ask for the mill certificate or have it read by X-ray.";
}

function isGoldOrTungsten({ name }: Material): boolean {
  return name.startsWith("tungsten") || name === "gold, fine";
}
