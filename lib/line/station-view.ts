import type { StationKind } from "@/lib/cases/case-words";

/** One station as the line strip draws it. */
export interface StationView {
  /** As in `?station=`. */
  slug: string;
  name: string;
  kind: StationKind;
  /** The words under the name: "day 6 of 14", "5 days over", "54 °C 0.8 V". */
  note: string;
  /** The note is a warning: past its window, or out of limits. */
  over?: boolean;
  /** Share of the window that is left, 0 to 1; the drawing never goes under 0.12. */
  level: number;
  /** Age against the window: 0 fresh, 1 spent, up to 1.2 when over. */
  age: number;
  /** A rinse that runs: always full, with a glint. */
  flowing?: boolean;
  /** Held parts that trace back to it. No tag is hung for 0. */
  held: number;
}
