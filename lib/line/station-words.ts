import type { StationKind } from "@/lib/cases/case-words";
import { solutionAge } from "./solution-age";
import type { StationView } from "./station-view";

interface StationFacts {
  slug: string;
  name: string;
  kind: StationKind;
  held: number;
  solutions: { windowDays: number; madeUpAt: number }[];
  /** The newest check at this station, if any. */
  check: { bathTempC: number | null; volts: number | null } | null;
  /** Cases that wait for a second look; said at the inspection bench. */
  waiting: number;
}

/**
 * One station as the strip draws it. Of several solutions the one nearest its end speaks for the station.
 * A running rinse is always full; a bench and an oven hold nothing.
 */
export function stationView(facts: StationFacts, now: number): StationView {
  const { slug, name, kind, held } = facts;
  const base = { slug, name, kind, held };
  if (kind === "rinse") return { ...base, note: "running", level: 0.92, age: 0, flowing: true };
  if (kind === "inspect") {
    const note =
      facts.waiting === 0 ? "nothing waits" : `${facts.waiting} ${facts.waiting === 1 ? "case waits" : "cases wait"}`;
    return { ...base, note, level: 0, age: 0 };
  }
  if (kind === "finish") return { ...base, note: "dry, pack", level: 0, age: 0 };
  const ages = facts.solutions.map((each) => solutionAge(each.madeUpAt, each.windowDays, now));
  const oldest = ages.toSorted((a, b) => b.share - a.share)[0];
  if (!oldest) return { ...base, note: "no solution logged", level: 0.12, age: 0 };
  const level = Math.min(1, Math.max(0.12, 1 - oldest.share));
  const age = Math.min(1.2, oldest.share);
  if (oldest.daysOver > 0) return { ...base, note: oldest.words, over: true, level, age };
  return { ...base, note: checkWords(facts.check) ?? oldest.words, level, age };
}

/** "54 °C  0.8 V", where both were read. */
function checkWords(check: StationFacts["check"]): string | null {
  if (check?.bathTempC === undefined || check.bathTempC === null || check.volts === null) return null;
  return `${Math.round(check.bathTempC)} °C ${check.volts} V`;
}
