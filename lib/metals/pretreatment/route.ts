/** What a pretreatment route says: how one base metal is brought from the bench to a sound copper strike. */
import type { BaseMetal, ShelfClass, StationKind } from "@/lib/cases/case-words";

/** A safety line beside its step. stop: people get hurt if it is skipped. */
export interface RouteCaution {
  level: "caution" | "stop";
  text: string;
}

/** What wets the part at a step. Acid and cyanide never follow each other without water between. */
export type StepLiquid = "acid" | "cyanide" | "alkali" | "water" | "none";

export interface RouteStep {
  station: StationKind;
  title: string;
  /** What, how long, how warm, how strong. About 160 characters at most. */
  detail: string;
  /** "1 to 3 min". Left out where the eye ends the step, not the clock. */
  minutesWords?: string;
  /** How to see that it worked before going on. */
  proof?: string;
  liquid: StepLiquid;
  cautions: readonly RouteCaution[];
  /** Where each figure comes from, by the short names of `SOURCES`: "Guidebook, copper; time from memory". */
  source: string;
}

/** Something that suits a base metal or does not, with the reason. */
export interface Verdict {
  name: string;
  why: string;
  source: string;
}

export interface Verdicts {
  suits: readonly Verdict[];
  unsuitable: readonly Verdict[];
}

export interface WatchOut {
  /** The fault it ends in when nobody watches. */
  classSlug: ShelfClass;
  title: string;
  words: string;
  source: string;
}

/** The same metal in another form or strength, and what is done otherwise for it. */
export interface RouteVariant {
  title: string;
  words: string;
  cautions: readonly RouteCaution[];
  /** Only the steps that differ from the route; empty where the words say all. */
  steps: readonly RouteStep[];
  source: string;
}

/** What a fault at the strike most often means on this metal. */
export interface RouteFault {
  classSlug: ShelfClass;
  words: string;
}

/** A source as the foot of a page cites it. */
export interface RouteSource {
  /** The short name used beside a fact. */
  name: string;
  citation: string;
}

/** What is written by hand for a metal. */
export interface WrittenRoute {
  baseMetal: BaseMetal;
  title: string;
  /** One sentence: what this metal asks for. */
  summary: string;
  steps: readonly RouteStep[];
  variants: readonly RouteVariant[];
  strike: Verdicts;
  watchOuts: readonly WatchOut[];
  goesWrong: readonly RouteFault[];
}

/** A route as screens and answers show it: the written one with its activators and its sources. */
export interface PretreatmentRoute extends WrittenRoute {
  /** From the one table of activators: `activatorSuits`. */
  activators: Verdicts;
  /** Every source that the route names. */
  notes: readonly RouteSource[];
}
