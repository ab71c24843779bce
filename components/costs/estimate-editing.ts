import type { StripFaults, StripReading } from "@/lib/costs/read-strip";
import type { StripTyped } from "@/lib/costs/strip-address";

/** What the estimator's fields need: what is typed, what is wrong with it, and how it is changed. */
export interface StripEditing {
  typed: StripTyped;
  faults: StripFaults;
  /** What the fields mean, as far as it can be read. */
  reading: StripReading;
  onChange: (next: StripTyped) => void;
}
