import type { BaseMetal } from "@/lib/cases/case-words";
import { ACTIVATORS, type ActivatorKind } from "./activator-kinds";
import type { Verdict, Verdicts } from "./route";
import { COMMON } from "./sources";

export interface Suitability {
  verdict: "suits" | "unsuitable" | "unknown";
  /** The reason, as a plater would be told it. */
  why: string;
  source: string;
}

/**
 * Does this kind of activator suit this base metal? "unknown" where the table says nothing: nobody has ruled on the pair.
 * @param kind slug of one of `ACTIVATORS`
 * @throws InputError never: a slug outside the list does not compile
 * @example activatorSuits("dilute-hydrochloric", "aluminium").verdict // "unsuitable"
 */
export function activatorSuits(kind: ActivatorKind["slug"], baseMetal: BaseMetal): Suitability {
  const rule = ACTIVATORS.find((each) => each.slug === kind)?.on[baseMetal];
  return (
    rule ?? { verdict: "unknown", why: "No rule for this pair. Try it on a scrap part and tape it.", source: COMMON }
  );
}

/** The activators that suit a base metal and those that do not, in the order of the table. */
export function activatorsFor(baseMetal: BaseMetal): Verdicts {
  const of = (verdict: Suitability["verdict"]): Verdict[] =>
    ACTIVATORS.flatMap(({ name, on }) => {
      const rule = on[baseMetal];
      return rule?.verdict === verdict ? [{ name, why: rule.why, source: rule.source }] : [];
    });
  return { suits: of("suits"), unsuitable: of("unsuitable") };
}
