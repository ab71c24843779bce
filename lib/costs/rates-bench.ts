import type { RatesExample } from "@/lib/costs/rates-preview";
import type { StripTable } from "@/lib/costs/strip-plan";

/** An example by name. */
export interface NamedExample extends RatesExample {
  id: string;
  /** The dearest case found after the strike, the job struck most, or any closed case. */
  kind: "dearest" | "usual" | "case";
  /** The case's reference; null for a job. */
  ref: string | null;
  /** "12 × connector shell". */
  title: string;
  /** "after final plate". */
  note: string;
}

/** What rates are tried on before they are saved. */
export interface RatesBench {
  examples: readonly NamedExample[];
  table: StripTable;
  /** Share of struck parts that are held as bad at the strike; null while nothing was struck. */
  shopShare: number | null;
}
