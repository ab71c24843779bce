/**
 * What the library holds, as plain data: classes, causes, fixes, cautions and sources.
 * The same shapes serve the shelf that ships with the product and a shop's own edits.
 */
import type { BaseMetal, StationKind } from "@/lib/cases/case-words";

/** How one class is told from a look-alike: what this class shows and the other does not. */
export interface LibraryTell {
  /** Slug of the class it is mistaken for. */
  versus: string;
  tell: string;
}

export interface LibraryClass {
  slug: string;
  title: string;
  /** One line: what it looks like at the strike. */
  short: string;
  atStrike: string;
  /** What the same fault turns into once the final plate is on. */
  inFinalPlate: string;
  tells: LibraryTell[];
  /** Checks at the bench that settle the class. */
  checks: string[];
  prevention: string[];
  /** What taking it off means, at the strike and later. */
  stripNote: string;
  /** Share (0 to 1) of cases whose cause is none of those on the shelf. From memory. 0 for a class without causes. */
  otherLikelihood: number;
  sourceKeys: string[];
  /** The shop's own words for it. */
  synonyms: string[];
  /** Order on the shelf, from 0. */
  position: number;
}

export interface LibraryCause {
  slug: string;
  /** Every class it shows as. The first is the one it shows as most. */
  classSlugs: string[];
  title: string;
  /** Where on the line it arises. */
  station: StationKind;
  why: string;
  /** A check that proves it or rules it out. */
  proof: string;
  /** Share (0 to 1) of the cases of each class it is listed under. From memory; the shop's own cases correct it. */
  likelihood: number;
  baseMetals: BaseMetal[];
  sourceKeys: string[];
  synonyms: string[];
}

export interface FixStep {
  title: string;
  detail: string;
  /** Working time: for one part when `perPart`, else for the batch. */
  minutes: number;
  perPart: boolean;
  cautionKeys: string[];
  /** Null: at the bench, away from the line. */
  station: StationKind | null;
}

export interface LibraryFix {
  slug: string;
  causeSlugs: string[];
  title: string;
  steps: FixStep[];
  /** When to leave it alone and do something else. */
  whenNot: string;
  materials: string[];
  sourceKeys: string[];
}

export const CAUTION_LEVELS = ["caution", "stop"] as const;
export type CautionLevel = (typeof CAUTION_LEVELS)[number];

export interface LibraryCaution {
  key: string;
  level: CautionLevel;
  text: string;
  sourceKey: string;
}

export const SOURCE_KINDS = ["published", "common-practice", "from-memory"] as const;
export type SourceKind = (typeof SOURCE_KINDS)[number];

export interface LibrarySource {
  key: string;
  kind: SourceKind;
  citation: string;
}

/** One class with what belongs to it: the unit in which the shelf is written. */
export interface ShelfPart {
  class: LibraryClass;
  causes: LibraryCause[];
  fixes: LibraryFix[];
}

/** The whole library. A cause or fix that serves several classes stands here once. */
export interface Shelf {
  classes: LibraryClass[];
  causes: LibraryCause[];
  fixes: LibraryFix[];
  cautions: LibraryCaution[];
  sources: LibrarySource[];
}
