import { InputError, requireBetween } from "@/lib/input-error";
import { differenceWords, type CheckKind, type UnitSystem } from "@/lib/plating/window-units";

/** The range in which a check is fine. Both ends belong to it; an end left out is open. */
export interface ProcessWindow {
  kind: CheckKind;
  low?: number;
  high?: number;
  /** What it means when the check lies beyond it. */
  beyond?: string;
  source: string;
}

/**
 * Where a strike is run. The set points (0.8 V, 54 °C or 130 °F with air agitation; brush 2 V rising to 4 V at room
 * temperature; about 30 s to a visible deposit) are common practice; how far around them is fine is from memory. The
 * current density of a copper cyanide strike is printed (Surface Finishing Guidebook 2011-12, copper, Table I).
 * A shop sets its own.
 */
export const STRIKE_WINDOWS: Record<"bath" | "brush", readonly ProcessWindow[]> = {
  bath: [
    { kind: "voltageV", low: 0.7, high: 0.9, source: "0.8 V, common practice; ± 0.1 V from memory" },
    { kind: "bathTempC", low: 51, high: 57, source: "54 °C (130 °F), common practice; ± 3 °C from memory" },
    { kind: "secondsToDeposit", high: 30, beyond: "The solution is due for replacement.", source: "common practice" },
    {
      kind: "currentDensityADm2",
      low: 0.5,
      high: 4,
      source: "copper cyanide strike 0.5 to 4 A/dm², Surface Finishing Guidebook 2011-12, Table I",
    },
  ],
  brush: [
    { kind: "voltageV", low: 2, high: 4, source: "2 V rising to 4 V, common practice" },
    { kind: "bathTempC", low: 18, high: 27, source: "room temperature, common practice; the ends from memory" },
    { kind: "secondsToDeposit", high: 30, beyond: "The solution is due for replacement.", source: "common practice" },
  ],
};

/** How a check stands to its window. `beyondBy` is above the high end when positive, below the low end when negative, 0 inside. */
export interface WindowReading {
  inside: boolean;
  beyondBy: number;
  words: string;
}

/**
 * Whether a check lies in its window, and by how much not. Value in the unit of the window's kind; the words are in the
 * units that the shop reads. The ends are inside.
 * Throws `InputError` for a value that is no number or a window that is upside down.
 *
 * Example: 1.1 V in a window of 0.7 to 0.9 V is out by 0.2: "0.2 V over."
 */
export function checkAgainstWindow(window: ProcessWindow, value: number, system: UnitSystem = "metric"): WindowReading {
  requireBetween(window.kind, value, window.kind === "bathTempC" ? -50 : 0, 1e5);
  const low = window.low ?? -Infinity;
  const high = window.high ?? Infinity;
  if (!(low <= high)) throw new InputError("window", "The low end lies above the high end.");
  if (value >= low && value <= high) return { inside: true, beyondBy: 0, words: "In the window." };
  const beyondBy = value > high ? value - high : value - low;
  const amount = `${differenceWords(window.kind, beyondBy, system)} ${beyondBy > 0 ? "over" : "under"}.`;
  return { inside: false, beyondBy, words: window.beyond ? `${amount} ${window.beyond}` : amount };
}
