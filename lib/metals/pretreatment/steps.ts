/** The steps that nearly every route shares, so that their cautions are the same on every one. */
import { ACID, CYANIDE, CYANIDE_NEXT, HOT_ALKALI, LIVE_ENTRY, POWER } from "./cautions";
import type { RouteStep } from "./route";
import { COMMON, MEMORY } from "./sources";

type Own = Partial<RouteStep> & Pick<RouteStep, "detail">;

/** Hot soak that takes the bulk of oil and buffing compound. */
export function soak(own: Own): RouteStep {
  return {
    station: "clean",
    title: "Soak clean",
    liquid: "alkali",
    minutesWords: "3 to 10 min",
    cautions: [HOT_ALKALI],
    source: `${COMMON}; times and temperatures ${MEMORY}`,
    ...own,
  };
}

/** Electroclean; which way the current runs depends on the metal. */
export function electroclean(own: Own): RouteStep {
  return {
    station: "clean",
    title: "Electroclean",
    liquid: "alkali",
    cautions: [HOT_ALKALI, POWER],
    source: `${COMMON}; times and current ${MEMORY}`,
    ...own,
  };
}

/** The gate of every route: no broken water film goes on. */
export function waterBreak(own: Partial<RouteStep> = {}): RouteStep {
  return {
    station: "rinse",
    title: "Rinse twice, read the water break",
    detail: "Hold it still and let it drain. One whole sheet of water, edges too.",
    proof: "The film holds unbroken for about 30 s. If it breaks, back to the cleaner, not on to the acid.",
    liquid: "water",
    cautions: [],
    source: `ASTM F22; 30 s ${COMMON}`,
    ...own,
  };
}

/** An acid dip at the activator. */
export function acidDip(own: Own): RouteStep {
  return {
    station: "activate",
    title: "Acid dip",
    liquid: "acid",
    cautions: [ACID],
    source: `${COMMON}, ${MEMORY}`,
    ...own,
  };
}

/** The two rinses that stand between any acid and a cyanide bath. */
export function rinseBeforeCyanide(own: Partial<RouteStep> = {}): RouteStep {
  return {
    station: "rinse",
    title: "Rinse twice, running",
    detail: "Two rinses that no cyanide rack ever drips into. Keep it wet; no stop over 15 s.",
    liquid: "water",
    cautions: [CYANIDE_NEXT],
    source: `${COMMON}; 15 s ${MEMORY}`,
    ...own,
  };
}

/** A rinse that is followed by no cyanide. */
export function rinse(own: Partial<RouteStep> = {}): RouteStep {
  return {
    station: "rinse",
    title: "Rinse twice",
    detail: "Running water, rack moved, blind holes drained.",
    liquid: "water",
    cautions: [],
    source: COMMON,
    ...own,
  };
}

/** The copper cyanide strike of the guidebook's Table I. */
export function cyanideStrike(own: Partial<RouteStep> = {}): RouteStep {
  return {
    station: "strike",
    title: "Copper cyanide strike",
    detail: "Free cyanide 11 to 15 g/L, 24 to 66 °C, 0.5 to 4 A/dm². Whole copper in about 30 s.",
    minutesWords: "30 s to 2 min",
    proof: "Even pink copper in every recess. First copper later than 30 s: the surface or the strike is at fault.",
    liquid: "cyanide",
    cautions: [CYANIDE, POWER],
    source: `Guidebook, copper; 30 s to first copper ${COMMON}`,
    ...own,
  };
}

/** As above, with the current on before the part is under. */
export function liveCyanideStrike(own: Partial<RouteStep> = {}): RouteStep {
  return cyanideStrike({ title: "Copper cyanide strike, live entry", cautions: [CYANIDE, LIVE_ENTRY], ...own });
}

/** What ends every route: the strike is judged before anything covers it. */
export function look(own: Partial<RouteStep> = {}): RouteStep {
  return {
    station: "inspect",
    title: "Three rinses, look, tape, then plate",
    detail: "Look dry under good light, tape one part of the rack, photograph what is not sound. Then the final plate.",
    liquid: "water",
    cautions: [],
    source: `${COMMON}; ASTM D3359`,
    ...own,
  };
}
