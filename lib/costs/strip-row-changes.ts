import { BASE_METAL_TITLES } from "@/lib/cases/case-words";
import type { ThreePoint } from "@/lib/costs/pert";
import { CAUTIONS } from "@/lib/costs/strip-cautions";
import type { DissolvingRow, StripRow } from "@/lib/costs/strip-methods";
import { NAMED_BASE_METALS, STANDING_TITLES, standingOn } from "@/lib/costs/strip-row-fields";
import { decimalText } from "@/lib/decimal";
import { formatMoney } from "@/lib/money";

/** What a row of a way changed against the one before it: each a phrase of its own. */
export interface StripChange {
  what: string;
  from: string;
  to: string;
}

/** "0.1 · 0.25 · 0.5 µm/min": low, likely, high. */
export function threePointWords({ low, likely, high }: ThreePoint, unit: string): string {
  return `${[low, likely, high].map(decimalText).join(" · ")} ${unit}`;
}

/** "$6.10 / L"; without a price of its own the shop's one price holds. */
export function solutionPriceWords(cents: number | undefined, currency: string): string {
  return cents === undefined ? "the shop’s price" : `${formatMoney(Math.round(cents), currency)} / L`;
}

/** What differs between two rows of one way, in the order of the form. Empty when nothing a person can see does. */
export function stripRowChanges(before: StripRow, after: StripRow, currency: string): StripChange[] {
  const changes: StripChange[] = [];
  const note = (what: string, from: string, to: string) => {
    if (from !== to) changes.push({ what, from, to });
  };
  if (before.method === "polish-back" || after.method === "polish-back") {
    if (before.method === "polish-back" && after.method === "polish-back") {
      note("Rate", polishWords(before.minutesPerDm2Um), polishWords(after.minutesPerDm2Um));
      note("Source", before.source, after.source);
    }
    return changes;
  }
  note("Rate", threePointWords(before.rateUmPerMin, "µm/min"), threePointWords(after.rateUmPerMin, "µm/min"));
  note("A litre holds", threePointWords(before.holdingGPerL, "g"), threePointWords(after.holdingGPerL, "g"));
  note(
    "Price",
    solutionPriceWords(before.solutionCentsPerL, currency),
    solutionPriceWords(after.solutionCentsPerL, currency),
  );
  for (const metal of NAMED_BASE_METALS) {
    note(`On ${BASE_METAL_TITLES[metal].toLowerCase()}`, standingWords(before, metal), standingWords(after, metal));
  }
  note("Cautions", cautionWords(before), cautionWords(after));
  note("Source", before.source, after.source);
  note("Source of the figures", before.rateSource, after.rateSource);
  return changes;
}

const polishWords = (rate: ThreePoint) => threePointWords(rate, "min per dm² and µm");

function standingWords(row: DissolvingRow, metal: (typeof NAMED_BASE_METALS)[number]): string {
  const { standing, reason } = standingOn(row, metal);
  const title = STANDING_TITLES[standing].toLowerCase();
  return reason ? `${title}: ${reason}` : title;
}

function cautionWords({ cautions }: DissolvingRow): string {
  return cautions.map((key) => CAUTIONS[key].words).join(" ") || "none";
}
