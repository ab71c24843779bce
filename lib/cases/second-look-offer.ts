import type { FixStepOffer } from "./card-draft";
import type { BaseMetal, StationKind } from "./case-words";
import { RELEASE, type SecondLookOffer } from "./second-look-form";

/** The shop's shelf as rows, in shelf order; causes by likelihood, links in the library's order. */
export interface ShelfForSecondLook {
  classes: readonly { slug: string; title: string }[];
  causes: readonly {
    id: number;
    slug: string;
    title: string;
    stationKind: StationKind;
    likelihood: number;
    baseMetals: readonly string[];
  }[];
  fixes: readonly { id: number; slug: string; title: string; whenNot: string; steps: readonly FixStepOffer[] }[];
  classCauses: readonly { classSlug: string; causeSlug: string }[];
  causeFixes: readonly { causeSlug: string; fixSlug: string }[];
  cautions: readonly { key: string; level: "caution" | "stop"; text: string }[];
}

interface ThisCase {
  baseMetal: BaseMetal;
  quantity: number;
  /** Confirmed cases of each cause in this shop. */
  countByCause: ReadonlyMap<number, number>;
}

/**
 * What the second look of one case may choose from. Causes come in the order in which they are likely here: what this
 * shop has confirmed most, then those that the base metal is known for, then the shelf's own likelihood.
 */
export function offerForCase(shelf: ShelfForSecondLook, of: ThisCase): SecondLookOffer {
  const countHere = (id: number) => of.countByCause.get(id) ?? 0;
  const suits = (baseMetals: readonly string[]) => (baseMetals.includes(of.baseMetal) ? 1 : 0);
  const causes = shelf.causes.toSorted(
    (a, b) =>
      countHere(b.id) - countHere(a.id) || suits(b.baseMetals) - suits(a.baseMetals) || b.likelihood - a.likelihood,
  );
  const fixIds = (causeSlug: string) =>
    shelf.causeFixes
      .filter((link) => link.causeSlug === causeSlug)
      .flatMap((link) => shelf.fixes.find((fix) => fix.slug === link.fixSlug)?.id ?? []);
  const causesOf = (slug: string) => {
    const slugs = new Set(shelf.classCauses.filter((link) => link.classSlug === slug).map((link) => link.causeSlug));
    return causes.filter((cause) => slugs.has(cause.slug)).map((cause) => cause.id);
  };
  return {
    quantity: of.quantity,
    classes: shelf.classes
      .filter((each) => each.slug !== RELEASE)
      .map(({ slug, title }) => ({ slug, title, causeIds: causesOf(slug) })),
    causes: causes.map(({ id, slug, title, stationKind }) => ({
      id,
      title,
      stationKind,
      countHere: countHere(id),
      fixIds: fixIds(slug),
    })),
    fixes: shelf.fixes.map(({ id, title, whenNot, steps }) => ({ id, title, whenNot, steps: steps.map(bareStep) })),
    cautions: Object.fromEntries(shelf.cautions.map(({ key, level, text }) => [key, { level, text }])),
  };
}

/** Only what a card needs: the page sends this to the browser. */
function bareStep({ title, detail, minutes, perPart, cautionKeys }: FixStepOffer): FixStepOffer {
  return { title, detail, minutes, perPart, cautionKeys };
}
