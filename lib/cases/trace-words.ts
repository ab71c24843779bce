import type { StationKind } from "./case-words";

/** What people call the place, after "at" or "in". */
const PLACES: Record<StationKind, { seen: string; began: string }> = {
  clean: { seen: "at the cleaner", began: "in the cleaner" },
  rinse: { seen: "at the rinse", began: "in the rinse" },
  activate: { seen: "at the activator", began: "in the activator" },
  strike: { seen: "at the strike", began: "in the strike" },
  inspect: { seen: "at the inspection bench", began: "at the inspection bench" },
  plate: { seen: "at the final plate", began: "in the final plate" },
  finish: { seen: "at the finish", began: "at the finish" },
};

interface Trace {
  found: StationKind;
  /** Null: not known. */
  traced: StationKind | null;
  /** A senior has named the cause: until then where it began is a guess. */
  isConfirmed: boolean;
  isReleased: boolean;
}

/**
 * Where a fault was seen and where it began, in one or two sentences.
 * @example traceWords({ found: "strike", traced: "activate", isConfirmed: true, isReleased: false }) ===
 *   "Seen at the strike. It began in the activator."
 */
export function traceWords({ found, traced, isConfirmed, isReleased }: Trace): string {
  const seen = `Seen ${PLACES[found].seen}.`;
  if (isReleased) return `${seen} The part was sound.`;
  if (!traced) return `${seen} Where it began is not known yet.`;
  return `${seen} ${isConfirmed ? "It began" : "It may have begun"} ${PLACES[traced].began}.`;
}
