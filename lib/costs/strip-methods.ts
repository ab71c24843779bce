import type { BaseMetal } from "@/lib/cases/case-words";
import type { ThreePoint } from "@/lib/costs/pert";
import type { CautionKey } from "@/lib/costs/strip-cautions";
import type { DepositMetal } from "@/lib/plating/metals";

/** Ways to take a deposit off. */
export const STRIP_METHODS = ["polish-back", "chemical", "electrolytic"] as const;
export type StripMethod = (typeof STRIP_METHODS)[number];
export const STRIP_METHOD_TITLES: Record<StripMethod, string> = {
  "polish-back": "Polish back",
  chemical: "Chemical immersion",
  electrolytic: "Electrolytic",
};

/** A bath that takes deposits off. Plain data: it is stored, and the owner may edit it. */
export interface DissolvingRow {
  id: string;
  method: "chemical" | "electrolytic";
  takesOff: readonly DepositMetal[];
  solution: string;
  /** Degrees C, from and to. */
  bathTempC: readonly [number, number];
  /** Volts or current density, in words; absent for a plain immersion. */
  current?: string;
  rateUmPerMin: ThreePoint;
  /** Metal that a litre holds before it is spent. */
  holdingGPerL: ThreePoint;
  /** Price of a litre made up; absent: the shop's one price for strip solution. */
  solutionCentsPerL?: number;
  /** Base metals on which it is known to stop or to do no harm. One in neither list: nobody vouches, and it is not offered. */
  safeOn: readonly BaseMetal[];
  /** How the shop knows that it is safe there, where it was the shop that found out. */
  safeBecause?: Readonly<Partial<Record<BaseMetal, string>>>;
  /** Base metals that it goes on into, each with the reason in a sentence. */
  attacks: Readonly<Partial<Record<BaseMetal, string>>>;
  /** It lifts the deposit by way of this metal right beneath it, and works only then. */
  needsBeneath?: DepositMetal;
  cautions: readonly CautionKey[];
  /** Where solution and base metals come from. */
  source: string;
  rateSource: string;
  /** Where the metal that a litre holds comes from; absent: from memory. */
  holdingSource?: string;
}

/** Polishing by hand or wheel, on any deposit and base metal. */
export interface PolishingRow {
  id: string;
  method: "polish-back";
  /** Hands-on minutes per dm² and µm of a deposit of 100 HV; harder ones take longer in proportion. */
  minutesPerDm2Um: ThreePoint;
  cautions: readonly CautionKey[];
  source: string;
}
export type StripRow = DissolvingRow | PolishingRow;
