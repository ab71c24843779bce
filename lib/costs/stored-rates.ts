/**
 * A shop's rates as one dated row holds them. Money in integer cents of the shop's currency.
 * Maps are keyed by metal symbol (Cu, Ni, Au …); a metal that is missing has no price yet.
 */
export interface StoredRates {
  labourCentsPerHour: number;
  /** Burden of an hour in which the line is occupied by rework. */
  lineCentsPerHour: number;
  metalCentsPerG: Record<string, number>;
  /** Share of stripped metal that comes back as money, 0 to 1. */
  recoveryShare: number;
  solutionCentsPerL: number;
  wasteCentsPerL: number;
  /** Where these figures come from, said on the screens that rest on them. */
  source: string;
}
