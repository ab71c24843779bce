import type { BaseMetal } from "@/lib/cases/case-words";
import { activatorsFor } from "./activators";
import { brass } from "./brass";
import { stainless } from "./stainless";
import { iron } from "./iron";
import { bronze } from "./bronze";
import { copper } from "./copper";
import { nickelSilver } from "./nickel-silver";
import { nickel } from "./nickel";
import { zinc } from "./zinc";
import { aluminium } from "./aluminium";
import { silver } from "./silver";
import { gold } from "./gold";
import { pewter } from "./pewter";
import type { PretreatmentRoute, WrittenRoute } from "./route";
import { sourcesNamed } from "./sources";
import { steel } from "./steel";

const ROUTES: Record<BaseMetal, WrittenRoute | null> = {
  steel,
  stainless,
  iron,
  brass,
  bronze,
  copper,
  "nickel-silver": nickelSilver,
  nickel,
  zinc,
  aluminium,
  silver,
  gold,
  pewter,
  other: null,
};

/**
 * The route of a base metal from the bench to a sound copper strike, with what suits it and what does not.
 * Null for "other": a metal that nobody has named has no route.
 * Source: each fact names its own.
 * @example pretreatmentFor("aluminium")?.steps.some((step) => step.title.includes("Zincate")) // true
 */
export function pretreatmentFor(baseMetal: BaseMetal): PretreatmentRoute | null {
  const written = ROUTES[baseMetal];
  if (!written) return null;
  const activators = activatorsFor(baseMetal);
  return { ...written, activators, notes: sourcesNamed(factSources(written, activators)) };
}

function factSources(route: WrittenRoute, activators: PretreatmentRoute["activators"]): string[] {
  const facts = [
    ...route.steps,
    ...route.variants,
    ...route.variants.flatMap((variant) => variant.steps),
    ...route.strike.suits,
    ...route.strike.unsuitable,
    ...activators.suits,
    ...activators.unsuitable,
    ...route.watchOuts,
  ];
  return facts.map((fact) => fact.source);
}
